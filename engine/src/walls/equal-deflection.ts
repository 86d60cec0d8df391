/** A wall line's force shared among its piers so that all tops move alike. Source: SDPWS-2015 4.3.3.4.1, SDPWS-2021 4.3.5.5.1. */

/** A pier whose deflection is proportional to its shear. */
export type LinearPier = {
  readonly heightFt: number;
  readonly lengthFt: number;
  /** E·A of one end post [lb]; Infinity leaves its shortening out */
  readonly endPostStiffnessLb: number;
  /** G_a [kip/in] */
  readonly apparentShearStiffnessKipPerIn: number;
  /** Force per elongation of the hold-down system [lb/in]; Infinity leaves it out */
  readonly anchorStiffnessLbPerIn: number;
};

/**
 * Shear per deflection of a pier [lb/in].
 *
 * Source: SDPWS-2015 Eq. 4.3-1 with v = V/b and Δ_a = V·h/(b·k_a), divided by V.
 */
export function pierStiffnessLbPerIn(pier: LinearPier): number {
  const { heightFt: h, lengthFt: b, endPostStiffnessLb, apparentShearStiffnessKipPerIn, anchorStiffnessLbPerIn } = pier;
  const bending = (8 * h ** 3) / (endPostStiffnessLb * b ** 2);
  const shear = h / (1000 * apparentShearStiffnessKipPerIn * b);
  const rotation = h ** 2 / (anchorStiffnessLbPerIn * b ** 2);
  return 1 / (bending + shear + rotation); // SDPWS-2015 Eq. 4.3-1
}

/**
 * @param stiffnesses of the piers, any one unit
 * @returns parts of the whole, adding up to 1
 * @throws RangeError when there is no pier or a stiffness is not positive and finite
 */
export function sharesByStiffness(stiffnesses: readonly number[]): number[] {
  if (stiffnesses.length === 0 || !stiffnesses.every((k) => k > 0 && Number.isFinite(k))) {
    throw new RangeError('every pier wants a stiffness above zero');
  }
  const total = stiffnesses.reduce((sum, k) => sum + k, 0);
  return stiffnesses.map((k) => k / total);
}

/** Deflection of a pier's top under a shear of 0 or more; 0 at 0, rising without bound. */
export type DeflectionLaw = (shear: number) => number;

/**
 * Shares a force among piers whose deflection is not proportional to their shear, such as the four-term deflection with its nail slip.
 *
 * @param force on the line, either sense [force]
 * @returns shear of each pier, in order, with the sense of the force; they add up to it and their deflections agree within 1e-9 of themselves
 * @throws RangeError when there is no pier, or a law does not rise
 */
export function sharesByDeflection(force: number, laws: readonly DeflectionLaw[]): number[] {
  if (laws.length === 0) throw new RangeError('a line without piers');
  const whole = Math.abs(force);
  if (whole === 0) return laws.map(() => 0);
  // No pier takes more than the whole, and the softest alone would move furthest.
  const furthest = Math.max(...laws.map((law) => law(whole)));
  if (!(furthest > 0 && Number.isFinite(furthest))) throw new RangeError('a deflection does not rise with its shear');
  const shears = (deflection: number): number[] =>
    laws.map((law) => (law(whole) <= deflection ? whole : rootBetween((v) => law(v) - deflection, whole)));
  const sum = (parts: readonly number[]): number => parts.reduce((total, part) => total + part, 0);
  const deflection = rootBetween((d) => sum(shears(d)) - whole, furthest);
  const parts = shears(deflection);
  const scale = force / sum(parts);
  return parts.map((part) => part * scale);
}

/** Root of a rising function between 0, where it is not positive, and `upper`, where it is not negative (false position, Illinois). */
function rootBetween(f: (x: number) => number, upper: number): number {
  let [a, b] = [0, upper];
  let [fa, fb] = [f(a), f(b)];
  if (fa > 0 || fb < 0) throw new RangeError('a deflection does not rise with its shear');
  let last = 0;
  for (let step = 0; step < 200 && b - a > 1e-14 * b && fa !== 0 && fb !== 0; step++) {
    // Every third step halves the interval, so that it shrinks from both sides whatever the curve.
    const x = step % 3 === 2 ? (a + b) / 2 : (a * fb - b * fa) / (fb - fa);
    const fx = f(x);
    const side = fx < 0 ? -1 : 1;
    if (side < 0) [a, fa, fb] = [x, fx, last === side ? fb / 2 : fb];
    else [b, fb, fa] = [x, fx, last === side ? fa / 2 : fa];
    last = side;
  }
  return fa === 0 ? a : b;
}
