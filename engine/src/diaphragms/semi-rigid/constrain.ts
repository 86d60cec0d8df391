/** Edges that a triangulation must have, brought in by exchanging diagonals. */
import Delaunator from 'delaunator';

export type Triangulation = {
  /** Three points a triangle. */
  readonly triangles: Uint32Array;
  /** For each side the side of the neighbour that lies on it, or −1. */
  readonly halfedges: Int32Array;
};

/**
 * Delaunay's triangulation of the points with the given edges; no two of them cross, and no point lies on one between its ends.
 *
 * @returns undefined where an edge cannot be brought in
 * Source: S. W. Sloan, A fast algorithm for generating constrained Delaunay triangulations, Computers & Structures 47 (1993).
 */
export function constrainedTriangulation(
  x: readonly number[],
  y: readonly number[],
  edges: readonly (readonly [number, number])[],
): Triangulation | undefined {
  const n = x.length;
  const places = new Float64Array(2 * n);
  for (let i = 0; i < n; i++) {
    places[2 * i] = x[i] as number;
    places[2 * i + 1] = y[i] as number;
  }
  const { triangles, halfedges } = new Delaunator(places);
  const sides = new Map<number, number>();
  for (let e = 0; e < triangles.length; e++) sides.set(keyOf(e), e);
  const kept = new Set(edges.map(([a, b]) => (a < b ? a * n + b : b * n + a)));

  for (const [a, b] of edges) {
    if (sideOf(a, b) !== undefined) continue;
    const made = bringIn(a, b);
    if (made === undefined) return undefined;
    restore(made);
  }
  return { triangles, halfedges };

  function start(e: number): number {
    return triangles[e] as number;
  }

  function end(e: number): number {
    return triangles[next(e)] as number;
  }

  function keyOf(e: number): number {
    return start(e) * n + end(e);
  }

  function sideOf(a: number, b: number): number | undefined {
    return sides.get(a * n + b) ?? sides.get(b * n + a);
  }

  /** Exchanges diagonals until none crosses the edge; the diagonals that came in its place. */
  function bringIn(a: number, b: number): [number, number][] | undefined {
    const crossing: [number, number][] = [];
    for (let e = 0; e < triangles.length; e++) {
      if ((halfedges[e] as number) > e && crosses(a, b, start(e), end(e))) crossing.push([start(e), end(e)]);
    }
    const made: [number, number][] = [];
    for (let spent = 0, most = 20 + 10 * crossing.length ** 2; crossing.length > 0; spent++) {
      if (spent > most) return undefined;
      const [u, v] = crossing.shift() as [number, number];
      const e = sideOf(u, v);
      if (e === undefined || (halfedges[e] as number) < 0) return undefined;
      const [p, q] = apexes(e);
      if (!crosses(u, v, p, q)) {
        crossing.push([u, v]);
        continue;
      }
      flip(e);
      if (crosses(a, b, p, q)) crossing.push([p, q]);
      else if (!(p === a && q === b) && !(p === b && q === a)) made.push([p, q]);
    }
    return sideOf(a, b) === undefined ? undefined : made;
  }

  /** Exchanges diagonals again where that makes better triangles, kept edges aside. */
  function restore(queue: [number, number][]): void {
    for (let spent = 0, most = 20 + 50 * queue.length; queue.length > 0 && spent < most; spent++) {
      const [u, v] = queue.pop() as [number, number];
      const e = sideOf(u, v);
      if (e === undefined || (halfedges[e] as number) < 0 || kept.has(u < v ? u * n + v : v * n + u)) continue;
      const [p, q] = apexes(e);
      if (!crosses(u, v, p, q) || !(sharpest(u, v, p, q) < sharpest(p, q, u, v))) continue;
      flip(e);
      queue.push([u, p], [p, v], [v, q], [q, u]);
    }
  }

  /** Whether two segments cross between their ends. */
  function crosses(a: number, b: number, c: number, d: number): boolean {
    if (a === c || a === d || b === c || b === d) return false;
    return turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0;
  }

  function turn(a: number, b: number, c: number): number {
    const [ax, ay] = [x[a] as number, y[a] as number];
    return Math.sign(
      ((x[b] as number) - ax) * ((y[c] as number) - ay) - ((y[b] as number) - ay) * ((x[c] as number) - ax),
    );
  }

  /** The smaller height over base² of the two triangles on u–v with apexes p and q, a measure of their angles. */
  function sharpest(u: number, v: number, p: number, q: number): number {
    return Math.min(quality(u, v, p), quality(u, v, q));
  }

  function quality(a: number, b: number, c: number): number {
    const square = (i: number, j: number): number =>
      ((x[i] as number) - (x[j] as number)) ** 2 + ((y[i] as number) - (y[j] as number)) ** 2;
    const [ax, ay] = [x[a] as number, y[a] as number];
    const double = Math.abs(
      ((x[b] as number) - ax) * ((y[c] as number) - ay) - ((y[b] as number) - ay) * ((x[c] as number) - ax),
    );
    return double / Math.max(square(a, b), square(b, c), square(c, a));
  }

  /** The third points of the two triangles on a side. */
  function apexes(e: number): [number, number] {
    return [start(previous(e)), start(previous(halfedges[e] as number))];
  }

  /** Puts the other diagonal into the two triangles on a side. */
  function flip(a: number): void {
    const b = halfedges[a] as number;
    const ar = previous(a);
    const bl = previous(b);
    for (const e of [a, next(a), ar, b, next(b), bl]) sides.delete(keyOf(e));
    const [p, q] = [start(ar), start(bl)];
    const [outA, outB] = [halfedges[bl] as number, halfedges[ar] as number];
    triangles[a] = q;
    triangles[b] = p;
    link(a, outA);
    link(b, outB);
    link(ar, bl);
    for (const e of [a, next(a), ar, b, next(b), bl]) sides.set(keyOf(e), e);
  }

  function link(a: number, b: number): void {
    halfedges[a] = b;
    if (b >= 0) halfedges[b] = a;
  }
}

function next(e: number): number {
  return e % 3 === 2 ? e - 2 : e + 1;
}

function previous(e: number): number {
  return e % 3 === 0 ? e + 2 : e - 1;
}
