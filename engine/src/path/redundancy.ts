/** The redundancy factor ρ of a load case, found from what the loss of one wall would do to each storey. */
import type { SeismicRules } from '../loads/asce7/overstrength.js';
import { cross, dot } from '../geometry/frame.js';
import type { Profile } from '../geometry/profile.js';
import { solveSymmetric3, type Symmetric3, type Vector3 } from '../statics/small-matrix.js';
import type { LineModel, PierModel } from '../walls/wall-line.js';
import type { Model } from './model.js';
import type { DiaphragmOutcome, LevelOutcome } from './descent.js';
import type { CaseRun } from './run.js';

/** The removal that costs a storey most. */
export type Removal = {
  readonly level: string;
  readonly pier: string;
  /** Part of the storey's strength that goes with the pier. */
  readonly loss: number;
  /** Largest edge drift over the average without the pier; absent under flexible diaphragms. */
  readonly torsion?: number;
};

export type Redundancy = {
  readonly factor: 1 | 1.3;
  /** `category`: B or C; `removal`: every storey passes; `perimeter`: regular, with two bays on every side; `storey`: one fails. */
  readonly because: 'category' | 'removal' | 'perimeter' | 'storey';
  /** The worst removal over the storeys that resist more than 35 % of the base shear. */
  readonly worst?: Removal;
  /** Fewest bays on any side of any such storey. */
  readonly bays?: number;
};

const MOST_LOSS = 0.33;
const EXTREME = 1.4;
const COUNTED = 0.35;

/**
 * The strength of a storey goes by the length of its walls along the load; torsion without a pier is that of the rigid body with an
 * accidental eccentricity of 5 % either way.
 *
 * @param run   the case without eccentricity
 * @param rules of the case; `irregularities` decide on a regular plan
 * @param light whether light-frame walls alone brace the building: a bay is then half as long
 * Source: ASCE 7-16 12.3.4.1, 12.3.4.2 and Table 12.3-3; from memory, not checked against the document.
 */
export function redundancyOf(model: Model, run: CaseRun, rules: SeismicRules, light: boolean): Redundancy {
  if (rules.category === 'B' || rules.category === 'C') return { factor: 1, because: 'category' }; // 12.3.4.1
  const storeys = countedStoreys(model, run);
  let worst: Removal | undefined;
  let passes = true;
  for (const outcome of storeys) {
    for (const removal of removals(model, run, outcome)) {
      if (removal.loss > MOST_LOSS || (removal.torsion ?? 0) > EXTREME) passes = false;
      if (worst === undefined || severity(removal) > severity(worst)) worst = removal;
    }
  }
  const head = worst === undefined ? {} : { worst };
  if (passes) return { factor: 1, because: 'removal', ...head }; // 12.3.4.2(a)
  const bays = Math.min(...storeys.map((outcome) => fewestBays(model, run, outcome.level.index) * (light ? 2 : 1)));
  const regular = rules.irregularities.every((name) => !name.startsWith('horizontal'));
  if (regular && bays >= 2) return { factor: 1, because: 'perimeter', bays, ...head }; // 12.3.4.2(b)
  return { factor: 1.3, because: 'storey', bays, ...head };
}

function severity({ loss, torsion = 0 }: Removal): number {
  return Math.max(loss / MOST_LOSS, torsion / EXTREME);
}

/** Storeys that resist more than 35 % of the base shear. */
function countedStoreys(model: Model, { subCase, outcomes }: CaseRun): LevelOutcome[] {
  const base = subCase.storeyForce.reduce((sum, force) => sum + force, 0);
  let shear = 0;
  const out: LevelOutcome[] = [];
  for (let i = model.levels.length - 1; i > 0; i--) {
    shear += subCase.storeyForce[i] as number;
    const outcome = outcomes[i];
    if (outcome !== undefined && Math.abs(shear) > COUNTED * Math.abs(base)) out.push(outcome);
  }
  return out;
}

/** Every pier taller than long, taken away by itself. */
function removals(model: Model, run: CaseRun, outcome: LevelOutcome): Removal[] {
  const { index, id } = outcome.level;
  const { direction } = run.subCase;
  const strength = (line: LineModel, pier: PierModel): number =>
    pier.length * Math.abs(dot(line.along, [direction[0], direction[1]]));
  const piers = model.lines.flatMap((line) => (line.storeys[index]?.piers ?? []).map((pier) => ({ line, pier })));
  const whole = piers.reduce((sum, { line, pier }) => sum + strength(line, pier), 0);
  return piers
    .filter(({ line, pier }) => pier.height > pier.length && strength(line, pier) > 1e-9 * whole)
    .map(({ line, pier }): Removal => {
      const ratios = outcome.diaphragms.flatMap((diaphragm) => torsionWithout(run, diaphragm, line, pier));
      return {
        level: id,
        pier: pier.key,
        loss: strength(line, pier) / whole,
        ...(ratios.length === 0 ? {} : { torsion: Math.max(...ratios) }),
      };
    });
}

/** Edge drift ratios of a body without one pier, with the accidental eccentricity to either side; none where it does not hold the pier. */
function torsionWithout(run: CaseRun, outcome: DiaphragmOutcome, line: LineModel, pier: PierModel): number[] {
  const rigid = outcome.rigid;
  if (rigid === undefined || rigid.model.springs.every((spring) => spring.line !== line)) return [];
  const { springs, origin, stiffness } = rigid.model;
  const motion = rigid.motion[0] as Vector3;
  const profile = outcome.diaphragm.profiles[run.subCase.frame] as Profile;
  const { s, t } = profile.frame;
  const turn = cross(s, t);
  const force = times(stiffness, motion);
  const k: [number, number, number, number, number, number] = [0, 0, 0, 0, 0, 0];
  for (const spring of springs) {
    const own = spring.line === line ? spring.k * (1 - pier.share) : spring.k;
    const [ax, ay, ar] = spring.a;
    k[0] += own * ax * ax;
    k[1] += own * ax * ay;
    k[2] += own * ax * ar;
    k[3] += own * ay * ay;
    k[4] += own * ay * ar;
    k[5] += own * ar * ar;
  }
  const along = force[0] * t[0] + force[1] * t[1];
  return [0.05, -0.05].map((eccentricity) => {
    const moment = force[2] + along * turn * eccentricity * (profile.to - profile.from);
    const u = solveSymmetric3(k, [force[0], force[1], moment]);
    if (u === undefined) return Infinity;
    const at = (edge: number): number => u[0] * t[0] + u[1] * t[1] + u[2] * turn * (edge - dot(origin, s));
    const a = at(profile.from);
    const b = at(profile.to);
    return a + b === 0 ? Infinity : Math.max(Math.abs(a), Math.abs(b)) / (Math.abs(a + b) / 2);
  });
}

function times([xx, xy, xr, yy, yr, rr]: Symmetric3, [x, y, r]: Vector3): Vector3 {
  return [xx * x + xy * y + xr * r, xy * x + yy * y + yr * r, xr * x + yr * y + rr * r];
}

/** Bays of wall, length over storey height, along the edge of the plan that has the fewest, in the load's direction and across it. */
function fewestBays(model: Model, run: CaseRun, index: number): number {
  const level = model.levels[index];
  const frame = model.frames[run.subCase.frame];
  if (level === undefined || frame === undefined) return 0;
  let fewest = Infinity;
  for (const across of [frame.s, frame.t]) {
    const places = level.diaphragms.flatMap(({ diaphragm }) => diaphragm.outline.map((point) => dot(point, across)));
    for (const edge of [Math.min(...places), Math.max(...places)]) {
      let bays = 0;
      for (const line of model.lines) {
        if (Math.abs(dot(line.along, across)) > 1e-9) continue;
        if (Math.abs(dot(line.line.axis[0], across) - edge) > model.postTolerance) continue;
        for (const pier of line.storeys[index]?.piers ?? []) bays += pier.length / pier.height;
      }
      fewest = Math.min(fewest, bays);
    }
  }
  return fewest;
}
