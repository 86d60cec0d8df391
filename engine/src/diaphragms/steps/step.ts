/**
 * Steps of an outline: where the floor just before and just after a cut does not reach over the same depth. What both sides have in
 * common carries the moment there; an edge of it that lies inside the floor of one side is an interrupted chord of that side.
 */
import type { Point, Ring } from '../../building/definition.js';
import { dot } from '../../geometry/frame.js';
import { totalLength, type Interval, type Profile, type Slab, type Wing } from '../../geometry/profile.js';
import { roomFor, type Room } from './room.js';

/** A chord that ends at a step and has to run on into the floor beyond it. */
export type InterruptedChord = {
  /** `corner-5`: after the outline's corner where it ends, counted from 1 in the file's order; of an opening `o1/corner-2`. */
  readonly name: string;
  readonly corner: number;
  readonly t: number;
  /** Whether it is the edge of the common depth that lies higher in t. */
  readonly upper: boolean;
};

/** The region beside a step that takes interrupted chords: a little beam lying across, between the edges of the floor. */
export type TransferPlan = {
  /** After its chord of the lowest corner. */
  readonly name: string;
  readonly step: number;
  /** Its end away from the step. */
  readonly end: number;
  readonly chords: readonly InterruptedChord[];
  /** The floor's edges at the step, on its side [length] */
  readonly lower: number;
  readonly upper: number;
  /** What ends it. */
  readonly endsAt: Room['endsAt'];
  /** Length that it would have with room enough, where that is not up to the next wall line or step [length] */
  readonly wanted?: number;
};

export type StepPlan = {
  /** After its lowest interrupted chord's corner. */
  readonly name: string;
  readonly s: number;
  /** What both sides have in common: it carries the moment [length] */
  readonly common: readonly Interval[];
  readonly transfers: readonly TransferPlan[];
  /** Why nothing is carried over: no common depth, or wings that do not go on as they are. */
  readonly open?: 'point' | 'wings';
};

/**
 * @param lines places of the wall lines along the cuts, ascending: a transfer region ends there at the latest [length]
 * @param stated length of the transfer regions; default up to the next wall line or step [length]
 * @returns ascending in s
 */
export function stepsOf(
  profile: Profile,
  outline: Ring,
  lines: readonly number[],
  stated: number | undefined,
): StepPlan[] {
  const { slabs, tolerance } = profile;
  const jumps = slabs.map((slab, i) => {
    const next = slabs[i + 1];
    return next !== undefined && !alike(atEnd(slab), atStart(next), tolerance);
  });
  if (!jumps.includes(true)) return [];
  const vertices = cornersOf(profile, outline);
  const steps: StepPlan[] = [];
  for (let i = 0; i < slabs.length; i++) {
    if (jumps[i] !== true) continue;
    const s = (slabs[i] as Slab).to;
    const before = atEnd(slabs[i] as Slab);
    const after = atStart(slabs[i + 1] as Slab);
    const common = commonOf(before, after, tolerance);
    const near = vertices.filter((corner) => Math.abs(corner.s - s) <= tolerance);
    const here = nameOf(near.map(({ number }) => number));
    if (common.length === 0) {
      steps.push({ name: here, s, common, transfers: [], open: 'point' });
      continue;
    }
    // Wings go into the floor beyond as they are, or their parts of the moment are not known.
    if ([before, after].some((side) => side.length > 1 && !alike(side, common, tolerance))) {
      steps.push({ name: here, s, common, transfers: [], open: 'wings' });
      continue;
    }
    const transfers: TransferPlan[] = [];
    for (const [side, ahead] of [
      [before, -1],
      [after, 1],
    ] as const) {
      const whole = side[0] as Interval;
      if (side.length > 1) continue;
      const chords = common
        .flatMap(([low, high]) => [
          { t: low, upper: false },
          { t: high, upper: true },
        ])
        .filter(({ t }) => t > whole[0] + tolerance && t < whole[1] - tolerance)
        .map(({ t, upper }): InterruptedChord => {
          const corner = nearest(near, t);
          return { name: nameOf([corner]), corner, t, upper };
        });
      if (chords.length === 0) continue;
      const places = chords.map(({ t }) => t);
      const room = roomFor(profile, i, ahead, places, (slab) => jumps[slab] === true, lines, stated);
      transfers.push({
        name: nameOf(chords.map(({ corner }) => corner)),
        step: s,
        end: room.end,
        endsAt: room.endsAt,
        chords,
        lower: whole[0],
        upper: whole[1],
      });
    }
    const corners = transfers.flatMap(({ chords }) => chords.map(({ corner }) => corner));
    steps.push({ name: corners.length === 0 ? here : nameOf(corners), s, common, transfers });
  }
  return steps;
}

/** After the lowest corner. */
function nameOf(corners: readonly number[]): string {
  return `corner-${Math.min(...corners)}`;
}

function atStart(slab: Slab): Interval[] {
  return slab.wings.map((wing: Wing): Interval => [wing.lower0, wing.upper0]);
}

function atEnd(slab: Slab): Interval[] {
  return slab.wings.map((wing: Wing): Interval => [wing.lower1, wing.upper1]);
}

function alike(a: readonly Interval[], b: readonly Interval[], tolerance: number): boolean {
  return (
    a.length === b.length &&
    a.every(
      ([low, high], i) =>
        Math.abs(low - (b[i] as Interval)[0]) <= tolerance && Math.abs(high - (b[i] as Interval)[1]) <= tolerance,
    )
  );
}

function commonOf(a: readonly Interval[], b: readonly Interval[], tolerance: number): Interval[] {
  return a.flatMap(([low, high]) =>
    b
      .map(([from, to]): Interval => [Math.max(low, from), Math.min(high, to)])
      .filter(([from, to]) => to - from > tolerance),
  );
}

export type Corner = { readonly number: number; readonly s: number; readonly t: number };

/** The vertices of a ring, numbered from 1. */
export function cornersOf({ frame }: Profile, outline: Ring): Corner[] {
  return outline.map((point: Point, i) => ({ number: i + 1, s: dot(point, frame.s), t: dot(point, frame.t) }));
}

/** Number of the corner nearest to a place along t. */
export function nearest(corners: readonly Corner[], t: number): number {
  let best: Corner | undefined;
  for (const corner of corners) {
    if (best === undefined || Math.abs(corner.t - t) < Math.abs(best.t - t)) best = corner;
  }
  return best?.number ?? 0;
}

/** The depth that carries the moment at a step [length] */
export function commonDepth(step: StepPlan): number {
  return totalLength(step.common);
}
