/** The 3 × 3 symmetric stiffness of a rigid diaphragm. */

export type Vector3 = readonly [number, number, number];

/** Upper triangle: xx, xy, xr, yy, yr, rr. */
export type Symmetric3 = readonly [number, number, number, number, number, number];

/**
 * Solves K·u = f for a symmetric positive definite K by Cholesky's factorisation.
 *
 * @returns undefined where a pivot vanishes against `scale` (K is singular)
 */
export function solveSymmetric3(k: Symmetric3, f: Vector3): Vector3 | undefined {
  const [xx, xy, xr, yy, yr, rr] = k;
  const l00 = Math.sqrt(xx);
  const l10 = xy / l00;
  const l20 = xr / l00;
  const l11 = Math.sqrt(yy - l10 * l10);
  const l21 = (yr - l20 * l10) / l11;
  const l22 = Math.sqrt(rr - l20 * l20 - l21 * l21);
  if (!(l00 > 0 && l11 > 0 && l22 > 0)) return undefined;
  const y0 = f[0] / l00;
  const y1 = (f[1] - l10 * y0) / l11;
  const y2 = (f[2] - l20 * y0 - l21 * y1) / l22;
  const u2 = y2 / l22;
  const u1 = (y1 - l21 * u2) / l11;
  const u0 = (y0 - l10 * u1 - l20 * u2) / l00;
  return [u0, u1, u2];
}
