/** Segments on plan cut at their crossings: points that are shared, and the chain of points along every segment. */
import type { Point } from '../../building/definition.js';

export type Segment = { readonly a: Point; readonly b: Point };

export class PointSet {
  readonly x: number[] = [];
  readonly y: number[] = [];
  private readonly known = new Map<number, Map<number, number>>();

  at(x: number, y: number): number | undefined {
    return this.known.get(x)?.get(y);
  }

  add(x: number, y: number): number {
    let column = this.known.get(x);
    if (column === undefined) {
      column = new Map<number, number>();
      this.known.set(x, column);
    }
    let index = column.get(y);
    if (index === undefined) {
      index = this.x.length;
      column.set(y, index);
      this.x.push(x);
      this.y.push(y);
    }
    return index;
  }
}

export type Arrangement = {
  readonly points: PointSet;
  /** For each segment its points from a to b, neighbours distinct. */
  readonly chains: readonly number[][];
  readonly snap: (value: number) => number;
  /** Places closer than this are one [length] */
  readonly tolerance: number;
};

/**
 * @param extent largest dimension [length]
 */
export function arrange(segments: readonly Segment[], extent: number): Arrangement {
  const tolerance = 4e-9 * extent;
  const step = 2 ** Math.floor(Math.log2(extent) - 36);
  // On a lattice of powers of two a turned plan has the same coordinates to the last bit, and ties of distance are ties.
  const snap = (value: number): number => Math.round(value / step) * step + 0;
  const ends = segments.flatMap(({ a, b }) => [a, b]);
  const xs = clusters(
    ends.map((p) => p[0]),
    tolerance,
    snap,
  );
  const ys = clusters(
    ends.map((p) => p[1]),
    tolerance,
    snap,
  );
  const points = new PointSet();
  const place = ([x, y]: Point): number => points.add(xs(x), ys(y));
  const cut = segments.map(({ a, b }) => [place(a), place(b)]);
  const stations = cut.map((c): { at: number; point: number }[] => [
    { at: 0, point: c[0] as number },
    { at: 1, point: c[1] as number },
  ]);
  const end = (i: number, e: 0 | 1): Point => {
    const p = cut[i]?.[e] as number;
    return [points.x[p] as number, points.y[p] as number];
  };
  for (let i = 0; i < segments.length; i++) {
    for (let j = 0; j < i; j++) meet(i, j);
  }

  function meet(i: number, j: number): void {
    const [a, b, c, d] = [end(i, 0), end(i, 1), end(j, 0), end(j, 1)];
    if (apart(a[0], b[0], c[0], d[0], tolerance) || apart(a[1], b[1], c[1], d[1], tolerance)) return;
    let touches = false;
    for (const [segment, from, to, other, e] of [
      [i, a, b, j, 0],
      [i, a, b, j, 1],
      [j, c, d, i, 0],
      [j, c, d, i, 1],
    ] as const) {
      const p = end(other, e);
      const at = stationOf(p, from, to, tolerance);
      if (at === undefined) continue;
      touches = true;
      stations[segment]?.push({ at, point: cut[other]?.[e] as number });
    }
    if (touches) return;
    const ux = b[0] - a[0];
    const uy = b[1] - a[1];
    const vx = d[0] - c[0];
    const vy = d[1] - c[1];
    const determinant = ux * vy - uy * vx;
    if (determinant === 0) return;
    const p = ((c[0] - a[0]) * vy - (c[1] - a[1]) * vx) / determinant;
    const q = ((c[0] - a[0]) * uy - (c[1] - a[1]) * ux) / determinant;
    if (!(p > 0 && p < 1 && q > 0 && q < 1)) return;
    const point = place([a[0] + p * ux, a[1] + p * uy]);
    stations[i]?.push({ at: p, point });
    stations[j]?.push({ at: q, point });
  }

  const chains = stations.map((row) => {
    row.sort((a, b) => a.at - b.at);
    return row.map(({ point }) => point).filter((point, i, all) => point !== all[i - 1]);
  });
  return { points, chains, snap, tolerance };
}

function apart(a: number, b: number, c: number, d: number, tolerance: number): boolean {
  return Math.max(a, b) < Math.min(c, d) - tolerance || Math.max(c, d) < Math.min(a, b) - tolerance;
}

/** Part of the way from a to b at which p lies on the segment, or undefined. */
function stationOf(p: Point, a: Point, b: Point, tolerance: number): number | undefined {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const length = Math.hypot(dx, dy);
  if (length === 0) return undefined;
  const off = Math.abs((p[0] - a[0]) * dy - (p[1] - a[1]) * dx) / length;
  if (off > tolerance) return undefined;
  const at = ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / length;
  if (at < -tolerance || at > length + tolerance) return undefined;
  return Math.min(1, Math.max(0, at / length));
}

/** Coordinates that differ by rounding become one value. */
function clusters(values: readonly number[], tolerance: number, snap: (value: number) => number) {
  const starts: number[] = [];
  let last = -Infinity;
  for (const value of Float64Array.from(values).sort()) {
    if (value - last > tolerance) starts.push(value);
    last = value;
  }
  return (value: number): number => {
    let low = 0;
    let high = starts.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if ((starts[middle] as number) <= value) low = middle + 1;
      else high = middle;
    }
    const start = starts[low - 1];
    const next = starts[low];
    if (start !== undefined && value - start <= 2 * tolerance) return snap(start);
    if (next !== undefined && next - value <= tolerance) return snap(next);
    return snap(value);
  };
}
