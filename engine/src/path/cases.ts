/** Load cases and their sub-cases: each accidental eccentricity is run beside the case itself. */
import type { Building, LoadCase } from '../building/definition.js';
import { Refusal } from '../building/refusal.js';
import { dot, unitVector } from '../geometry/frame.js';
import { levelForces } from '../loads/level-forces.js';
import type { Spread } from '../diaphragms/inertia.js';
import type { Model } from './model.js';

export type SubCase = {
  /** `EX`, `EX/+e`, `EX/-e` */
  readonly id: string;
  readonly loadCase: LoadCase;
  readonly direction: readonly [number, number];
  readonly frame: number;
  /** 1 where the load acts along the frame's t, −1 against it. */
  readonly sign: 1 | -1;
  readonly spread: Spread;
  /** Accidental eccentricity over the plan dimension across the load; 0 for the case itself. */
  readonly eccentricity: number;
  /** Whether the eccentricity is amplified by Aₓ. */
  readonly amplified: boolean;
  /** Storey force and diaphragm design force by level index [force] */
  readonly storeyForce: readonly number[];
  readonly diaphragmForce: readonly number[];
};

/** @throws Refusal where the basis does not give the forces of a case */
export function subCases(building: Building, model: Model): SubCase[] {
  return building.loadCases.flatMap((loadCase) => {
    const direction = unitVector(loadCase.direction);
    const frame = model.frameOf(direction);
    const stated = levelForces(building, loadCase);
    if (!stated.ok) throw new Refusal(stated.faults);
    const storeyForce = model.levels.map(() => 0);
    const diaphragmForce = model.levels.map(() => 0);
    for (const entry of stated.value) {
      const level = model.levels.find((candidate) => candidate.id === entry.level);
      if (level === undefined) continue;
      storeyForce[level.index] = entry.force;
      diaphragmForce[level.index] = entry.diaphragmForce;
    }
    const t = model.frames[frame]?.t ?? direction;
    const whole: SubCase = {
      id: loadCase.id,
      loadCase,
      direction,
      frame,
      sign: dot([t[0], t[1]], [direction[0], direction[1]]) >= 0 ? 1 : -1,
      spread: loadCase.spread ?? 'weight',
      eccentricity: 0,
      amplified: false,
      storeyForce,
      diaphragmForce,
    };
    const accidental = loadCase.accidental;
    if (accidental === undefined) return [whole];
    const amplified = accidental.amplified ?? false;
    return [
      whole,
      { ...whole, id: `${loadCase.id}/+e`, eccentricity: accidental.ratio, amplified },
      { ...whole, id: `${loadCase.id}/-e`, eccentricity: -accidental.ratio, amplified },
    ];
  });
}
