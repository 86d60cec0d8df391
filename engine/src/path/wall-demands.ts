/** Demands of wall lines, piers and supports. */
import type { FactoredCombination } from '../loads/combinations.js';
import { GRAVITY, type Components, type PierFeet, type PostDescent } from '../walls/posts.js';
import { pierDeflection } from '../walls/pier-deflection.js';
import { pointOn } from '../walls/wall-line.js';
import type { Point } from '../building/definition.js';
import type { LevelOutcome } from './descent.js';
import type { Model } from './model.js';
import type { Quantity, Sense } from './result.js';
import type { Supporting } from './supporting.js';
import { put, type Table } from './table.js';

const SENSES: readonly Sense[] = [1, -1];

/** One load sub-case: its id, its component index and the combinations that it enters. */
export type LateralComponent = {
  readonly id: string;
  readonly component: number;
  readonly combinations: readonly FactoredCombination[];
  /** The combinations with overstrength, for what stands under walls that stop. */
  readonly overstrength: readonly FactoredCombination[];
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
      const { force, length, moment: momentUnit, perLength } = table.units;
      for (const sense of SENSES) {
        put(table, member, 'wall-line', 'reaction', caseId, sense, reaction * sense, force, undefined, undefined);
        put(table, member, 'wall-line', 'shear', caseId, sense, shear * sense, force, undefined, undefined);
        put(
          table,
          member,
          'wall-line',
          'overturning-moment',
          caseId,
          sense,
          Math.abs(moment),
          momentUnit,
          undefined,
          undefined,
        );
      }
      for (const pier of storey.piers) {
        const own = shear * pier.share;
        const unitShear = Math.abs(own) / pier.length;
        const deflection = pier.deflecting && pierDeflection(pier.deflecting, own);
        for (const sense of SENSES) {
          put(table, pier.key, 'pier', 'shear', caseId, sense, own * sense, force, undefined, undefined);
          put(table, pier.key, 'pier', 'unit-shear', caseId, sense, unitShear, perLength, undefined, undefined);
          if (deflection === undefined) continue;
          put(table, pier.key, 'pier', 'deflection', caseId, sense, deflection.total, length, undefined, undefined);
        }
      }
    }
  }
}

/** End-post forces at the foot of every pier: the lateral component alone, and by combination. */
export function pierEndDemands(
  table: Table,
  descent: PostDescent,
  supporting: Supporting,
  lateral: readonly LateralComponent[],
): void {
  for (const storey of descent.feet) {
    for (const foot of storey) {
      const places: readonly [Point, Point] = [
        pointOn(foot.line, foot.pier.posts[0]),
        pointOn(foot.line, foot.pier.posts[1]),
      ];
      const carries = supporting.feet.has(foot);
      for (const { id, component, combinations, overstrength } of lateral) {
        if (foot.near[component] === 0 && foot.far[component] === 0) continue;
        for (const sense of SENSES) {
          const a = (foot.near[component] as number) * sense;
          const b = (foot.far[component] as number) * sense;
          endRows(table, foot, places, id, sense, a, b);
          for (const combination of carries ? [...combinations, ...overstrength] : combinations) {
            const near = factored(foot.near, combination, component, sense);
            const far = factored(foot.far, combination, component, sense);
            endRows(table, foot, places, id, sense, near, far, combination.id);
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
  near: number,
  far: number,
  combination?: string,
): void {
  const { key } = foot.pier;
  const { force } = table.units;
  const [pulled, pushed] = near <= far ? places : [places[1], places[0]];
  put(table, key, 'pier', 'end-tension', caseId, sense, Math.max(0, -near, -far), force, pulled, combination);
  put(table, key, 'pier', 'end-compression', caseId, sense, Math.max(0, near, far), force, pushed, combination);
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
  supporting: Supporting,
  shearAt: (foot: PierFeet, component: number) => number,
  lateral: readonly LateralComponent[],
  gravity: readonly FactoredCombination[],
): void {
  const { units } = table;
  const raised = lateral.map((each) => ({ ...each, combinations: [...each.combinations, ...each.overstrength] }));
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
        put(table, member, 'support', quantity, id, sense, value, unit, at, combination);
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
    const own = supporting.feet.has(foot) ? raised : lateral;
    postDemands(table, `${member}/from`, pointOn(line, pier.posts[0]), foot.near, own, gravity);
    postDemands(table, `${member}/to`, pointOn(line, pier.posts[1]), foot.far, own, gravity);
  }
  for (const { key, place, force } of descent.carried)
    postDemands(table, key, place, force, supporting.columns.has(key) ? raised : lateral, gravity);
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
    const { force: unit } = table.units;
    put(table, member, 'support', 'uplift', caseId, sense, Math.max(0, -compression), unit, at, combination);
    put(table, member, 'support', 'bearing', caseId, sense, Math.max(0, compression), unit, at, combination);
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
