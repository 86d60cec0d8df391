/** How far the floor beside a step can serve as a transfer diaphragm. */
import type { Profile, Slab, Strip, Wing } from '../../geometry/profile.js';

export type Room = {
  readonly end: number;
  /**
   * `line` a wall line, `step` the next step, `stated` the length stated in the file, `edge` the end of the floor, `narrows` an interrupted
   * chord meets the floor's edge, `opening` it meets an opening, `wings` the floor parts into wings.
   */
  readonly endsAt: 'line' | 'step' | 'stated' | 'edge' | 'narrows' | 'opening' | 'wings';
};

/**
 * @param at     index of the slab before the step
 * @param ahead  1 for the side after the step, -1 for the side before it
 * @param chords t of the interrupted chords, inside the floor at the step [length]
 * @param jumps  whether a step lies at the end of a slab, by its index
 * @param lines  places of wall lines, ascending [length]
 * @param stated greatest length [length]
 */
export function roomFor(
  { slabs, tolerance }: Profile,
  at: number,
  ahead: 1 | -1,
  chords: readonly number[],
  jumps: (slab: number) => boolean,
  lines: readonly number[],
  stated: number | undefined,
): Room {
  const start = ahead > 0 ? (slabs[at + 1] as Slab).from : (slabs[at] as Slab).to;
  const beyond = (s: number): number => (s - start) * ahead;
  const line = ahead > 0 ? lines.find((s) => beyond(s) > tolerance) : lines.findLast((s) => beyond(s) > tolerance);
  const toLine = line === undefined ? Infinity : beyond(line);
  const toStated = stated ?? Infinity;
  let i = ahead > 0 ? at + 1 : at;
  for (;;) {
    const slab = slabs[i] as Slab;
    const near = ahead > 0 ? slab.from : slab.to;
    const far = ahead > 0 ? slab.to : slab.from;
    const met = slab.wings.length > 1 ? { part: 0, what: 'wings' as const } : meets(slab, ahead, chords, tolerance);
    const toMet = met === undefined ? Infinity : beyond(near + (far - near) * met.part);
    const least = Math.min(toLine, toStated, toMet);
    if (least < beyond(far) + tolerance) {
      if (toLine <= least + tolerance) return { end: line as number, endsAt: 'line' };
      if (met !== undefined && toMet <= least + tolerance) return { end: start + toMet * ahead, endsAt: met.what };
      return { end: start + least * ahead, endsAt: 'stated' };
    }
    const boundary = ahead > 0 ? i : i - 1;
    i += ahead;
    if (slabs[i] === undefined) return { end: far, endsAt: 'edge' };
    if (jumps(boundary)) return { end: far, endsAt: 'step' };
  }
}

/** Where the first chord leaves the floor within a slab, as part of it from the near side. */
function meets(
  slab: Slab,
  ahead: 1 | -1,
  chords: readonly number[],
  tolerance: number,
): { part: number; what: 'narrows' | 'opening' } | undefined {
  const wing = slab.wings[0] as Wing;
  let best: { part: number; what: 'narrows' | 'opening' } | undefined;
  const consider = (what: 'narrows' | 'opening', part: number | undefined): void => {
    if (part !== undefined && (best === undefined || part < best.part)) best = { part, what };
  };
  const facing = (start: number, end: number): Sides => (ahead > 0 ? [start, end] : [end, start]);
  for (const t of chords) {
    consider('narrows', firstBelow(facing(t - wing.lower0, t - wing.lower1), tolerance));
    consider('narrows', firstBelow(facing(wing.upper0 - t, wing.upper1 - t), tolerance));
    for (let k = 0; k + 1 < slab.strips.length; k++) {
      const low = slab.strips[k] as Strip;
      const high = slab.strips[k + 1] as Strip;
      if (high.lower0 - low.upper0 <= tolerance && high.lower1 - low.upper1 <= tolerance) continue;
      consider(
        'opening',
        firstInside(facing(t - low.upper0, t - low.upper1), facing(high.lower0 - t, high.lower1 - t), tolerance),
      );
    }
  }
  return best;
}

type Sides = readonly [near: number, far: number];

/** Where a linear distance first is no more than the tolerance. */
function firstBelow([near, far]: Sides, tolerance: number): number | undefined {
  if (near <= tolerance) return 0;
  return far <= tolerance ? near / (near - far) : undefined;
}

/** Where two linear distances first are both more than the tolerance, for more than a point. */
function firstInside(a: Sides, b: Sides, tolerance: number): number | undefined {
  let from = 0;
  let to = 1;
  for (const [near, far] of [a, b]) {
    const inNear = near > tolerance;
    const inFar = far > tolerance;
    if (!inNear && !inFar) return undefined;
    const crossing = inNear === inFar ? undefined : near / (near - far);
    if (crossing === undefined) continue;
    if (inNear) to = Math.min(to, crossing);
    else from = Math.max(from, crossing);
  }
  return to - from > 1e-9 ? from : undefined;
}
