/** Diaphragms that move as one body in their plane, rigid or semi-rigid: made once for a building. */
import { Refusal } from '../building/refusal.js';
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import { cutOf } from '../diaphragms/inner-forces.js';
import { rigidModel, type RigidModel } from '../diaphragms/rigid.js';
import {
  membraneModel,
  stiffnessesOf,
  type MembraneModel,
  type Stiffnesses,
} from '../diaphragms/semi-rigid/membrane-model.js';
import type { Interval } from '../geometry/profile.js';
import { semiRigidBody, type SemiRigidBody } from '../diaphragms/semi-rigid/semi-rigid.js';
import type { LineModel } from '../walls/wall-line.js';
import { clip } from './collectors.js';
import type { Model } from './model.js';

/** A rigid diaphragm, or a semi-rigid one with what it would be if it were rigid. */
export type Body = RigidModel & { readonly semiRigid?: SemiRigidBody };

export type Bodies = ReadonlyMap<DiaphragmModel, Body>;

/** Whether a diaphragm takes all that its wall lines bring from above, and shares it with all of them. */
export function isBody({ behaviour }: DiaphragmModel): boolean {
  return behaviour === 'rigid' || behaviour === 'semi-rigid';
}

/** @throws Refusal where a body is not held, lacks a stiffness, or shares a wall line with another */
export function bodiesOf(model: Model): Bodies {
  const bodies = new Map<DiaphragmModel, Body>();
  const holder = new Map<string, DiaphragmModel>();
  const membranes = new Map<string, MembraneModel>();
  for (const level of model.levels) {
    for (const diaphragm of level.diaphragms) {
      if (!isBody(diaphragm)) continue;
      for (const { line } of diaphragm.touches) {
        const key = `${line.line.id}/${level.id}`;
        const other = holder.get(key);
        if (other !== undefined) throw new Refusal([sharedLine(line, other, diaphragm)]);
        holder.set(key, diaphragm);
      }
      const rigid = rigidModel(diaphragm, model.extent);
      if (diaphragm.behaviour === 'rigid') bodies.set(diaphragm, rigid);
      else {
        const stiffnesses = stiffnessesOf(model.building, diaphragm);
        const runsOn = (line: LineModel): readonly Interval[] => clip(cutOf(diaphragm, line), [line], level.id);
        const key = membraneKey(rigid, stiffnesses, runsOn);
        const alike = membranes.get(key);
        const membrane =
          alike === undefined ? membraneModel(diaphragm, rigid, stiffnesses, runsOn) : { ...alike, diaphragm, rigid };
        membranes.set(key, membrane);
        bodies.set(diaphragm, { ...rigid, semiRigid: semiRigidBody(membrane) });
      }
    }
  }
  return bodies;
}

/** Floors alike in all that their mesh and stiffness are made of share both: a tower is meshed and factored once. */
function membraneKey(
  { diaphragm, absolute }: RigidModel,
  stiffnesses: Stiffnesses,
  runsOn: (line: LineModel) => readonly Interval[],
): string {
  const { outline, openings = [], weight } = diaphragm.diaphragm;
  return JSON.stringify([
    outline,
    openings.map((opening) => opening.outline),
    (weight?.zones ?? []).map((zone) => zone.outline),
    [stiffnesses.shear, stiffnesses.axial, stiffnesses.chord, stiffnesses.size],
    absolute,
    diaphragm.touches.map(({ line }) => [line.index, line.storeys[diaphragm.level]?.stiffness, runsOn(line)]),
  ]);
}

function sharedLine(line: LineModel, first: DiaphragmModel, second: DiaphragmModel) {
  return {
    code: 'line-shared-by-rigid-diaphragms',
    path: second.path,
    found: `wall line ${line.line.id} held by two rigid or semi-rigid diaphragms, ${first.key} and ${second.key}`,
    expected: 'a wall line with at most one such diaphragm at a level',
    hint: 'draw the two as one diaphragm, or as two wall lines',
  };
}
