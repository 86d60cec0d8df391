/** One load sub-case carried down the building with the storey forces. */
import { shiftedBy, spreadOver, type Inertia } from '../diaphragms/inertia.js';
import type { Profile } from '../geometry/profile.js';
import { descendPosts, GRAVITY, type Components, type PostDescent } from '../walls/posts.js';
import type { SubCase } from './cases.js';
import { isBody, type Bodies } from './bodies.js';
import { descend, type LevelOutcome, type Pushed } from './descent.js';
import { edgeDrifts, torsionalAmplification } from './level-demands.js';
import type { LevelModel, Model } from './model.js';

export type CaseRun = {
  readonly subCase: SubCase;
  readonly outcomes: readonly (LevelOutcome | undefined)[];
  /** The level's inertia with its accidental eccentricity, for any set of forces. */
  readonly inertias: (level: LevelModel) => readonly Inertia[];
  /** Aₓ by level index. */
  readonly amplification: (level: number) => number;
  /** The run with Aₓ = 1 from which the amplification was found; absent where nothing is amplified. */
  readonly plain?: CaseRun;
};

export function runCase(model: Model, bodies: Bodies, subCase: SubCase): CaseRun {
  const once = (amplification: (level: number) => number, eccentricity = subCase.eccentricity): CaseRun => {
    const made = new Map<LevelModel, Inertia[]>();
    const inertias = (level: LevelModel): Inertia[] => {
      let known = made.get(level);
      if (known === undefined) {
        known = spreadOver(level.diaphragms, subCase.frame, subCase.spread, {
          facade: subCase.facade?.[level.index],
          liveShare: subCase.liveShare,
        }).map((inertia) => eccentric(inertia, eccentricity * amplification(level.index)));
        made.set(level, known);
      }
      return known;
    };
    const push = (level: LevelModel): Pushed[] => pushedBy(inertias(level), subCase.storeyForce, level, subCase.sign);
    return { subCase, outcomes: descend(model, bodies, push, 1), inertias, amplification };
  };
  const plain = once(() => 1);
  if (!subCase.amplified) return plain;
  // One Aₓ for a level: from whichever side the eccentricity is the more severe (ASCE 7-16 12.8.4.3).
  const opposite = once(() => 1, -subCase.eccentricity);
  const factors = plain.outcomes.map((outcome, level) =>
    Math.max(
      1,
      ...[outcome, opposite.outcomes[level]]
        .flatMap((each) => each?.diaphragms ?? [])
        .map((diaphragm) => torsionalAmplification(edgeDrifts(diaphragm, subCase))),
    ),
  );
  return { ...once((level) => factors[level] ?? 1), plain };
}

/** Accidental eccentricity is for diaphragms that can turn as one body. */
function eccentric(inertia: Inertia, ratio: number): Inertia {
  if (ratio === 0 || !isBody(inertia.diaphragm)) return inertia;
  const profile = inertia.diaphragm.profiles[inertia.frame] as Profile;
  return shiftedBy(inertia, ratio * (profile.to - profile.from));
}

export function pushedBy(
  inertias: readonly Inertia[],
  forces: readonly number[],
  level: LevelModel,
  sign: number,
): Pushed[] {
  const force = Float64Array.of((forces[level.index] as number) * sign);
  return inertias.map((inertia) => ({ inertia, force }));
}

/** The vertical way of all sub-cases at once: gravity first, then one component for each run. */
export function descendAll(model: Model, runs: readonly Pick<CaseRun, 'outcomes'>[]): PostDescent {
  const size = GRAVITY.length + runs.length;
  return descendPosts(
    model,
    (line, level) => {
      const shear: Components = new Float64Array(size);
      runs.forEach((run, c) => (shear[GRAVITY.length + c] = run.outcomes[level]?.below[line.index]?.[0] ?? 0));
      return shear;
    },
    size,
  );
}
