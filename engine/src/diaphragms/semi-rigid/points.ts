/**
 * The corner points of a mesh: on every edge that it must keep, and inside on a grid along the diaphragm's axes that runs through all
 * edges that lie along them.
 */
import type { Point, Ring } from '../../building/definition.js';
import { arrange, type Segment } from './arrangement.js';

export type Corners = {
  readonly x: number[];
  readonly y: number[];
  /** For each segment its corner points from a to b. */
  readonly chains: readonly number[][];
  readonly snap: (value: number) => number;
  readonly tolerance: number;
};

/** Grid points nearer to an edge than this part of the mesh size give way to it. */
const CLEAR = 0.35;
/** Grid lines are not led into an edge nearer to its end than this part of the mesh size. */
const SPARE = 0.2;

/**
 * @param segments outline, openings, wall lines and weight zones, in the diaphragm's axes
 * @param size     largest distance of grid lines [length]
 * @param inside   whether a place is on the floor
 */
export function cornersOf(
  segments: readonly Segment[],
  extent: number,
  size: number,
  inside: (x: number, y: number) => boolean,
): Corners {
  const { points, chains: coarse, snap, tolerance } = arrange(segments, extent);
  const { x, y } = points;
  const pieces = new Map<string, Piece>();
  for (const chain of coarse) for (let i = 0; i + 1 < chain.length; i++) addPiece(pieces, chain, i);

  const gridX: number[] = [];
  const gridY: number[] = [];
  for (const { a, b } of pieces.values()) {
    if (x[a] === x[b]) gridX.push(x[a] as number);
    if (y[a] === y[b]) gridY.push(y[a] as number);
  }
  gridX.push(Math.min(...x), Math.max(...x));
  gridY.push(Math.min(...y), Math.max(...y));
  for (const { a, b } of pieces.values()) {
    if (x[a] === x[b]) for (const end of [a, b]) addOptional(gridY, y[end] as number, CLEAR * size);
    if (y[a] === y[b]) for (const end of [a, b]) addOptional(gridX, x[end] as number, CLEAR * size);
  }
  const xs = filled(gridX, size, snap);
  const ys = filled(gridY, size, snap);

  for (const piece of pieces.values()) {
    const { a, b } = piece;
    const ends = { x0: x[a] as number, y0: y[a] as number, x1: x[b] as number, y1: y[b] as number };
    if (ends.x0 === ends.x1) {
      for (const at of between(ys, ends.y0, ends.y1, SPARE * size)) piece.inner.push(points.add(ends.x0, at));
    } else if (ends.y0 === ends.y1) {
      for (const at of between(xs, ends.x0, ends.x1, SPARE * size)) piece.inner.push(points.add(at, ends.y0));
    } else {
      const parts = Math.ceil(Math.hypot(ends.x1 - ends.x0, ends.y1 - ends.y0) / size - 1e-6);
      for (let i = 1; i < parts; i++) {
        const part = i / parts;
        piece.inner.push(
          points.add(snap(ends.x0 + (ends.x1 - ends.x0) * part), snap(ends.y0 + (ends.y1 - ends.y0) * part)),
        );
      }
    }
  }

  const chains = coarse.map((chain) => {
    const fine: number[] = [];
    for (let i = 0; i + 1 < chain.length; i++) {
      const from = chain[i] as number;
      const to = chain[i + 1] as number;
      const piece = pieces.get(keyOf(from, to)) as Piece;
      fine.push(from, ...(piece.a === from ? piece.inner : [...piece.inner].reverse()));
    }
    const last = chain[chain.length - 1];
    return last === undefined ? fine : [...fine, last];
  });
  const edges = [...pieces.values()].map(({ a, b }) => ({
    ax: x[a] as number,
    ay: y[a] as number,
    bx: x[b] as number,
    by: y[b] as number,
  }));
  for (const gx of xs) {
    for (const gy of ys) {
      if (points.at(gx, gy) !== undefined || !inside(gx, gy)) continue;
      const blocked = edges.some((edge) => {
        const aligned = edge.ax === edge.bx || edge.ay === edge.by;
        return distance(gx, gy, edge) <= (aligned ? tolerance : CLEAR * size);
      });
      if (!blocked) points.add(gx, gy);
    }
  }
  return { x, y, chains, snap, tolerance };
}

/** A stretch of a segment between two neighbouring meetings; shared by all segments that run over it. */
type Piece = { readonly a: number; readonly b: number; readonly inner: number[] };

function addPiece(pieces: Map<string, Piece>, chain: readonly number[], i: number): void {
  const a = chain[i] as number;
  const b = chain[i + 1] as number;
  const key = keyOf(a, b);
  if (!pieces.has(key)) pieces.set(key, { a: Math.min(a, b), b: Math.max(a, b), inner: [] });
}

function keyOf(a: number, b: number): string {
  return a < b ? `${a},${b}` : `${b},${a}`;
}

function addOptional(grid: number[], value: number, clear: number): void {
  if (grid.every((other) => Math.abs(other - value) >= clear)) grid.push(value);
}

/** Sorted, with evenly spaced lines between neighbours so that none is further than `size` from the next. */
function filled(grid: readonly number[], size: number, snap: (value: number) => number): number[] {
  const sorted = [...Float64Array.from(new Set(grid)).sort()];
  const out: number[] = [];
  sorted.forEach((value, i) => {
    out.push(value);
    const next = sorted[i + 1];
    if (next === undefined) return;
    const parts = Math.ceil((next - value) / size - 1e-6);
    for (let p = 1; p < parts; p++) out.push(snap(value + ((next - value) * p) / parts));
  });
  return out;
}

/** Grid lines between two places, from the first to the second; an end that is no grid line keeps its distance. */
function between(grid: readonly number[], from: number, to: number, spare: number): number[] {
  const low = Math.min(from, to);
  const high = Math.max(from, to);
  const lowSpare = grid.includes(low) ? 0 : spare;
  const highSpare = grid.includes(high) ? 0 : spare;
  const inner = grid.filter((g) => g > low + lowSpare && g < high - highSpare);
  return from < to ? inner : inner.reverse();
}

function distance(x: number, y: number, edge: { ax: number; ay: number; bx: number; by: number }): number {
  const dx = edge.bx - edge.ax;
  const dy = edge.by - edge.ay;
  const part = Math.min(1, Math.max(0, ((x - edge.ax) * dx + (y - edge.ay) * dy) / (dx * dx + dy * dy)));
  return Math.hypot(x - edge.ax - part * dx, y - edge.ay - part * dy);
}

/** Whether a place lies in a ring, by the even-odd rule. */
export function inRing(ring: Ring, x: number, y: number): boolean {
  let odd = false;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const [xi, yi] = ring[i] as Point;
    const [xj, yj] = ring[j] as Point;
    if (yi > y !== yj > y && x < ((xj - xi) * (y - yi)) / (yj - yi) + xi) odd = !odd;
  }
  return odd;
}
