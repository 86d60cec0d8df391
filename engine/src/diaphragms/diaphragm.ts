/** Diaphragms as the analysis sees them: profiles in every frame that is needed, and the wall lines that they touch. */
import type { Behaviour, Diaphragm } from '../building/definition.js';
import { massOf, type Mass } from '../geometry/area.js';
import type { Frame } from '../geometry/frame.js';
import { cutAt, profileOf, type Cut, type Interval, type Profile } from '../geometry/profile.js';
import { openingPlans, type OpeningPlan } from './openings/opening-plan.js';
import { stepsOf, type StepPlan } from './steps/step.js';
import { tOn, type LineModel } from '../walls/wall-line.js';

/** A wall line where it runs through, or along the edge of, a diaphragm. */
export type Touch = { readonly line: LineModel; readonly cut: Cut };

export type DiaphragmModel = {
  readonly diaphragm: Diaphragm;
  /** `level/diaphragm` */
  readonly key: string;
  readonly level: number;
  /** Position in the file, for fault paths. */
  readonly path: string;
  readonly behaviour: Behaviour;
  /** By index of the frame: families of wall lines first, then directions of load cases. */
  readonly profiles: readonly Profile[];
  readonly mass: Mass;
  readonly touches: readonly Touch[];
  /** Steps of the outline by index of the frame. */
  readonly steps: readonly (readonly StepPlan[])[];
  /** Openings by index of the frame. */
  readonly openings: readonly (readonly OpeningPlan[])[];
};

export function diaphragmModel(
  diaphragm: Diaphragm,
  place: { readonly key: string; readonly level: number; readonly path: string },
  frames: readonly Frame[],
  lines: readonly LineModel[],
): DiaphragmModel {
  const profiles = frames.map((frame) => profileOf(diaphragm, frame));
  const touches: Touch[] = [];
  for (const line of lines) {
    if (line.storeys[place.level] === undefined && line.storeys[place.level + 1] === undefined) continue;
    const profile = profiles[line.family] as Profile;
    const cut = cutAt(profile, line.s);
    if (overlaps(cut.left, line, profile.tolerance) || overlaps(cut.right, line, profile.tolerance)) {
      touches.push({ line, cut });
    }
  }
  return {
    diaphragm,
    ...place,
    behaviour: diaphragm.behaviour ?? 'flexible',
    profiles,
    mass: massOf(diaphragm, profiles[0] as Profile),
    touches,
    steps: profiles.map((profile, frame) =>
      stepsOf(profile, diaphragm.outline, linesOf(touches, frame), diaphragm.transferLength),
    ),
    openings: profiles.map((profile, frame) =>
      openingPlans(profile, diaphragm.openings ?? [], linesOf(touches, frame), diaphragm.transferLength),
    ),
  };
}

function linesOf(touches: readonly Touch[], frame: number): number[] {
  return touches.flatMap(({ line }) => (line.family === frame ? [line.s] : [])).sort((a, b) => a - b);
}

function overlaps(intervals: readonly Interval[], line: LineModel, tolerance: number): boolean {
  const a = tOn(line, 0);
  const b = tOn(line, line.length);
  const low = Math.min(a, b);
  const high = Math.max(a, b);
  return intervals.some(([from, to]) => Math.min(to, high) - Math.max(from, low) > tolerance);
}
