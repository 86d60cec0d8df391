/** Plan frames: `t` along a load or a wall line, `s` across it. */
import type { Point } from '../building/definition.js';

export type Frame = {
  /** Unit vector across, pointing to +x, or to +y where the frame lies along x. */
  readonly s: Point;
  /** Unit vector along. */
  readonly t: Point;
};

/** Two directions closer than this are one [rad]. */
export const PARALLEL = 1e-6;

/**
 * Unit vector of a direction on plan, exact at multiples of 90°.
 *
 * @param degrees anticlockwise from +x
 */
export function unitVector(degrees: number): Point {
  const turn = ((degrees % 360) + 360) % 360;
  if (turn === 0) return [1, 0];
  if (turn === 90) return [0, 1];
  if (turn === 180) return [-1, 0];
  if (turn === 270) return [0, -1];
  const angle = (turn * Math.PI) / 180;
  return [Math.cos(angle), Math.sin(angle)];
}

/**
 * The frame of a line of directions: the same for a direction and its reverse.
 *
 * @param along unit vector
 */
export function frameAlong(along: Point): Frame {
  const [x, y] = along;
  // t points to +y, or to +x where it lies along x; s is then t turned clockwise or anticlockwise to point to +x (+y).
  const t: Point = Math.abs(y) < PARALLEL / 2 ? (x < 0 ? [-x, -y] : [x, y]) : y < 0 ? [-x, -y] : [x, y];
  const clockwise: Point = [t[1], 0 - t[0]];
  const s: Point =
    clockwise[0] > PARALLEL / 2 || (clockwise[0] >= -PARALLEL / 2 && clockwise[1] > 0)
      ? clockwise
      : [0 - clockwise[0], 0 - clockwise[1]];
  return { s, t };
}

export function dot(a: Point, b: Point): number {
  return a[0] * b[0] + a[1] * b[1];
}

export function cross(a: Point, b: Point): number {
  return a[0] * b[1] - a[1] * b[0];
}

/** Whether two unit vectors lie along one direction, in either sense. */
export function parallel(a: Point, b: Point): boolean {
  return Math.abs(cross(a, b)) < PARALLEL;
}
