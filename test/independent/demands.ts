/** The demands of walls, piers and supports from the independent solution, by the key of their row in an analysis. */
import type { Building } from '@groundward/engine/building/definition';
import type { PlainCase } from '@groundward/engine/building/load-cases';
import { directionOf, horizontal, type Load } from './horizontal.js';
import { levelForcesOf } from './level-forces.js';
import { GRAVITY, vertical } from './posts.js';
import { levelsOf, storeysOf, sum } from './storeys.js';

export type Key = { member: string; quantity: string; case: string; sense: number; combination?: string | undefined };

export function keyOf({ member, quantity, case: name, sense, combination }: Key): string {
  return [member, quantity, name, sense, combination ?? ''].join(' | ');
}

type Component = { readonly id: string; readonly loadCase: PlainCase; readonly shear: ReadonlyMap<string, number> };

/** Value by `keyOf`; combinations where the file lists its own. */
export function independentDemands(building: Building, meshSize?: number): Map<string, number> {
  const components = building.loadCases
    .filter((loadCase) => loadCase.from !== 'combined')
    .flatMap((loadCase) => componentsOf(building, loadCase, meshSize));
  const found = new Map<string, number>();
  const levels = levelsOf(building);
  const storeys = storeysOf(building);
  const put = (member: string, quantity: string, name: string, sense: number, value: number, combination?: string) =>
    void found.set(keyOf({ member, quantity, case: name, sense, combination }), value);

  for (const { id, shear } of components) {
    for (const storey of storeys) {
      const key = (level: number): string => `${storey.line.id}/${levels[level]?.id}`;
      const member = key(storey.level);
      const own = shear.get(member) as number;
      const overturning = sum(
        storeys
          .filter(({ line, level }) => line === storey.line && level >= storey.level)
          .map((each) => (shear.get(key(each.level)) as number) * each.height),
      );
      for (const sense of [1, -1]) {
        put(member, 'shear', id, sense, own * sense);
        put(member, 'reaction', id, sense, (own - (shear.get(key(storey.level + 1)) ?? 0)) * sense);
        put(member, 'overturning-moment', id, sense, Math.abs(overturning));
        storey.piers.forEach((pier, i) => {
          const part = own * (storey.shares[i] as number);
          put(`${member}/${pier.id}`, 'shear', id, sense, part * sense);
          put(`${member}/${pier.id}`, 'unit-shear', id, sense, Math.abs(part) / (pier.to - pier.from));
        });
      }
    }
  }

  const { feet, carried } = vertical(
    building,
    components.map(({ shear }) => shear),
  );
  const own = Array.isArray(building.combinations) ? building.combinations : [];
  /** Each way of adding components up: one alone, or a combination. */
  const sums = (
    use: (name: string, sense: number, of: (c: readonly number[]) => number, part: number, id?: string) => void,
  ) => {
    components.forEach(({ id, loadCase }, c) => {
      const at = GRAVITY.length + c;
      for (const sense of [1, -1]) {
        use(id, sense, (force) => sense * (force[at] as number), 1);
        for (const { id: combination, factors } of own) {
          const lateral = loadCase.kind === 'wind' ? (factors.W ?? 0) : (factors.E ?? 0);
          if (lateral === 0) continue;
          const of = (force: readonly number[]): number =>
            sum(GRAVITY.map((name, g) => (factors[name] ?? 0) * (force[g] as number))) +
            lateral * sense * (force[at] as number);
          use(id, sense, of, lateral, combination);
        }
      }
    });
  };
  const post = (member: string, force: readonly number[]): void => {
    GRAVITY.forEach((name, g) => {
      put(member, 'uplift', name, 1, Math.max(0, -(force[g] as number)));
      put(member, 'bearing', name, 1, Math.max(0, force[g] as number));
    });
    sums((name, sense, of, _, combination) => {
      put(member, 'uplift', name, sense, Math.max(0, -of(force)), combination);
      put(member, 'bearing', name, sense, Math.max(0, of(force)), combination);
    });
  };
  for (const { key, storey, pier, arm, near, far } of feet) {
    sums((name, sense, of, _, combination) => {
      put(key, 'end-tension', name, sense, Math.max(0, -of(near), -of(far)), combination);
      put(key, 'end-compression', name, sense, Math.max(0, of(near), of(far)), combination);
    });
    if (storey.level !== 1) continue;
    const member = `${storey.line.id}/${pier.id}`;
    sums((name, sense, of, lateral, combination) => {
      const shear = Math.abs(found.get(keyOf({ member: key, quantity: 'shear', case: name, sense })) ?? NaN);
      put(member, 'shear', name, sense, shear * Math.abs(lateral), combination);
      put(member, 'moment', name, sense, (Math.abs(of(far) - of(near)) / 2) * arm, combination);
    });
    post(`${member}/from`, near);
    post(`${member}/to`, far);
  }
  for (const [key, force] of carried) post(key, force);
  return found;
}

/** The case itself and, with accidental eccentricity, the load moved either way, amplified where the case says so. */
function componentsOf(building: Building, loadCase: PlainCase, meshSize: number | undefined): Component[] {
  const plain: Load = {
    direction: directionOf(loadCase.direction),
    spread: loadCase.spread ?? 'weight',
    forces: levelForcesOf(building, loadCase),
    eccentricity: () => 0,
  };
  const solve = (eccentricity: (level: string) => number) => horizontal(building, { ...plain, eccentricity }, meshSize);
  const whole = { id: loadCase.id, loadCase, shear: solve(() => 0).shear };
  const { accidental } = loadCase;
  if (accidental === undefined) return [whole];
  const { ratio, amplified = false } = accidental;
  const sides = [ratio, -ratio].map((by) => solve(() => by));
  // ASCE 7-16 Eq. 12.8-14, the same for both sides of a level.
  const factor = (level: string): number =>
    Math.max(
      1,
      ...sides.flatMap(({ edges }) =>
        (edges.get(level) ?? []).map(([a, b]) => {
          const average = Math.abs(a + b) / 2;
          return Math.min(3, (Math.max(Math.abs(a), Math.abs(b)) / (1.2 * average)) ** 2);
        }),
      ),
    );
  const factors = new Map(building.levels.map(({ id }) => [id, amplified ? factor(id) : 1]));
  return [
    whole,
    ...[ratio, -ratio].map((by) => ({
      id: `${loadCase.id}/${by > 0 ? '+e' : '-e'}`,
      loadCase,
      shear: solve((level) => by * (factors.get(level) ?? 1)).shear,
    })),
  ];
}
