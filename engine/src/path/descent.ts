/**
 * The descent: level by level, what arrives from the walls above and the level's own inertia go through the diaphragms into the
 * walls below. Linear in all forces; several load sources can be carried side by side (`channels`) and their sum is the whole.
 */
import { Refusal } from '../building/refusal.js';
import { flexibleSpans, supportsOf } from '../diaphragms/flexible.js';
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import type { Inertia } from '../diaphragms/inertia.js';
import { displacementOf, springForce, type RigidModel } from '../diaphragms/rigid.js';
import { throughSemiRigid } from '../diaphragms/semi-rigid/semi-rigid.js';
import { cross, dot } from '../geometry/frame.js';
import { totalLength } from '../geometry/profile.js';
import { reactionsOf } from '../statics/beam.js';
import type { Vector3 } from '../statics/small-matrix.js';
import { pointOn, type LineModel } from '../walls/wall-line.js';
import { isBody, type Bodies, type Body } from './bodies.js';
import type { LevelModel, Model } from './model.js';

/** A force below this part of the largest beside it is rounding. */
const ROUNDING = 1e-12;

/** Force by channel [force]. */
export type Channels = Float64Array;

/** The inertia of one diaphragm with its force by channel, along the frame's t. */
export type Pushed = { readonly inertia: Inertia; readonly force: Channels };

export type DiaphragmOutcome = {
  readonly diaphragm: DiaphragmModel;
  readonly pushed: Pushed;
  /** What the diaphragm gives to each line that it holds on to, along the line's axis. */
  readonly given: ReadonlyMap<LineModel, Channels>;
  /** What lines that stop here, or that end in a rigid body, hand to it, along their axis. */
  readonly taken: ReadonlyMap<LineModel, Channels>;
  readonly rigid?: {
    readonly model: Body;
    /** Displacement by channel about the model's origin; of a semi-rigid diaphragm as if it were rigid. */
    readonly motion: readonly Vector3[];
    /** Of a semi-rigid diaphragm: u_x, u_y of every node in the diaphragm's axes, by channel [length] */
    readonly displacement?: readonly Float64Array[];
  };
};

export type LevelOutcome = {
  readonly level: LevelModel;
  /** Shear of each line in the storey above and below, along its axis, by line index. */
  readonly above: readonly Channels[];
  readonly below: readonly Channels[];
  readonly diaphragms: readonly DiaphragmOutcome[];
};

/**
 * From the top level down to the base.
 *
 * @param push     the inertia of a level, one entry for each of its diaphragms
 * @param channels number of sources carried side by side
 * @param start    a level to start at, with what arrives there; the top without anything where it is left out
 * @returns outcomes by level index; the base has none
 * @throws Refusal where a force finds no way on
 */
export function descend(
  model: Model,
  bodies: Bodies,
  push: (level: LevelModel) => readonly Pushed[],
  channels: number,
  start?: { readonly level: number; readonly above: readonly Channels[] },
): (LevelOutcome | undefined)[] {
  const outcomes: (LevelOutcome | undefined)[] = model.levels.map(() => undefined);
  let above: readonly Channels[] = start?.above ?? model.lines.map(() => new Float64Array(channels));
  for (let i = start?.level ?? model.levels.length - 1; i > 0; i--) {
    const level = model.levels[i] as LevelModel;
    const outcome = throughLevel(model, bodies, level, above, push(level), channels);
    outcomes[i] = outcome;
    above = outcome.below;
  }
  return outcomes;
}

/**
 * One level: (what the walls above hand down, the level's inertia) → (what the walls below get).
 */
export function throughLevel(
  model: Model,
  bodies: Bodies,
  level: LevelModel,
  above: readonly Channels[],
  pushed: readonly Pushed[],
  channels: number,
): LevelOutcome {
  const below = model.lines.map(() => new Float64Array(channels));
  // Which rigid body, if any, a line is held by at this level.
  const body = new Map<LineModel, DiaphragmModel>();
  for (const diaphragm of level.diaphragms) {
    if (isBody(diaphragm)) for (const { line } of diaphragm.touches) body.set(line, diaphragm);
  }
  const takers = new Map<DiaphragmModel, Map<LineModel, Channels>>(level.diaphragms.map((d) => [d, new Map()]));
  for (const line of model.lines) {
    const force = above[line.index] as Channels;
    if (line.storeys[level.index + 1] === undefined) continue;
    const rigid = body.get(line);
    if (rigid !== undefined) add(takers.get(rigid), line, force);
    else if (line.storeys[level.index] !== undefined) accumulate(below[line.index] as Channels, force, 1);
    else transfer(level, line, force, takers);
  }

  const outcomes = new Map<DiaphragmModel, DiaphragmOutcome>();
  for (const push of pushed) {
    const { diaphragm } = push.inertia;
    if (diaphragm.behaviour !== 'flexible') continue;
    const taken = takers.get(diaphragm) as Map<LineModel, Channels>;
    const given = throughFlexible(push, taken, channels);
    for (const [line, force] of given) {
      const rigid = body.get(line);
      if (rigid === undefined) accumulate(below[line.index] as Channels, force, 1);
      else add(takers.get(rigid), line, force);
    }
    outcomes.set(diaphragm, { diaphragm, pushed: push, given, taken });
  }
  for (const push of pushed) {
    const { diaphragm } = push.inertia;
    if (!isBody(diaphragm)) continue;
    const taken = takers.get(diaphragm) as Map<LineModel, Channels>;
    const rigid = bodies.get(diaphragm) as Body;
    const { given, ...moved } =
      rigid.semiRigid === undefined
        ? throughRigid(rigid, push, taken, channels)
        : throughSemiRigid(rigid.semiRigid, push.inertia, push.force, taken);
    for (const [line, force] of given) accumulate(below[line.index] as Channels, force, 1);
    outcomes.set(diaphragm, { diaphragm, pushed: push, given, taken, rigid: { model: rigid, ...moved } });
  }
  return {
    level,
    above,
    below,
    diaphragms: level.diaphragms.map((diaphragm) => outcomes.get(diaphragm) as DiaphragmOutcome),
  };
}

/** A wall that stops hands its shear to the flexible diaphragms that it meets, by the length along which it meets them. */
function transfer(
  level: LevelModel,
  line: LineModel,
  force: Channels,
  takers: ReadonlyMap<DiaphragmModel, Map<LineModel, Channels>>,
): void {
  const meets = level.diaphragms.flatMap((diaphragm) => {
    const touch = diaphragm.touches.find((candidate) => candidate.line === line);
    return touch === undefined
      ? []
      : [{ diaphragm, length: totalLength(touch.cut.left) + totalLength(touch.cut.right) }];
  });
  if (meets.length === 0) {
    if (force.every((value) => value === 0)) return;
    throw new Refusal([
      {
        code: 'open-end',
        path: `wallLines[${line.index}]`,
        found: `wall line ${line.line.id} stops at level ${level.id}, where it meets no diaphragm`,
        expected: 'a wall below it or a diaphragm that takes its shear',
      },
    ]);
  }
  const whole = meets.reduce((sum, { length }) => sum + length, 0);
  for (const { diaphragm, length } of meets) add(takers.get(diaphragm), line, force, length / whole);
}

function throughFlexible(
  push: Pushed,
  taken: ReadonlyMap<LineModel, Channels>,
  channels: number,
): Map<LineModel, Channels> {
  const { diaphragm, frame, load } = push.inertia;
  const given = new Map<LineModel, Channels>();
  const carry = (along: number, force: Channels, shape: typeof load): void => {
    if (force.every((value) => value === 0)) return;
    const supports = supportsOf(diaphragm, along);
    const reactions = reactionsOf(flexibleSpans(diaphragm, along, supports, shape));
    supports.forEach((support, i) => {
      for (const { line, part } of support.lines) {
        let into = given.get(line);
        if (into === undefined) given.set(line, (into = new Float64Array(channels)));
        accumulate(into, force, (reactions[i] as number) * part * line.sign);
      }
    });
  };
  carry(frame, push.force, load);
  for (const [line, force] of taken) {
    const along = force.map((value) => value * line.sign);
    carry(line.family, along, { pieces: [], points: [{ s: line.s, force: 1 }] });
  }
  return given;
}

function throughRigid(
  rigid: RigidModel,
  push: Pushed,
  taken: ReadonlyMap<LineModel, Channels>,
  channels: number,
): { given: Map<LineModel, Channels>; motion: Vector3[] } {
  const { inertia } = push;
  const frame = inertia.diaphragm.profiles[inertia.frame]?.frame ?? { s: [1, 0] as const, t: [0, 1] as const };
  const given = new Map<LineModel, Channels>(rigid.springs.map((spring) => [spring.line, new Float64Array(channels)]));
  const motion: Vector3[] = [];
  const arm = inertia.centre - dot(rigid.origin, [frame.s[0], frame.s[1]]);
  const turn = cross([frame.s[0], frame.s[1]], [frame.t[0], frame.t[1]]) * arm;
  for (let c = 0; c < channels; c++) {
    const own = inertia.share * (push.force[c] as number);
    let fx = own * frame.t[0];
    let fy = own * frame.t[1];
    let moment = own * turn;
    for (const [line, force] of taken) {
      const f = force[c] as number;
      const [x, y] = pointOn(line, 0);
      fx += f * line.along[0];
      fy += f * line.along[1];
      moment += f * cross([x - rigid.origin[0], y - rigid.origin[1]], line.along);
    }
    const u: Vector3 = fx === 0 && fy === 0 && moment === 0 ? [0, 0, 0] : displacementOf(rigid, [fx, fy, moment]);
    motion.push(u);
    const forces = rigid.springs.map((spring) => springForce(spring, u));
    // What is only the rounding of larger forces is none: a wall across the load of a symmetric plan has no demand.
    const negligible = ROUNDING * Math.max(...forces.map(Math.abs));
    rigid.springs.forEach((spring, i) => {
      const force = forces[i] as number;
      (given.get(spring.line) as Channels)[c] = Math.abs(force) > negligible ? force : 0;
    });
  }
  return { given, motion };
}

function accumulate(into: Channels, force: Channels, factor: number): void {
  for (let c = 0; c < into.length; c++) into[c] = (into[c] as number) + (force[c] as number) * factor;
}

function add(to: Map<LineModel, Channels> | undefined, line: LineModel, force: Channels, factor = 1): void {
  if (to === undefined) return;
  const known = to.get(line);
  if (known !== undefined) accumulate(known, force, factor);
  else to.set(line, factor === 1 ? Float64Array.from(force) : force.map((value) => value * factor));
}
