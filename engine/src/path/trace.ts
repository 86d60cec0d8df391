/** Up and down from a member: which masses feed its force, and at which supports it ends. Exact, since the descent is linear. */
import type { Building } from '../building/definition.js';
import type { Result } from '../building/fault.js';
import { Refusal } from '../building/refusal.js';
import { supportsOf } from '../diaphragms/flexible.js';
import type { Profile } from '../geometry/profile.js';
import { simpleSpans } from '../statics/beam.js';
import type { SpanLoad } from '../statics/span-load.js';
import { descendPosts, type PierFeet, type PostDescent } from '../walls/posts.js';
import type { LineModel, PierModel } from '../walls/wall-line.js';
import { runCase } from './run.js';
import { subCases, type SubCase } from './cases.js';
import { bodiesOf, type Bodies } from './bodies.js';
import { descend, type Channels, type LevelOutcome, type Pushed } from './descent.js';
import { buildModel, type LevelModel, type Model } from './model.js';
import type { Part, Trace } from './trace-result.js';

/**
 * @param member a key of the demand table or of a path node: level mass (`L2/L2-main`), span, collector, wall line, pier,
 *   end post (`1/L2/1a/from`) or support
 * @param caseId a load case or sub-case
 * @returns the parts, for sense 1, or a fault `unknown-member` or `unknown-case`
 */
export function trace(building: Building, member: string, caseId: string): Result<Trace> {
  try {
    return { ok: true, value: traceOf(building, member, caseId) };
  } catch (error) {
    if (error instanceof Refusal) return { ok: false, faults: error.faults };
    throw error;
  }
}

/** Everything that is carried down once, by source. */
type Sources = {
  readonly model: Model;
  readonly bodies: Bodies;
  readonly subCase: SubCase;
  /** The masses, from the top down. */
  readonly masses: readonly { readonly key: string; readonly level: string }[];
  readonly outcomes: readonly (LevelOutcome | undefined)[];
  readonly push: (level: LevelModel) => readonly Pushed[];
};

function traceOf(building: Building, member: string, caseId: string): Trace {
  const model = buildModel(building);
  const bodies = bodiesOf(model);
  const subCase = subCases(building, model).find((candidate) => candidate.id === caseId);
  if (subCase === undefined)
    throw new Refusal([
      unknown('unknown-case', caseId, 'a load case or sub-case of the building; of a combined case one of its parts'),
    ]);
  const { inertias } = runCase(model, bodies, subCase);
  const masses = [...model.levels]
    .reverse()
    .flatMap((level) => level.diaphragms.map((diaphragm) => ({ key: diaphragm.key, level: level.id })));
  const channel = new Map(masses.map(({ key }, c) => [key, c]));
  const push = (level: LevelModel): Pushed[] =>
    inertias(level).map((inertia) => {
      const force = new Float64Array(masses.length);
      force[channel.get(inertia.diaphragm.key) as number] = (subCase.storeyForce[level.index] as number) * subCase.sign;
      return { inertia, force };
    });
  const outcomes = descend(model, bodies, push, masses.length);
  const sources: Sources = { model, bodies, subCase, masses, outcomes, push };
  const found =
    ofMass(sources, member) ?? ofSpan(sources, member) ?? ofLine(sources, member) ?? ofPost(sources, member);
  if (found === undefined) {
    throw new Refusal([
      unknown('unknown-member', member, 'a mass, span, collector, wall line, pier, end post or support'),
    ]);
  }
  const force = found.up.reduce((sum, value) => sum + value, 0);
  const parts = (entries: readonly { member: string; level: string; force: number }[]): Part[] =>
    entries
      .filter((entry) => entry.force !== 0)
      .map((entry) => ({ ...entry, share: force === 0 ? 0 : entry.force / force }));
  return {
    schema: 'groundward.trace/1',
    units: building.units,
    member,
    case: caseId,
    force,
    up: parts(masses.map(({ key, level }, c) => ({ member: key, level, force: found.up[c] as number }))),
    down: parts(found.down),
  };
}

type Found = { readonly up: ArrayLike<number> & { reduce: Channels['reduce'] }; readonly down: readonly End[] };
type End = { readonly member: string; readonly level: string; readonly force: number };

function unknown(code: string, found: string, expected: string) {
  return { code, path: '', found, expected };
}

function ofMass(sources: Sources, member: string): Found | undefined {
  const { model, masses, subCase, push } = sources;
  const c = masses.findIndex((mass) => mass.key === member);
  if (c < 0) return undefined;
  const up = new Float64Array(masses.length);
  for (const level of model.levels) {
    for (const pushed of level.index === 0 ? [] : push(level)) {
      if (pushed.inertia.diaphragm.key === member)
        up[c] = pushed.inertia.share * (pushed.force[c] as number) * subCase.sign;
    }
  }
  return { up, down: baseEnds(sources, (line) => sources.outcomes[1]?.below[line.index]?.[c] ?? 0, subCase.direction) };
}

/** The load that a flexible span carries: its own level's mass, and what walls that stop put on it. */
function ofSpan(sources: Sources, member: string): Found | undefined {
  const { model, masses, subCase } = sources;
  for (const outcome of sources.outcomes) {
    for (const part of outcome?.diaphragms ?? []) {
      const { diaphragm, pushed, taken } = part;
      if (outcome === undefined || part.rigid !== undefined || !member.startsWith(`${diaphragm.key}/`)) continue;
      for (let frame = 0; frame < model.frames.length; frame++) {
        const supports = supportsOf(diaphragm, frame);
        const span = supports.findIndex(
          (s, i) => `${diaphragm.key}/${s.name}-${supports[i + 1]?.name ?? ''}` === member,
        );
        if (span < 0) continue;
        const tolerance = (diaphragm.profiles[frame] as Profile).tolerance;
        const places = supports.map((support) => support.s);
        const sign = frame === subCase.frame ? subCase.sign : 1;
        const up = new Float64Array(masses.length);
        const ends = { near: 0, far: 0 };
        const take = (load: SpanLoad, force: Channels): void => {
          const carried = simpleSpans(load, places, tolerance).spans[span];
          if (carried === undefined) return;
          for (let c = 0; c < up.length; c++) {
            const f = (force[c] as number) * sign;
            up[c] = (up[c] as number) + carried.force * f;
            ends.near += carried.near * f;
            ends.far += carried.far * f;
          }
        };
        if (frame === pushed.inertia.frame) take(pushed.inertia.load, pushed.force);
        for (const [line, force] of taken) {
          if (line.family === frame) take({ pieces: [], points: [{ s: line.s, force: line.sign }] }, force);
        }
        const into = model.lines.map(() => 0);
        for (const [force, support] of [
          [ends.near, supports[span]] as const,
          [ends.far, supports[span + 1]] as const,
        ]) {
          for (const { line, part: share } of support?.lines ?? []) into[line.index] = force * share * line.sign * sign;
        }
        const t = model.frames[frame]?.t ?? [1, 0];
        return { up, down: descendFrom(sources, outcome.level.index, into, [t[0] * sign, t[1] * sign]) };
      }
    }
  }
  return undefined;
}

/** Collector, wall line, pier and pier foot: shear along the line. */
function ofLine(sources: Sources, member: string): Found | undefined {
  const { model, outcomes } = sources;
  for (const line of model.lines) {
    for (let level = 1; level < model.levels.length; level++) {
      const storey = line.storeys[level];
      const outcome = outcomes[level];
      if (storey === undefined || outcome === undefined) continue;
      const id = outcome.level.id;
      const below = outcome.below[line.index] as Channels;
      if (member === `${line.line.id}/${id}`) return lineFound(sources, line, level, below, 1);
      if (member === `${id}/${line.line.id}`) {
        const above = line.storeys[level + 1] === undefined ? undefined : outcome.above[line.index];
        return lineFound(
          sources,
          line,
          level,
          below.map((value, c) => value - (above?.[c] ?? 0)),
          1,
        );
      }
      for (const pier of storey.piers) {
        if (member === pier.key) return lineFound(sources, line, level, below, pier.share);
        if (level === 1 && member === `${line.line.id}/${pier.pier.id}`) {
          const up = below.map((value) => value * pier.share);
          const force = up.reduce((sum, value) => sum + value, 0);
          return { up, down: [{ member, level: model.levels[0]?.id ?? '', force }] };
        }
      }
    }
  }
  return undefined;
}

function lineFound(sources: Sources, line: LineModel, level: number, shear: Channels, share: number): Found {
  const up = shear.map((value) => value * share);
  const into = sources.model.lines.map(() => 0);
  into[line.index] = up.reduce((sum, value) => sum + value, 0);
  return { up, down: descendFrom(sources, level, into, line.along) };
}

/** Shears in the storey under a level, carried on to the base without any other force; ends along a direction. */
function descendFrom(
  sources: Sources,
  level: number,
  shears: readonly number[],
  along: readonly [number, number],
): End[] {
  const above = shears.map((value) => Float64Array.of(value));
  if (level === 1) return baseEnds(sources, (line) => above[line.index]?.[0] ?? 0, along);
  const idle = (at: LevelModel): Pushed[] =>
    sources.push(at).map(({ inertia }) => ({ inertia, force: Float64Array.of(0) }));
  const outcomes = descend(sources.model, sources.bodies, idle, 1, { level: level - 1, above });
  return baseEnds(sources, (line) => outcomes[1]?.below[line.index]?.[0] ?? 0, along);
}

/** Feet of the lowest piers, their shear's part along a direction. */
function baseEnds(sources: Sources, shear: (line: LineModel) => number, along: readonly [number, number]): End[] {
  const { model } = sources;
  const level = model.levels[0]?.id ?? '';
  return model.lines.flatMap((line) =>
    (line.storeys[1]?.piers ?? []).map((pier) => ({
      member: `${line.line.id}/${pier.pier.id}`,
      level,
      force: shear(line) * pier.share * (line.along[0] * along[0] + line.along[1] * along[1]),
    })),
  );
}

/** End posts and their supports: axial force, compression positive. */
function ofPost(sources: Sources, member: string): Found | undefined {
  const { model, masses, outcomes } = sources;
  const size = masses.length;
  const none = new Float64Array(size);
  const descent = descendPosts(
    model,
    (line, level) => outcomes[level]?.below[line.index] ?? none,
    size,
    'without-gravity',
  );
  const carried = descent.carried.find((column) => column.key === member);
  if (carried !== undefined) {
    const total = carried.force.reduce((sum, value) => sum + value, 0);
    return { up: carried.force, down: [{ member, level: model.levels[0]?.id ?? '', force: total }] };
  }
  for (let level = 1; level < descent.feet.length; level++) {
    for (const foot of descent.feet[level] ?? []) {
      for (const end of ['from', 'to'] as const) {
        const support = level === 1 && member === `${foot.line.line.id}/${foot.pier.pier.id}/${end}`;
        if (!support && member !== `${foot.pier.key}/${end}`) continue;
        const up = end === 'from' ? foot.near : foot.far;
        const total = up.reduce((sum, value) => sum + value, 0);
        return { up, down: postEnds(model, foot.pier, end, total) };
      }
    }
  }
  return undefined;
}

/** One post's force on its own, from where it stands down to the supports. */
function postEnds(model: Model, pier: PierModel, end: 'from' | 'to', force: number): End[] {
  const none = new Float64Array(1);
  const descent: PostDescent = descendPosts(
    model,
    () => none,
    1,
    'without-gravity',
    (foot: PierFeet) => {
      if (foot.pier === pier) (end === 'from' ? foot.near : foot.far)[0] = force;
    },
  );
  const level = model.levels[0]?.id ?? '';
  const feet = (descent.feet[1] ?? []).flatMap(({ line, pier: lowest, near, far }) => [
    { member: `${line.line.id}/${lowest.pier.id}/from`, level, force: near[0] as number },
    { member: `${line.line.id}/${lowest.pier.id}/to`, level, force: far[0] as number },
  ]);
  return [
    ...feet,
    ...descent.carried.map((column) => ({ member: column.key, level, force: column.force[0] as number })),
  ];
}
