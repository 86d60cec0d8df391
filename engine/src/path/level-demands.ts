/** Demands of levels: forces, storey shear, overturning, and the motion of rigid diaphragms. */
import { massWith } from '../geometry/area.js';
import { cross, dot } from '../geometry/frame.js';
import type { Profile } from '../geometry/profile.js';
import type { Vector3 } from '../statics/small-matrix.js';
import { pointOn } from '../walls/wall-line.js';
import type { SubCase } from './cases.js';
import type { DiaphragmOutcome } from './descent.js';
import type { CaseRun } from './run.js';
import type { Model } from './model.js';
import { largestBow, semiRigidMotion } from './semi-rigid-motion.js';
import { addBoth, type Table } from './table.js';

export function levelDemands(table: Table, model: Model, { subCase, outcomes, amplification, plain }: CaseRun): void {
  const { units } = table;
  let shear = 0;
  let moment = 0;
  for (let i = model.levels.length - 1; i > 0; i--) {
    const outcome = outcomes[i];
    if (outcome === undefined) continue;
    const { level } = outcome;
    shear += subCase.storeyForce[i] as number;
    moment += shear * level.height;
    const head = { member: level.id, kind: 'level' as const, case: subCase.id };
    const { storeyForce, diaphragmForce } = subCase;
    addBoth(table, { ...head, quantity: 'force', value: Math.abs(storeyForce[i] as number), unit: units.force });
    addBoth(table, {
      ...head,
      quantity: 'diaphragm-force',
      value: Math.abs(diaphragmForce[i] as number),
      unit: units.force,
    });
    addBoth(table, { ...head, quantity: 'storey-shear', value: Math.abs(shear), unit: units.force });
    addBoth(table, { ...head, quantity: 'overturning-moment', value: Math.abs(moment), unit: units.moment });
    const rigid = outcome.diaphragms.filter((diaphragm) => diaphragm.rigid !== undefined);
    for (const diaphragm of rigid) {
      const member = outcome.diaphragms.length === 1 ? level.id : diaphragm.diaphragm.key;
      // The ratio that decides on an irregularity is the one before any amplification (ASCE 7-16 12.8.4.3).
      const unamplified = plain?.outcomes[i]?.diaphragms.find((each) => each.diaphragm === diaphragm.diaphragm);
      const ratio = torsionalRatio(edgeDrifts(unamplified ?? diaphragm, subCase));
      rigidDemands(table, member, diaphragm, subCase, amplification(i), ratio);
    }
  }
}

function rigidDemands(
  table: Table,
  member: string,
  outcome: DiaphragmOutcome,
  subCase: SubCase,
  amplification: number,
  ratio: number | undefined,
): void {
  const rigid = outcome.rigid;
  if (rigid === undefined) return;
  const { units } = table;
  const { centre } = rigid.model;
  const mass = massWith(outcome.diaphragm.mass, subCase.liveShare).centre;
  const head = { member, kind: 'level' as const, case: subCase.id };
  addBoth(table, { ...head, quantity: 'centre-of-mass-x', value: mass[0], unit: units.length });
  addBoth(table, { ...head, quantity: 'centre-of-mass-y', value: mass[1], unit: units.length });
  addBoth(table, { ...head, quantity: 'centre-of-rigidity-x', value: centre[0], unit: units.length });
  addBoth(table, { ...head, quantity: 'centre-of-rigidity-y', value: centre[1], unit: units.length });
  addBoth(table, { ...head, quantity: 'torsion', value: Math.abs(torsionOf(outcome)), unit: units.moment });
  const drift = edgeDrifts(outcome, subCase);
  if (rigid.displacement !== undefined) bowDemands(table, head, outcome, subCase);
  if (ratio !== undefined) addBoth(table, { ...head, quantity: 'torsional-ratio', value: ratio, unit: units.none });
  if (subCase.eccentricity !== 0) {
    addBoth(table, { ...head, quantity: 'torsional-amplification', value: amplification, unit: units.none });
  }
  const motion = semiRigidMotion(outcome, subCase.frame);
  const largest = motion?.largest ?? drift.largest;
  if (rigid.model.absolute)
    addBoth(table, { ...head, quantity: 'drift', value: largest, unit: units.length, at: motion?.at });
}

/** How far a semi-rigid diaphragm bows out between its wall lines, and the largest ratio of that to their average drift. */
function bowDemands(
  table: Table,
  head: { readonly member: string; readonly kind: 'level'; readonly case: string },
  outcome: DiaphragmOutcome,
  subCase: SubCase,
): void {
  const bow = largestBow(semiRigidMotion(outcome, subCase.frame));
  if (bow === undefined) return;
  const { units } = table;
  addBoth(table, { ...head, quantity: 'deflection', value: bow.deflection, unit: units.length, at: bow.at });
  if (bow.drift > 0) {
    addBoth(table, { ...head, quantity: 'deflection-ratio', value: bow.deflection / bow.drift, unit: units.none });
  }
}

/** Moment about the centre of rigidity of all that acts on a rigid diaphragm [force·length] */
export function torsionOf(outcome: DiaphragmOutcome): number {
  const rigid = outcome.rigid;
  if (rigid === undefined) return 0;
  const { inertia, force } = outcome.pushed;
  const { s, t } = (inertia.diaphragm.profiles[inertia.frame] as Profile).frame;
  const { centre } = rigid.model;
  let moment = inertia.share * (force[0] as number) * cross(s, t) * (inertia.centre - dot(centre, s));
  for (const [line, taken] of outcome.taken) {
    const [x, y] = pointOn(line, 0);
    moment += (taken[0] as number) * cross([x - centre[0], y - centre[1]], line.along);
  }
  return moment;
}

/**
 * Displacements of the two edges of a rigid or semi-rigid diaphragm along the load, against the storey below: the largest and the average of both.
 * Of relative size where the stiffnesses are.
 *
 * Source: ASCE 7-16 12.3.2.1, Table 12.3-1 type 1: the largest against the average of the storey drifts at the two ends.
 */
export function edgeDrifts(outcome: DiaphragmOutcome, subCase: SubCase): { largest: number; average: number } {
  const rigid = outcome.rigid;
  if (rigid === undefined) return { largest: 0, average: 0 };
  const profile = outcome.diaphragm.profiles[subCase.frame] as Profile;
  const { s, t } = profile.frame;
  const bowed = semiRigidMotion(outcome, subCase.frame);
  if (bowed !== undefined) {
    const [a, b] = [bowed.near, bowed.far];
    return { largest: Math.max(Math.abs(a), Math.abs(b)), average: Math.abs(a + b) / 2 };
  }
  const motion = rigid.motion[0] as Vector3;
  const turn = cross(s, t);
  const at = (edge: number): number =>
    motion[0] * t[0] + motion[1] * t[1] + motion[2] * turn * (edge - dot(rigid.model.origin, s));
  const a = at(profile.from);
  const b = at(profile.to);
  return { largest: Math.max(Math.abs(a), Math.abs(b)), average: Math.abs(a + b) / 2 };
}

/** δmax over δavg; undefined where nothing moves on average. */
export function torsionalRatio(drift: { largest: number; average: number }): number | undefined {
  return drift.average > 0 ? drift.largest / drift.average : undefined;
}

/** Aₓ = (δmax / 1.2·δavg)², between 1 and 3. Source: ASCE 7-16 Eq. 12.8-14. */
export function torsionalAmplification(drift: { largest: number; average: number }): number {
  if (drift.average === 0) return drift.largest === 0 ? 1 : 3;
  const ratio = drift.largest / (1.2 * drift.average);
  return Math.min(3, Math.max(1, ratio * ratio));
}
