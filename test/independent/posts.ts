/** The vertical way of a whole building as one dense system: the forces at the feet of all end posts are unknowns side by side. */
import { LuDecomposition, Matrix } from 'ml-matrix';
import type { Building, Pier, Point } from '@groundward/engine/building/definition';
import { cross, dot, extentOf, minus } from './plan.js';
import { levelsOf, storeysOf, type Storey } from './storeys.js';

export const GRAVITY = ['D', 'L', 'Lr', 'S'] as const;

/** Compression at the feet of one pier's posts, by component: D, L, Lr, S, then each lateral one [force] */
export type Feet = {
  readonly key: string;
  readonly storey: Storey;
  readonly pier: Pier;
  readonly arm: number;
  near: number[];
  far: number[];
};

export type Vertical = {
  readonly feet: readonly Feet[];
  /** Posts without a pier below them down to the base, by their key. */
  readonly carried: ReadonlyMap<string, number[]>;
};

/** @param shears shear of a line by `line/level`, one map for each lateral component [force] */
export function vertical(building: Building, shears: readonly ReadonlyMap<string, number>[]): Vertical {
  const levels = levelsOf(building);
  const piers = storeysOf(building).flatMap((storey) =>
    storey.piers.map((pier, i) => ({ storey, pier, share: storey.shares[i] as number })),
  );
  const components = GRAVITY.length + shears.length;
  const matrix = Matrix.eye(2 * piers.length, 2 * piers.length);
  const right = Matrix.zeros(2 * piers.length, components);
  const fall = new Map<number, string>();

  piers.forEach(({ storey, pier, share }, i) => {
    const [a, b] = postsOf(pier);
    shears.forEach((shear, c) => {
      const force = (shear.get(`${storey.line.id}/${levels[storey.level]?.id}`) ?? 0) * share;
      const couple = (force * storey.height) / (b - a);
      right.set(2 * i, GRAVITY.length + c, -couple);
      right.set(2 * i + 1, GRAVITY.length + c, couple);
    });
    for (const { case: name, perLength } of pier.gravity ?? []) {
      const weight = perLength * (pier.to - pier.from);
      const part = ((pier.from + pier.to) / 2 - a) / (b - a);
      const c = GRAVITY.indexOf(name);
      right.set(2 * i, c, right.get(2 * i, c) + weight * (1 - part));
      right.set(2 * i + 1, c, right.get(2 * i + 1, c) + weight * part);
    }
  });

  // Each post rests on a pier below: its force enters that pier's two posts by the lever.
  piers.forEach(({ storey, pier }, i) => {
    postsOf(pier).forEach((at, end) => {
      const place: Point = [
        storey.line.axis[0][0] + storey.along[0] * at,
        storey.line.axis[0][1] + storey.along[1] * at,
      ];
      for (let level = storey.level - 1; level >= 0; level--) {
        if (level === 0) {
          if (storey.level > 1)
            fall.set(
              2 * i + end,
              `${storey.line.id}/${levels[storey.level]?.id}/${pier.id}/${end === 0 ? 'from' : 'to'}`,
            );
          break;
        }
        const host = hostOf(storey, at, place, level);
        if (host === undefined) continue;
        const [a, b] = postsOf(host.pier);
        const part = (host.at - a) / (b - a);
        const row = 2 * host.index;
        matrix.set(row, 2 * i + end, matrix.get(row, 2 * i + end) - (1 - part));
        matrix.set(row + 1, 2 * i + end, matrix.get(row + 1, 2 * i + end) - part);
        break;
      }
    });
  });

  const solution = new LuDecomposition(matrix).solve(right);
  return {
    feet: piers.map(({ storey, pier }, i) => {
      const [a, b] = postsOf(pier);
      const key = `${storey.line.id}/${levels[storey.level]?.id}/${pier.id}`;
      return { key, storey, pier, arm: b - a, near: solution.getRow(2 * i), far: solution.getRow(2 * i + 1) };
    }),
    carried: new Map([...fall].map(([row, key]) => [key, solution.getRow(row)])),
  };

  /** The pier of a storey that a post comes down on: one of whose posts is near, one that it stands within, or one of another line. */
  function hostOf(
    storey: Storey,
    at: number,
    place: Point,
    level: number,
  ): { index: number; pier: Pier; at: number } | undefined {
    const tolerance =
      (building.postTolerance ?? (building.units.length === 'ft' ? 0.25 : 0.075)) + 1e-11 * extentOf(building);
    const here = piers
      .map((each, index) => ({ ...each, index }))
      .filter((each) => each.storey.level === level)
      .sort((a, b) => a.pier.from - b.pier.from);
    const own = here.filter((each) => each.storey.line === storey.line);
    const gap = (pier: Pier): number => Math.min(...postsOf(pier).map((post) => Math.abs(post - at)));
    const close = own.filter(({ pier }) => gap(pier) <= tolerance);
    // Of two posts as near as each other, that of the pier farther along the line.
    const nearest = close.reduce<(typeof own)[number] | undefined>(
      (best, each) => (best === undefined || gap(each.pier) <= gap(best.pier) + 1e-12 ? each : best),
      undefined,
    );
    const under = nearest ?? own.filter(({ pier }) => at >= pier.from && at <= pier.to).at(-1);
    if (under !== undefined) return { index: under.index, pier: under.pier, at };
    const little = 1e-9 * extentOf(building);
    const others = here
      .map((each) => {
        const from = minus(place, each.storey.line.axis[0]);
        const on = dot(from, each.storey.along);
        const off = Math.abs(cross(from, each.storey.along));
        const meets = off <= little && on >= each.pier.from - little && on <= each.pier.to + little;
        return { ...each, on, meets, square: Math.abs(cross(each.storey.along, storey.along)) };
      })
      .filter(({ meets }) => meets)
      .sort((a, b) =>
        Math.abs(a.square - b.square) > 1e-9 ? b.square - a.square : lengthOf(b.pier) - lengthOf(a.pier),
      );
    const first = others[0];
    return first === undefined ? undefined : { index: first.index, pier: first.pier, at: first.on };
  }
}

function lengthOf(pier: Pier): number {
  return pier.to - pier.from;
}

/** Near and far end post along the line's axis [length] */
function postsOf(pier: Pier): readonly [number, number] {
  const offset = pier.endOffset ?? 0;
  const [near, far] = typeof offset === 'number' ? [offset, offset] : offset;
  return [pier.from + near, pier.to - far];
}
