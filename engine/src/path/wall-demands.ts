/** Demands of wall lines, piers and supports. */
import type { FactoredCombination } from '../loads/combinations.js';
import { GRAVITY, type Components, type PierFeet, type PostDescent } from '../walls/posts.js';
import { pointOn } from '../walls/wall-line.js';
import type { Point } from '../building/definition.js';
import type { LevelOutcome } from './descent.js';
import type { Model } from './model.js';
import type { Quantity, Sense } from './result.js';
import { addBoth, addRow, type Table } from './table.js';

const SENSES: readonly Sense[] = [1, -1];

/** One load sub-case: its id, its component index and the combinations that it enters. */
export type LateralComponent = {
  readonly id: string;
  readonly component: number;
  readonly combinations: readonly FactoredCombination[];
};

/** Reaction, accumulated shear and overturning moment of each line in the storey under a level. */
export function lineDemands(
  table: Table,
  model: Model,
  outcomes: readonly (LevelOutcome | undefined)[],
  caseId: string,
): void {
  const overturning = model.lines.map(() => 0);
  for (let i = outcomes.length - 1; i > 0; i--) {
    const outcome = outcomes[i];
    if (outcome === undefined) continue;
    for (const line of model.lines) {
      const storey = line.storeys[i];
      if (storey === undefined) continue;
      const above = line.storeys[i + 1] === undefined ? 0 : (outcome.above[line.index]?.[0] ?? 0);
      const shear = outcome.below[line.index]?.[0] ?? 0;
      const reaction = shear - above;
      const moment = (overturning[line.index] as number) + shear * outcome.level.height;
      overturning[line.index] = moment;
      if (shear === 0 && reaction === 0 && moment === 0) continue;
      const member = `${line.line.id}/${outcome.level.id}`;
      const head = { member, kind: 'wall-line' as const, case: caseId };
      for (const sense of SENSES) {
        addRow(table, { ...head, quantity: 'reaction', value: reaction * sense, unit: table.units.force }, sense);
        addRow(table, { ...head, quantity: 'shear', value: shear * sense, unit: table.units.force }, sense);
      }
      addBoth(table, { ...head, quantity: 'overturning-moment', value: Math.abs(moment), unit: table.units.moment });
      for (const pier of storey.piers) {
        const pierHead = { member: pier.key, kind: 'pier' as const, case: caseId };
        const force = shear * pier.share;
        for (const sense of SENSES) {
          addRow(table, { ...pierHead, quantity: 'shear', value: force * sense, unit: table.units.force }, sense);
        }
        const value = Math.abs(force) / pier.length;
        addBoth(table, { ...pierHead, quantity: 'unit-shear', value, unit: table.units.perLength });
      }
    }
  }
}

/** End-post forces at the foot of every pier: the lateral component alone, and by combination. */
export function pierEndDemands(table: Table, descent: PostDescent, lateral: readonly LateralComponent[]): void {
  for (const storey of descent.feet) {
    for (const foot of storey) {
      const places: readonly [Point, Point] = [
        pointOn(foot.line, foot.pier.posts[0]),
        pointOn(foot.line, foot.pier.posts[1]),
      ];
      for (const { id, component, combinations } of lateral) {
        if (foot.near[component] === 0 && foot.far[component] === 0) continue;
        for (const sense of SENSES) {
          endRows(
            table,
            foot,
            places,
            id,
            sense,
            [foot.near[component] as number, foot.far[component] as number],
            sense,
          );
          for (const combination of combinations) {
            const near = factored(foot.near, combination, component, sense);
            const far = factored(foot.far, combination, component, sense);
            endRows(table, foot, places, id, sense, [near, far], 1, combination.id);
          }
        }
      }
    }
  }
}

function endRows(
  table: Table,
  foot: PierFeet,
  places: readonly [Point, Point],
  caseId: string,
  sense: Sense,
  [near, far]: readonly [number, number],
  factor: number,
  combination?: string,
): void {
  const a = near * factor;
  const b = far * factor;
  const low = Math.min(a, b);
  const high = Math.max(a, b);
  const head = { member: foot.pier.key, kind: 'pier' as const, case: caseId, unit: table.units.force };
  addRow(
    table,
    { ...head, quantity: 'end-tension', value: Math.max(0, -low), at: places[a <= b ? 0 : 1] },
    sense,
    combination,
  );
  addRow(
    table,
    { ...head, quantity: 'end-compression', value: Math.max(0, high), at: places[a <= b ? 1 : 0] },
    sense,
    combination,
  );
}

/** Compression under a combination. */
export function factored(
  force: Components,
  combination: FactoredCombination,
  component: number,
  sense: number,
): number {
  let sum = component < 0 ? 0 : combination.lateral * sense * (force[component] as number);
  for (let g = 0; g < GRAVITY.length; g++) {
    sum += combination.gravity[GRAVITY[g] as (typeof GRAVITY)[number]] * (force[g] as number);
  }
  return sum;
}

/** What arrives at the base: shear and moment at a pier's foot, uplift and bearing at its end posts and at posts carried down. */
export function supportDemands(
  table: Table,
  descent: PostDescent,
  shearAt: (foot: PierFeet, component: number) => number,
  lateral: readonly LateralComponent[],
  gravity: readonly FactoredCombination[],
): void {
  const { units } = table;
  for (const foot of descent.feet[1] ?? []) {
    const { line, pier } = foot;
    const member = `${line.line.id}/${pier.pier.id}`;
    const at = pointOn(line, (pier.from + pier.to) / 2);
    const moment = (near: number, far: number): number => (Math.abs(far - near) / 2) * pier.arm;
    for (const { id, component, combinations } of lateral) {
      const shear = Math.abs(shearAt(foot, component));
      const near = foot.near[component] as number;
      const far = foot.far[component] as number;
      if (shear === 0 && near === 0 && far === 0) continue;
      const add = (quantity: Quantity, value: number, unit: string, sense: Sense, combination?: string): void =>
        addRow(table, { member, kind: 'support', quantity, case: id, value, unit, at }, sense, combination);
      for (const sense of SENSES) {
        add('shear', shear, units.force, sense);
        add('moment', moment(near, far), units.moment, sense);
        for (const combination of combinations) {
          const a = factored(foot.near, combination, component, sense);
          const b = factored(foot.far, combination, component, sense);
          add('shear', shear * Math.abs(combination.lateral), units.force, sense, combination.id);
          add('moment', moment(a, b), units.moment, sense, combination.id);
        }
      }
    }
    postDemands(table, `${member}/from`, pointOn(line, pier.posts[0]), foot.near, lateral, gravity);
    postDemands(table, `${member}/to`, pointOn(line, pier.posts[1]), foot.far, lateral, gravity);
  }
  for (const column of descent.carried) postDemands(table, column.key, column.place, column.force, lateral, gravity);
}

function postDemands(
  table: Table,
  member: string,
  at: Point,
  force: Components,
  lateral: readonly LateralComponent[],
  gravity: readonly FactoredCombination[],
): void {
  const add = (caseId: string, sense: Sense, compression: number, combination?: string): void => {
    const head = { member, kind: 'support' as const, case: caseId, unit: table.units.force, at };
    addRow(table, { ...head, quantity: 'uplift', value: Math.max(0, -compression) }, sense, combination);
    addRow(table, { ...head, quantity: 'bearing', value: Math.max(0, compression) }, sense, combination);
  };
  GRAVITY.forEach((name, g) => {
    if (force[g] !== 0) add(name, 1, force[g] as number);
  });
  if (GRAVITY.some((_, g) => force[g] !== 0)) {
    for (const combination of gravity) add('gravity', 1, factored(force, combination, -1, 1), combination.id);
  }
  for (const { id, component, combinations } of lateral) {
    if (force[component] === 0) continue;
    for (const sense of SENSES) {
      add(id, sense, (force[component] as number) * sense);
      for (const combination of combinations) {
        add(id, sense, factored(force, combination, component, sense), combination.id);
      }
    }
  }
}
