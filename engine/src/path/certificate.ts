/** Equilibrium residuals of an analysis, relative to the forces involved. */
import type { Point } from '../building/definition.js';
import { cross } from '../geometry/frame.js';
import { GRAVITY, type PostDescent } from '../walls/posts.js';
import { pointOn } from '../walls/wall-line.js';
import type { SubCase } from './cases.js';
import type { LevelOutcome } from './descent.js';
import type { LevelModel, Model } from './model.js';
import type { Certificate } from './result.js';

/** Above this an analysis is refused. */
export const BOUND = 1e-9;
/** Where finite elements took part. */
export const MEMBRANE_BOUND = 1e-6;

export type Ledger = Map<string, { residual: number; where: string }>;

/** Keeps the largest residual of a kind of check; a non-finite one counts as infinite. */
export function enter(ledger: Ledger, what: string, where: string, difference: number, scale: number): void {
  const residual = scale > 0 ? Math.abs(difference) / scale : difference === 0 ? 0 : Infinity;
  const known = ledger.get(what);
  if (known === undefined || !(residual <= known.residual)) {
    ledger.set(what, { residual: Number.isNaN(residual) ? Infinity : residual, where });
  }
}

export function certificateOf(ledger: Ledger, bound: number): Certificate {
  let worst = { residual: 0, where: 'none' };
  const checks = [...ledger].map(([what, entry]) => {
    if (entry.residual > worst.residual) worst = entry;
    return { what, residual: entry.residual };
  });
  return { worstResidual: worst.residual, bound, worst: worst.where, checks };
}

/** Each level: what comes from above plus its own inertia is what goes into the walls below, along x, along y and in torsion. */
export function checkLevels(
  ledger: Ledger,
  model: Model,
  outcomes: readonly (LevelOutcome | undefined)[],
  caseId: string,
): void {
  const about = middleOf(model);
  for (const outcome of outcomes) {
    if (outcome === undefined) continue;
    const sum = { x: 0, y: 0, torsion: 0, scale: 0 };
    const add = (force: number, along: Point, place: Point): void => {
      sum.x += force * along[0];
      sum.y += force * along[1];
      sum.torsion += force * cross([place[0] - about[0], place[1] - about[1]], along);
      sum.scale += Math.abs(force);
    };
    for (const line of model.lines) {
      if (line.storeys[outcome.level.index + 1] !== undefined)
        add(outcome.above[line.index]?.[0] ?? 0, line.along, pointOn(line, 0));
      if (line.storeys[outcome.level.index] !== undefined)
        add(-(outcome.below[line.index]?.[0] ?? 0), line.along, pointOn(line, 0));
    }
    for (const { pushed } of outcome.diaphragms) {
      const { inertia, force } = pushed;
      const frame = model.frames[inertia.frame];
      if (frame === undefined) continue;
      add(inertia.share * (force[0] as number), frame.t, [frame.s[0] * inertia.centre, frame.s[1] * inertia.centre]);
    }
    const where = `level ${outcome.level.id}, case ${caseId}`;
    enter(ledger, 'level: horizontal forces', where, Math.hypot(sum.x, sum.y), sum.scale);
    enter(ledger, 'level: torsion', where, sum.torsion, sum.scale * model.extent);
  }
}

/** The middle of the plan, about which torsion is taken so that a far origin does not blur it. */
export function middleOf(model: Model): Point {
  let x = 0;
  let y = 0;
  let n = 0;
  for (const line of model.lines) {
    const [px, py] = pointOn(line, line.length / 2);
    x += px;
    y += py;
    n += 1;
  }
  return n === 0 ? [0, 0] : [x / n, y / n];
}

/** The whole building: base shear and torsion against the applied forces. */
export function checkBase(
  ledger: Ledger,
  model: Model,
  outcomes: readonly (LevelOutcome | undefined)[],
  caseId: string,
): void {
  const about = middleOf(model);
  const sum = { x: 0, y: 0, torsion: 0, scale: 0 };
  const add = (force: number, along: Point, place: Point): void => {
    sum.x += force * along[0];
    sum.y += force * along[1];
    sum.torsion += force * cross([place[0] - about[0], place[1] - about[1]], along);
    sum.scale += Math.abs(force);
  };
  for (const line of model.lines) {
    for (const pier of line.storeys[1]?.piers ?? []) {
      const shear = (outcomes[1]?.below[line.index]?.[0] ?? 0) * pier.share;
      add(-shear, line.along, pointOn(line, (pier.from + pier.to) / 2));
    }
  }
  for (const outcome of outcomes) {
    for (const { pushed } of outcome?.diaphragms ?? []) {
      const frame = model.frames[pushed.inertia.frame];
      if (frame === undefined) continue;
      const { centre, share } = pushed.inertia;
      add(share * (pushed.force[0] as number), frame.t, [frame.s[0] * centre, frame.s[1] * centre]);
    }
  }
  const where = `building, case ${caseId}`;
  enter(ledger, 'building: base shear', where, Math.hypot(sum.x, sum.y), sum.scale);
  enter(ledger, 'building: torsion at the base', where, sum.torsion, sum.scale * model.extent);
}

/** A component of the vertical way, with the sub-cases that push it, each with its factor. */
export type PostCheck = {
  readonly id: string;
  readonly component: number;
  readonly parts: readonly { readonly subCase: SubCase; readonly factor: number }[];
};

/**
 * The vertical way: at every storey what stands on it and its own gravity is what its posts carry; at the base the moment of all post
 * forces is the overturning moment of the applied forces.
 */
export function checkPosts(ledger: Ledger, model: Model, descent: PostDescent, cases: readonly PostCheck[]): void {
  const about = middleOf(model);
  for (let component = 0; component < GRAVITY.length + cases.length; component++) {
    const lateral = cases.find((entry) => entry.component === component);
    const what = lateral === undefined ? 'gravity' : 'overturning';
    const where = `base, ${lateral?.id ?? GRAVITY[component] ?? ''}`;
    const sum = { z: 0, mx: 0, my: 0, scale: 0 };
    const add = (force: number, [x, y]: Point): void => {
      sum.z += force;
      sum.mx += force * (x - about[0]);
      sum.my += force * (y - about[1]);
      sum.scale += Math.abs(force);
    };
    for (const { line, pier, near, far } of descent.feet[1] ?? []) {
      add(near[component] as number, pointOn(line, pier.posts[0]));
      add(far[component] as number, pointOn(line, pier.posts[1]));
    }
    for (const column of descent.carried) add(column.force[component] as number, column.place);
    if (lateral === undefined) {
      for (const storey of descent.feet) {
        for (const { line, pier } of storey) {
          for (const load of pier.pier.gravity ?? []) {
            if (load.case !== GRAVITY[component]) continue;
            add(-load.perLength * pier.length, pointOn(line, (pier.from + pier.to) / 2));
          }
        }
      }
      if (sum.scale === 0) continue;
    }
    let applied = 0;
    if (lateral !== undefined) {
      for (const { subCase, factor } of lateral.parts) {
        let moment = 0;
        for (const level of model.levels) moment += factor * overturningOf(model, level, subCase);
        applied += Math.abs(moment);
        sum.mx -= moment * subCase.direction[0];
        sum.my -= moment * subCase.direction[1];
      }
    }
    const scale = Math.max(sum.scale, Math.abs(applied) / model.extent);
    enter(ledger, `building: vertical, ${what}`, where, sum.z, scale);
    enter(ledger, `building: moment at the base, ${what}`, where, Math.hypot(sum.mx, sum.my), scale * model.extent);
  }
}

function overturningOf(model: Model, level: LevelModel, subCase: SubCase): number {
  const base = model.levels[0]?.elevation ?? 0;
  return (subCase.storeyForce[level.index] as number) * (level.elevation - base);
}
