/** Load cases and their sub-cases: each accidental eccentricity is run beside the case itself. */
import type { Building, PlainCase } from '../building/definition.js';
import { Refusal } from '../building/refusal.js';
import { dot, unitVector } from '../geometry/frame.js';
import type { DiaphragmForce } from '../loads/asce7/equivalent-lateral-force.js';
import { levelForces } from '../loads/level-forces.js';
import type { Spread } from '../diaphragms/inertia.js';
import { basisOf, isAsce, liveShare } from '../loads/basis-of.js';
import type { LoadPiece } from '../statics/span-load.js';
import { requiredEccentricities } from './accidental.js';
import type { Model } from './model.js';

export type SubCase = {
  /** `EX`, `EX/+e`, `EX/-e` */
  readonly id: string;
  readonly loadCase: PlainCase;
  readonly direction: readonly [number, number];
  readonly frame: number;
  /** 1 where the load acts along the frame's t, −1 against it. */
  readonly sign: 1 | -1;
  readonly spread: Spread;
  /** Part of the live load that lies with the weight. */
  readonly liveShare: number;
  /** Accidental eccentricity over the plan dimension across the load; 0 for the case itself. */
  readonly eccentricity: number;
  /** Whether the eccentricity is amplified by Aₓ. */
  readonly amplified: boolean;
  /** Torsional ratio above which the eccentricity stays; absent where it stays whatever the ratio. */
  readonly neededAbove?: number;
  /** Storey force and diaphragm design force by level index [force] */
  readonly storeyForce: readonly number[];
  readonly diaphragmForce: readonly number[];
  /** What the diaphragm design forces were chosen from, by level index, where a basis gave them [force] */
  readonly diaphragmLimits?: readonly (DiaphragmForce | undefined)[];
  /** Load along s by level index where it lies along a façade [force/length] */
  readonly facade?: readonly (readonly LoadPiece[])[];
};

/** @throws Refusal where the basis does not give the forces of a case */
export function subCases(building: Building, model: Model): SubCase[] {
  return building.loadCases.flatMap((loadCase) => {
    if (loadCase.from === 'combined') return [];
    const direction = unitVector(loadCase.direction);
    const frame = model.frameOf(direction);
    const stated = levelForces(building, loadCase);
    if (!stated.ok) throw new Refusal(stated.faults);
    const storeyForce = model.levels.map(() => 0);
    const diaphragmForce = model.levels.map(() => 0);
    const diaphragmLimits: (DiaphragmForce | undefined)[] = model.levels.map(() => undefined);
    const facade: (readonly LoadPiece[])[] = model.levels.map(() => []);
    for (const entry of stated.value) {
      const level = model.levels.find((candidate) => candidate.id === entry.level);
      if (level === undefined) continue;
      storeyForce[level.index] = entry.force;
      diaphragmForce[level.index] = entry.diaphragmForce;
      diaphragmLimits[level.index] = entry.limits;
      if (entry.line !== undefined) facade[level.index] = entry.line;
    }
    const t = model.frames[frame]?.t ?? direction;
    const whole: SubCase = {
      id: loadCase.id,
      loadCase,
      direction,
      frame,
      sign: dot([t[0], t[1]], [direction[0], direction[1]]) >= 0 ? 1 : -1,
      spread: windFromBasis(loadCase) ? 'facade' : (loadCase.spread ?? 'weight'),
      liveShare: liveShare(building, loadCase),
      eccentricity: 0,
      amplified: false,
      storeyForce,
      diaphragmForce,
      diaphragmLimits,
      ...(windFromBasis(loadCase) ? { facade } : {}),
    };
    if (windFromBasis(loadCase)) return windCases(building, model, whole);
    const accidental = loadCase.accidental;
    if (accidental === undefined) return [whole, ...requiredEccentricities(building, model, whole)];
    const amplified = accidental.amplified ?? false;
    return [
      whole,
      { ...whole, id: `${loadCase.id}/+e`, eccentricity: accidental.ratio, amplified },
      { ...whole, id: `${loadCase.id}/-e`, eccentricity: -accidental.ratio, amplified },
    ];
  });
}

function windFromBasis({ kind, from }: PlainCase): boolean {
  return kind === 'wind' && from === 'basis';
}

/** Cases 1 and 2 of ASCE 7-16 Fig. 27.3-8: the whole wind, and 75 % of it with an eccentricity of ±15 % of the width. */
function windCases(building: Building, model: Model, whole: SubCase): SubCase[] {
  const basis = basisOf(building, whole.loadCase);
  const turns = model.levels.some(({ diaphragms }) => diaphragms.some(({ behaviour }) => behaviour !== 'flexible'));
  if (!turns || !isAsce(basis) || basis.wind?.torsion === false) return [whole];
  const part = (forces: readonly number[]): number[] => forces.map((force) => 0.75 * force);
  const eccentric = (id: string, eccentricity: number): SubCase => ({
    ...whole,
    id: `${whole.id}/${id}`,
    eccentricity,
    storeyForce: part(whole.storeyForce),
    diaphragmForce: part(whole.diaphragmForce),
  });
  return [whole, eccentric('+e', 0.15), eccentric('-e', -0.15)];
}
