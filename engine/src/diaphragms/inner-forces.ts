/** Inner forces of a diaphragm along one frame: load, shear and moment with depth and chord depth, exact per piece. */
import { dot } from '../geometry/frame.js';
import { toPlan, totalLength, type Interval, type Profile, type Slab } from '../geometry/profile.js';
import { beamAlong } from '../statics/beam.js';
import type { LoadPiece, PointLoad, SpanLoad } from '../statics/span-load.js';
import type { LineModel } from '../walls/wall-line.js';
import type { DiaphragmModel } from './diaphragm.js';
import { openingTransfers } from './openings/opening.js';
import { linear, stepTransfers, type Transfer } from './steps/transfer.js';

export type InnerPiece = {
  readonly from: number;
  readonly to: number;
  /** Polynomials in (s − from), as in the analysis document. */
  readonly load: readonly number[];
  readonly shear: readonly number[];
  readonly moment: readonly number[];
  readonly depth: readonly number[];
  readonly chordDepth: readonly number[];
  /** t at mid-depth [length] */
  readonly middle: readonly number[];
  /** The slab of the profile in which it lies. */
  readonly slab: Slab;
};

export type InnerForces = {
  readonly diaphragm: DiaphragmModel;
  readonly frame: number;
  readonly profile: Profile;
  readonly pieces: readonly InnerPiece[];
  /** What interrupted chords give to the floor beside the steps of the outline. */
  readonly transfers: readonly Transfer[];
  readonly closingShear: number;
  readonly closingMoment: number;
};

/** The force with which a diaphragm and a wall line act on each other, along the line's axis [force]. */
export type NetForce = { readonly line: LineModel; readonly given: number; readonly taken: number };

/**
 * V(s) and M(s) by statics, with every wall force known. Lines along the frame are point forces; lines across or askew act evenly along
 * their cut: their part along the load is a load, their part across it a couple (a force f per length at t adds f·t per unit s, with t
 * measured from the centre of mass).
 *
 * @param inertia the level's load on the diaphragm along the frame's t, or nothing
 */
export function innerForces(
  diaphragm: DiaphragmModel,
  frame: number,
  inertia: SpanLoad,
  lines: readonly NetForce[],
): InnerForces {
  const profile = diaphragm.profiles[frame] as Profile;
  const pieces: LoadPiece[] = [...inertia.pieces];
  const points: PointLoad[] = [...inertia.points];
  const reactions: { s: number; force: number }[] = [];
  for (const { line, given, taken } of lines) {
    if (line.family === frame) {
      if (given !== 0) reactions.push({ s: line.s, force: given * line.sign });
      if (taken !== 0) points.push({ s: line.s, force: taken * line.sign });
    } else if (given !== taken) pieces.push(...askew(diaphragm, profile, line, (taken - given) * line.sign));
  }
  const breaks = profile.slabs.map((slab) => slab.from);
  breaks.push(profile.to);
  const steps = diaphragm.steps[frame] ?? [];
  for (const step of steps) for (const { end } of step.transfers) breaks.push(end);
  const openings = diaphragm.openings[frame] ?? [];
  for (const { halves } of openings) for (const { transfer } of halves) breaks.push(transfer.end);
  const beam = beamAlong({ pieces, points }, breaks, reactions, profile.tolerance);
  let next = 0;
  const inner = beam.pieces.map((piece): InnerPiece => {
    const middle = (piece.from + piece.to) / 2;
    while (next + 1 < profile.slabs.length && (profile.slabs[next] as Slab).to < middle) next += 1;
    const slab = profile.slabs[next] as Slab;
    const first = slab.strips[0];
    const last = slab.strips[slab.strips.length - 1];
    return {
      ...piece,
      depth: linear(slab, slab.depth0, slab.depth1, piece.from),
      chordDepth: linear(slab, slab.chord0, slab.chord1, piece.from),
      middle: linear(
        slab,
        ((first?.lower0 ?? 0) + (last?.upper0 ?? 0)) / 2,
        ((first?.lower1 ?? 0) + (last?.upper1 ?? 0)) / 2,
        piece.from,
      ),
      slab,
    };
  });
  return {
    diaphragm,
    frame,
    profile,
    pieces: inner,
    transfers: [
      ...stepTransfers(steps, inner, profile.tolerance),
      ...openingTransfers(openings, inner, profile.tolerance),
    ],
    closingShear: beam.closingShear,
    closingMoment: beam.closingMoment,
  };
}

/** A force along a line that does not run with the load, spread evenly along its cut. `force` is along the line's family. */
function askew(diaphragm: DiaphragmModel, profile: Profile, line: LineModel, force: number): LoadPiece[] {
  const intervals = cutOf(diaphragm, line);
  const length = totalLength(intervals);
  const { s, t } = profile.frame;
  const along = line.frame.t;
  const acrossPart = dot(along, s);
  const alongPart = dot(along, t);
  const reference = dot(diaphragm.mass.centre, t);
  return intervals.map(([t0, t1]) => {
    const a = toPlan(line.frame, line.s, acrossPart > 0 ? t0 : t1);
    const b = toPlan(line.frame, line.s, acrossPart > 0 ? t1 : t0);
    const from = dot(a, s);
    const to = dot(b, s);
    // [force per unit s]: even along the line, so per unit s by the ratio of the lengths
    const perSpan = (force * (t1 - t0)) / length / (to - from);
    const start = dot(a, t) - reference;
    const slope = (dot(b, t) - dot(a, t)) / (to - from);
    const f = perSpan * acrossPart;
    return { from, to, w: [perSpan * alongPart], couple: [-f * start, -f * slope] };
  });
}

/** The floor along a line: the deeper of both sides of its cut. */
export function cutOf(diaphragm: DiaphragmModel, line: LineModel): readonly Interval[] {
  const touch = diaphragm.touches.find((candidate) => candidate.line === line);
  if (touch === undefined) return [];
  return totalLength(touch.cut.left) > totalLength(touch.cut.right) ? touch.cut.left : touch.cut.right;
}

/** Shear just before and just after a place, along the frame's t [force]; 0 beyond the diaphragm. */
export function shearAt(inner: InnerForces, s: number): { before: number; after: number } {
  let before = 0;
  let after = 0;
  for (const piece of inner.pieces) {
    const length = piece.to - piece.from;
    const x = s - piece.from;
    if (x < -inner.profile.tolerance || x > length + inner.profile.tolerance) continue;
    let value = 0;
    for (let i = piece.shear.length - 1; i >= 0; i--) value = value * x + (piece.shear[i] as number);
    if (x > inner.profile.tolerance) before = value;
    if (x < length - inner.profile.tolerance) after = value;
  }
  return { before, after };
}
