/** Element stiffnesses of a membrane without Poisson's effect: N_x = A·ε_x, N_y = A·ε_y, N_xy = G·γ; A, G in [force/length]. */
import type { ElementStiffness } from '../../statics/frontal-cholesky.js';
import type { Mesh } from './mesh.js';

// ∫ N_i N_j, ∫ N_i' N_j', ∫ N_i' N_j of the quadratic shape functions on a stretch of length 1 with nodes at 0, ½, 1.
const MASS = [4, 2, -1, 2, 16, 2, -1, 2, 4].map((v) => v / 30);
const SLOPES = [7, -8, 1, -8, 16, -8, 1, -8, 7].map((v) => v / 3);
const SLOPE_VALUE = [-3, -4, 1, 4, 0, -4, -1, 4, 3].map((v) => v / 6);

export type Sheet = {
  /** Axial stiffness A [force/length] */
  readonly axial: number;
  /** In-plane shear stiffness G·t [force/length] */
  readonly shear: number;
};

export function membraneElements(mesh: Mesh, sheet: Sheet): ElementStiffness[] {
  const { x, y } = mesh;
  const known = new Map<number, Map<number, Float64Array>>();
  const rectangles = mesh.rectangles.map((nodes): ElementStiffness => {
    const [first, last] = [nodes[0] as number, nodes[8] as number];
    const a = (x[last] as number) - (x[first] as number);
    const b = (y[last] as number) - (y[first] as number);
    let row = known.get(a);
    if (row === undefined) {
      row = new Map<number, Float64Array>();
      known.set(a, row);
    }
    let matrix = row.get(b);
    if (matrix === undefined) row.set(b, (matrix = rectangleStiffness(a, b, sheet)));
    const centre = nodes[4] as number;
    return { nodes, matrix, x: x[centre] as number, y: y[centre] as number };
  });
  const triangles = mesh.triangles.map((nodes): ElementStiffness => {
    const [i, j, k] = [nodes[0] as number, nodes[1] as number, nodes[2] as number];
    const px = [x[i] as number, x[j] as number, x[k] as number];
    const py = [y[i] as number, y[j] as number, y[k] as number];
    return {
      nodes,
      matrix: triangleStiffness(px, py, sheet),
      x: ((px[0] as number) + (px[1] as number) + (px[2] as number)) / 3,
      y: ((py[0] as number) + (py[1] as number) + (py[2] as number)) / 3,
    };
  });
  return [...rectangles, ...triangles];
}

/** Rectangle a × b with nine nodes, integrated in closed form. */
export function rectangleStiffness(a: number, b: number, { axial, shear }: Sheet): Float64Array {
  const k = new Float64Array(18 * 18);
  for (let p = 0; p < 9; p++) {
    for (let q = 0; q < 9; q++) {
      const [i, j, m, n] = [p % 3, (p / 3) | 0, q % 3, (q / 3) | 0];
      const alongX = ((SLOPES[3 * i + m] as number) * (MASS[3 * j + n] as number) * b) / a;
      const alongY = ((MASS[3 * i + m] as number) * (SLOPES[3 * j + n] as number) * a) / b;
      const at = 2 * p * 18 + 2 * q;
      k[at] = axial * alongX + shear * alongY;
      k[at + 1] = shear * (SLOPE_VALUE[3 * m + i] as number) * (SLOPE_VALUE[3 * j + n] as number);
      k[at + 18] = shear * (SLOPE_VALUE[3 * i + m] as number) * (SLOPE_VALUE[3 * n + j] as number);
      k[at + 19] = axial * alongY + shear * alongX;
    }
  }
  return k;
}

/** Straight triangle with six nodes; its strains are linear, so that three points integrate it exactly. */
export function triangleStiffness(x: readonly number[], y: readonly number[], { axial, shear }: Sheet): Float64Array {
  const k = new Float64Array(12 * 12);
  const [x0 = 0, x1 = 0, x2 = 0] = x;
  const [y0 = 0, y1 = 0, y2 = 0] = y;
  const double = (x1 - x0) * (y2 - y0) - (x2 - x0) * (y1 - y0);
  const gx = [(y1 - y2) / double, (y2 - y0) / double, (y0 - y1) / double];
  const gy = [(x2 - x1) / double, (x0 - x2) / double, (x1 - x0) / double];
  const dx = new Float64Array(6);
  const dy = new Float64Array(6);
  for (let point = 0; point < 3; point++) {
    const l = [1 / 6, 1 / 6, 1 / 6];
    l[point] = 2 / 3;
    for (let i = 0; i < 3; i++) {
      const j = (i + 1) % 3;
      const [li, lj] = [l[i] as number, l[j] as number];
      dx[i] = (4 * li - 1) * (gx[i] as number);
      dy[i] = (4 * li - 1) * (gy[i] as number);
      dx[3 + i] = 4 * (li * (gx[j] as number) + lj * (gx[i] as number));
      dy[3 + i] = 4 * (li * (gy[j] as number) + lj * (gy[i] as number));
    }
    const weight = double / 6;
    for (let p = 0; p < 6; p++) {
      for (let q = 0; q < 6; q++) {
        const xx = (dx[p] as number) * (dx[q] as number) * weight;
        const yy = (dy[p] as number) * (dy[q] as number) * weight;
        const at = 2 * p * 12 + 2 * q;
        k[at] = (k[at] as number) + axial * xx + shear * yy;
        k[at + 1] = (k[at + 1] as number) + shear * (dy[p] as number) * (dx[q] as number) * weight;
        k[at + 12] = (k[at + 12] as number) + shear * (dx[p] as number) * (dy[q] as number) * weight;
        k[at + 13] = (k[at + 13] as number) + axial * yy + shear * xx;
      }
    }
  }
  return k;
}

/**
 * Stretches that resist along a direction: with `spring` the displacement itself [force/length²], with `bar` its slope [force].
 *
 * @param along unit vector; for bars that of each stretch where it is left out
 */
export function stretchElements(
  mesh: Mesh,
  stretches: readonly Int32Array[],
  kind: 'spring' | 'bar',
  stiffness: number,
  along?: readonly [number, number],
): ElementStiffness[] {
  const { x, y } = mesh;
  return stretches.map((nodes) => {
    const [from, middle, to] = [nodes[0] as number, nodes[1] as number, nodes[2] as number];
    const ex = (x[to] as number) - (x[from] as number);
    const ey = (y[to] as number) - (y[from] as number);
    const length = Math.hypot(ex, ey);
    const [ux, uy] = along ?? [ex / length, ey / length];
    const matrix = new Float64Array(36);
    for (let p = 0; p < 3; p++) {
      for (let q = 0; q < 3; q++) {
        const value =
          kind === 'spring'
            ? stiffness * length * (MASS[3 * p + q] as number)
            : (stiffness / length) * (SLOPES[3 * p + q] as number);
        const at = 2 * p * 6 + 2 * q;
        matrix[at] = value * ux * ux;
        matrix[at + 1] = value * ux * uy;
        matrix[at + 6] = value * ux * uy;
        matrix[at + 7] = value * uy * uy;
      }
    }
    return { nodes, matrix, x: x[middle] as number, y: y[middle] as number };
  });
}
