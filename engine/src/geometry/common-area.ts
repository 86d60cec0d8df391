/** Area that two regions have in common, from their edges alone. */
import type { Point, Ring } from '../building/definition.js';

/** An outline less its openings. */
export type Region = { readonly outline: Ring; readonly openings?: readonly { readonly outline: Ring }[] | undefined };

/** An edge as the border of the area under it; `sign` is 1 where that area counts. */
type Edge = { x0: number; y0: number; x1: number; y1: number; sign: number };

/**
 * Exact but for rounding, of any two regions whose rings are simple polygons. A polygon is the signed sum of the trapezoids under its
 * edges, so what two polygons have in common is the signed sum, over pairs of edges, of the area under both edges of the pair.
 *
 * @returns area [length²]
 */
export function commonArea(a: Region, b: Region): number {
  const boxA = boxOf(a.outline);
  const boxB = boxOf(b.outline);
  const left = Math.max(boxA.left, boxB.left);
  const right = Math.min(boxA.right, boxB.right);
  if (!(right > left) || !(Math.min(boxA.high, boxB.high) > Math.max(boxA.low, boxB.low))) return 0;
  // Heights are measured from a line under both, near enough that a far origin does not blur them.
  const base: Point = [left, Math.min(boxA.low, boxB.low)];
  const edgesA = edgesUnder(a, base);
  const edgesB = edgesUnder(b, base);
  let sum = 0;
  for (const e of edgesA) {
    for (const f of edgesB) {
      const from = Math.max(e.x0, f.x0);
      const to = Math.min(e.x1, f.x1);
      if (to > from) sum += e.sign * f.sign * underBoth(e, f, from, to);
    }
  }
  return Math.max(sum, 0);
}

function boxOf(ring: Ring): { left: number; right: number; low: number; high: number } {
  let [left, right, low, high] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const [x, y] of ring) {
    left = Math.min(left, x);
    right = Math.max(right, x);
    low = Math.min(low, y);
    high = Math.max(high, y);
  }
  return { left, right, low, high };
}

function edgesUnder(region: Region, base: Point): Edge[] {
  const openings = region.openings ?? [];
  return [...edgesOf(region.outline, 1, base), ...openings.flatMap(({ outline }) => edgesOf(outline, -1, base))];
}

/** Edges from left to right; the area counts under the edges that a ring in clockwise order runs through from left to right. */
function edgesOf(ring: Ring, sign: 1 | -1, base: Point): Edge[] {
  const edges: Edge[] = [];
  let twice = 0;
  ring.forEach((start, i) => {
    const end = ring[(i + 1) % ring.length] as Point;
    const [x0, y0] = [start[0] - base[0], start[1] - base[1]];
    const [x1, y1] = [end[0] - base[0], end[1] - base[1]];
    twice += (x1 - x0) * (y0 + y1);
    if (x0 < x1) edges.push({ x0, y0, x1, y1, sign });
    else if (x1 < x0) edges.push({ x0: x1, y0: y1, x1: x0, y1: y0, sign: -sign });
  });
  return twice >= 0 ? edges : edges.map((edge) => ({ ...edge, sign: -edge.sign }));
}

function underBoth(e: Edge, f: Edge, from: number, to: number): number {
  const e0 = heightAt(e, from);
  const e1 = heightAt(e, to);
  const f0 = heightAt(f, from);
  const f1 = heightAt(f, to);
  const width = to - from;
  const gap0 = e0 - f0;
  const gap1 = e1 - f1;
  if (gap0 * gap1 >= 0) return (width * (gap0 + gap1 <= 0 ? e0 + e1 : f0 + f1)) / 2;
  const before = (width * gap0) / (gap0 - gap1);
  const crossing = e0 + ((e1 - e0) * before) / width;
  return (before * (Math.min(e0, f0) + crossing) + (width - before) * (crossing + Math.min(e1, f1))) / 2;
}

function heightAt(edge: Edge, x: number): number {
  if (x === edge.x0) return edge.y0;
  if (x === edge.x1) return edge.y1;
  return edge.y0 + ((edge.y1 - edge.y0) * (x - edge.x0)) / (edge.x1 - edge.x0);
}
