/**
 * A semi-rigid floor with edges along x and y as a sheet of bilinear rectangles on a grid through every edge and wall, chords as bars between
 * neighbours, walls as springs along the floor's whole cut. Stiffness of a rectangle by 2 × 2 Gauss points.
 */
import type { Building, Point } from '@groundward/engine/building/definition';
import { distinct, onFloor, inside, type Floor } from './plan.js';
import type { Spread } from './push.js';
import type { Storey } from './storeys.js';

type Use = (k: number, value: number) => void;

export type Sheet = {
  readonly unknowns: number;
  readonly stiffness: (put: (i: number, j: number, value: number) => void) => void;
  /** Nodal forces of a level force along a direction. */
  readonly push: (direction: Point, spread: Spread, force: number) => Float64Array;
  /** Shear of a wall from the displacements, as factors. */
  readonly forceInto: (storey: Storey, use: Use) => void;
  /** A force of 1 along a line, evenly over the floor's cut. */
  readonly spreadAlong: (storey: Storey, use: Use) => void;
};

export function sheetOf(
  building: Building,
  floor: Floor,
  touches: readonly Storey[],
  level: number,
  size: number,
): Sheet {
  const assembly = building.assemblies?.diaphragms?.find(({ id }) => id === floor.assembly);
  const shear = assembly?.apparentShearStiffness ?? NaN;
  const chord = assembly?.chordStiffness ?? 0;
  const axial = assembly?.axialStiffness ?? (chord > 0 ? 2 : 1000) * shear;
  const rings = [floor.outline, ...(floor.openings ?? []).map(({ outline }) => outline)];
  const zones = (floor.weight?.zones ?? []).map(({ outline }) => outline);
  const traces = (floor.weight?.lines ?? []).map(({ along }) => along);
  const grid = ([0, 1] as const).map((axis) => {
    const walls = touches.filter(({ along }) => Math.abs(along[axis]) < 1e-9).map(({ line }) => line.axis[0]);
    const corners = [...rings.flat(), ...zones.flat(), ...traces.flat(), ...walls].map((point) => point[axis]);
    const [from, to] = [Math.min(...floor.outline.map((p) => p[axis])), Math.max(...floor.outline.map((p) => p[axis]))];
    const breaks = distinct(corners.filter((at) => at >= from && at <= to));
    return [
      ...breaks.slice(1).flatMap((end, i) => {
        const start = breaks[i] as number;
        const parts = Math.ceil((end - start) / size - 1e-9);
        return Array.from({ length: parts }, (_, p) => start + ((end - start) * p) / parts);
      }),
      breaks[breaks.length - 1] as number,
    ];
  });
  const [xs, ys] = grid as [number[], number[]];
  const solid = (i: number, j: number): boolean => {
    const [x0, x1, y0, y1] = [xs[i], xs[i + 1], ys[j], ys[j + 1]];
    if (x0 === undefined || x1 === undefined || y0 === undefined || y1 === undefined) return false;
    return onFloor(floor, [(x0 + x1) / 2, (y0 + y1) / 2]);
  };
  const cells = xs.flatMap((_, i) => ys.flatMap((__, j) => (solid(i, j) ? [{ i, j }] : [])));
  const nodes = new Map<string, number>();
  const nodeAt = (i: number, j: number): number => {
    const key = `${i} ${j}`;
    if (!nodes.has(key)) nodes.set(key, nodes.size);
    return nodes.get(key) as number;
  };
  for (const { i, j } of cells) for (const [di, dj] of CORNERS) nodeAt(i + di, j + dj);
  const sides = (cell: { i: number; j: number }) =>
    [(xs[cell.i + 1] as number) - (xs[cell.i] as number), (ys[cell.j + 1] as number) - (ys[cell.j] as number)] as const;

  /** Pairs of neighbouring nodes on the floor along a wall, with their distance. */
  const stretches = ({ line, along }: Storey): { a: number; b: number; length: number }[] => {
    const vertical = Math.abs(along[0]) < 1e-9;
    const [own, other] = vertical ? [xs, ys] : [ys, xs];
    const at = own.findIndex((value) => Math.abs(value - line.axis[0][vertical ? 0 : 1]) < 1e-9);
    return other.slice(1).flatMap((end, k) => {
      const beside = vertical ? solid(at, k) || solid(at - 1, k) : solid(k, at) || solid(k, at - 1);
      if (!beside) return [];
      const [a, b] = vertical ? [nodeAt(at, k), nodeAt(at, k + 1)] : [nodeAt(k, at), nodeAt(k + 1, at)];
      return [{ a, b, length: end - (other[k] as number) }];
    });
  };
  const along = (storey: Storey, factor: number, use: Use): void => {
    const parts = stretches(storey);
    const whole = parts.reduce((sum, { length }) => sum + length, 0);
    for (const { a, b, length } of parts) {
      for (const node of [a, b]) {
        [0, 1].forEach((axis) =>
          use(2 * node + axis, ((factor * length) / whole / 2) * (storey.along[axis] as number)),
        );
      }
    }
  };

  return {
    unknowns: 2 * nodes.size,
    stiffness: (put) => {
      for (const cell of cells) {
        const [a, b] = sides(cell);
        const own = CORNERS.map(([di, dj]) => nodeAt(cell.i + di, cell.j + dj));
        rectangle(a, b, axial, shear).forEach((row, p) =>
          row.forEach((value, q) =>
            put(2 * (own[p >> 1] as number) + (p & 1), 2 * (own[q >> 1] as number) + (q & 1), value),
          ),
        );
      }
      if (chord > 0) {
        const bar = (p: number, q: number, axis: 0 | 1, length: number): void => {
          const [a, b] = [2 * p + axis, 2 * q + axis];
          for (const [i, j, sign] of [
            [a, a, 1],
            [b, b, 1],
            [a, b, -1],
            [b, a, -1],
          ] as const)
            put(i, j, (sign * chord) / length);
        };
        xs.forEach((x, i) =>
          ys.forEach((y, j) => {
            // An edge between floor and no floor is one of the outline or of an opening.
            if (solid(i, j) !== solid(i, j - 1)) bar(nodeAt(i, j), nodeAt(i + 1, j), 0, (xs[i + 1] as number) - x);
            if (solid(i, j) !== solid(i - 1, j)) bar(nodeAt(i, j), nodeAt(i, j + 1), 1, (ys[j + 1] as number) - y);
          }),
        );
      }
      for (const storey of touches) {
        if (storey.level !== level) continue;
        const parts = stretches(storey);
        const perLength = (storey.stiffness ?? NaN) / parts.reduce((sum, { length }) => sum + length, 0);
        for (const { a, b, length } of parts) {
          for (const [p, q, weight] of [
            [a, a, 2],
            [b, b, 2],
            [a, b, 1],
            [b, a, 1],
          ] as const) {
            for (const i of [0, 1] as const) {
              for (const j of [0, 1] as const) {
                put(2 * p + i, 2 * q + j, ((perLength * length * weight) / 6) * storey.along[i] * storey.along[j]);
              }
            }
          }
        }
      }
    },
    push: (direction, spread, force) => {
      const out = new Float64Array(2 * nodes.size);
      let whole = 0;
      const add = (node: number, value: number): void => {
        whole += value;
        [0, 1].forEach(
          (axis) => (out[2 * node + axis] = (out[2 * node + axis] as number) + value * (direction[axis] as number)),
        );
      };
      for (const { i, j } of cells) {
        const [a, b] = sides({ i, j });
        const centre: Point = [(xs[i] as number) + a / 2, (ys[j] as number) + b / 2];
        const zone = (floor.weight?.zones ?? []).find(({ outline }) => inside(outline, centre));
        const q = spread === 'area' ? 1 : (zone?.area ?? floor.weight?.area ?? 0);
        for (const [di, dj] of CORNERS) add(nodeAt(i + di, j + dj), (q * a * b) / 4);
      }
      if (spread === 'weight') {
        for (const { along: trace, perLength } of floor.weight?.lines ?? []) {
          trace.slice(1).forEach((end, k) => {
            const start = trace[k] as Point;
            const axis = Math.abs(end[0] - start[0]) < 1e-9 ? 1 : 0;
            const [own, other] = axis === 0 ? [ys, xs] : [xs, ys];
            const at = own.findIndex((value) => Math.abs(value - start[1 - axis]!) < 1e-9);
            const [low, high] = [Math.min(start[axis], end[axis]), Math.max(start[axis], end[axis])];
            other.slice(1).forEach((to, m) => {
              const from = other[m] as number;
              if (from < low - 1e-9 || to > high + 1e-9) return;
              const [p, q] = axis === 0 ? [nodeAt(m, at), nodeAt(m + 1, at)] : [nodeAt(at, m), nodeAt(at, m + 1)];
              for (const node of [p, q]) add(node, (perLength * (to - from)) / 2);
            });
          });
        }
      }
      return out.map((value) => (value * force) / whole);
    },
    forceInto: (storey, use) => along(storey, storey.stiffness ?? NaN, use),
    spreadAlong: (storey, use) => along(storey, 1, use),
  };
}

const CORNERS = [
  [0, 0],
  [1, 0],
  [1, 1],
  [0, 1],
] as const;

/** Stiffness of a bilinear rectangle a × b; two unknowns a corner, corners in order around it. */
function rectangle(a: number, b: number, axial: number, shear: number): number[][] {
  const k = Array.from({ length: 8 }, () => new Array<number>(8).fill(0));
  for (const gx of [-1, 1]) {
    for (const gy of [-1, 1]) {
      const [x, y] = [0.5 + gx / Math.sqrt(12), 0.5 + gy / Math.sqrt(12)];
      const dx = [-(1 - y), 1 - y, y, -y].map((value) => value / a);
      const dy = [-(1 - x), -x, x, 1 - x].map((value) => value / b);
      // Strains ε_x, ε_y, γ from the eight displacements.
      const rows = [
        dx.flatMap((value) => [value, 0]),
        dy.flatMap((value) => [0, value]),
        dx.flatMap((value, i) => [dy[i] as number, value]),
      ];
      [axial, axial, shear].forEach((modulus, r) => {
        const strain = rows[r] as number[];
        for (let i = 0; i < 8; i++) {
          for (let j = 0; j < 8; j++) {
            const row = k[i] as number[];
            row[j] = (row[j] as number) + (modulus * (strain[i] as number) * (strain[j] as number) * a * b) / 4;
          }
        }
      });
    }
  }
  return k;
}
