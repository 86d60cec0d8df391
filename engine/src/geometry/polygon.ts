/** Simple polygons: exact tests of crossing, touching and containing. */
import { orient2d } from 'robust-predicates';
import type { Point, Ring } from '../building/definition.js';

/** Twice the signed area, about the first vertex so that a far origin does not blur it. */
export function twiceArea(ring: Ring): number {
  const [ox, oy] = ring[0] as Point;
  let sum = 0;
  for (let i = 0; i < ring.length; i++) {
    const [ax, ay] = ring[i] as Point;
    const [bx, by] = ring[i + 1 === ring.length ? 0 : i + 1] as Point;
    sum += (ax - ox) * (by - oy) - (bx - ox) * (ay - oy);
  }
  return sum;
}

function side(a: Point, b: Point, c: Point): number {
  return Math.sign(orient2d(a[0], a[1], b[0], b[1], c[0], c[1]));
}

function onSegment(a: Point, b: Point, p: Point): boolean {
  return (
    Math.min(a[0], b[0]) <= p[0] &&
    p[0] <= Math.max(a[0], b[0]) &&
    Math.min(a[1], b[1]) <= p[1] &&
    p[1] <= Math.max(a[1], b[1])
  );
}

/** Whether two closed segments have a point in common, exactly. */
export function segmentsMeet(a: Point, b: Point, c: Point, d: Point): boolean {
  if (Math.max(a[0], b[0]) < Math.min(c[0], d[0]) || Math.max(c[0], d[0]) < Math.min(a[0], b[0])) return false;
  if (Math.max(a[1], b[1]) < Math.min(c[1], d[1]) || Math.max(c[1], d[1]) < Math.min(a[1], b[1])) return false;
  const abc = side(a, b, c);
  const abd = side(a, b, d);
  const cda = side(c, d, a);
  const cdb = side(c, d, b);
  if (abc * abd < 0 && cda * cdb < 0) return true;
  return (
    (abc === 0 && onSegment(a, b, c)) ||
    (abd === 0 && onSegment(a, b, d)) ||
    (cda === 0 && onSegment(c, d, a)) ||
    (cdb === 0 && onSegment(c, d, b))
  );
}

/** The first two edges of a ring that meet where they should not, by the index at which each starts. */
export function selfMeeting(ring: Ring): readonly [number, number] | undefined {
  const n = ring.length;
  const at = (i: number): Point => ring[i % n] as Point;
  for (let i = 0; i < n; i++) {
    for (let j = i + 1; j < n; j++) {
      const next = j === i + 1;
      const wraps = i === 0 && j === n - 1;
      if (!next && !wraps) {
        if (segmentsMeet(at(i), at(i + 1), at(j), at(j + 1))) return [i, j];
        continue;
      }
      // Neighbours share a vertex; they meet elsewhere only where one folds back on the other.
      const [before, shared, after] = next ? [at(i), at(j), at(j + 1)] : [at(j), at(0), at(1)];
      const folds =
        side(before, shared, after) === 0 &&
        (before[0] - shared[0]) * (after[0] - shared[0]) + (before[1] - shared[1]) * (after[1] - shared[1]) > 0;
      if (folds) return [i, j];
    }
  }
  return undefined;
}

/** Whether the borders of two rings have a point in common. */
export function bordersMeet(a: Ring, b: Ring): boolean {
  for (let i = 0; i < a.length; i++) {
    for (let j = 0; j < b.length; j++) {
      if (segmentsMeet(a[i] as Point, a[(i + 1) % a.length] as Point, b[j] as Point, b[(j + 1) % b.length] as Point))
        return true;
    }
  }
  return false;
}

/** Whether a point lies inside a ring or on its border, exactly. */
export function contains(ring: Ring, point: Point): boolean {
  let inside = false;
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i] as Point;
    const b = ring[(i + 1) % ring.length] as Point;
    const turn = side(a, b, point);
    if (turn === 0 && onSegment(a, b, point)) return true;
    if (a[1] > point[1] !== b[1] > point[1] && (b[1] > a[1] ? turn > 0 : turn < 0)) inside = !inside;
  }
  return inside;
}
