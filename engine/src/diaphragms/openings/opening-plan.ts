/** Where the strips beside an opening lie, and how far the floor beyond its sides can take their inner edges. */
import type { Opening } from '../../building/definition.js';
import { dot } from '../../geometry/frame.js';
import { cutAt, type Interval, type Profile, type Slab, type Wing } from '../../geometry/profile.js';
import { roomFor, type Room } from '../steps/room.js';
import { cornersOf, nearest, type InterruptedChord, type TransferPlan } from '../steps/step.js';

/** One half of an opening, between one of its sides along the load and its middle. */
export type OpeningHalf = {
  readonly side: number;
  /** -1 for the near half, 1 for the far one. */
  readonly ahead: 1 | -1;
  /** All strips of the cut at the middle, on this side of it [length] */
  readonly strips: readonly Interval[];
  /** Of them, those that border on the opening. */
  readonly beside: readonly Interval[];
  /** The floor beyond the side. */
  readonly transfer: TransferPlan;
};

export type OpeningPlan = {
  readonly opening: Opening;
  readonly from: number;
  readonly to: number;
  readonly middle: number;
  readonly halves: readonly OpeningHalf[];
};

/**
 * The edges of the strips along the opening are tied into the floor beyond both sides: over the stated length of transfer diaphragms, by
 * default over half of the floor's depth there, where the next wall line, step or opening leaves room for it.
 *
 * @param lines  places of the wall lines along the cuts, ascending [length]
 * @param stated length of transfer diaphragms [length]
 */
export function openingPlans(
  profile: Profile,
  openings: readonly Opening[],
  lines: readonly number[],
  stated: number | undefined,
): OpeningPlan[] {
  // An opening narrower than the tolerance of places leaves no mark in the profile.
  if (openings.length === 0 || profile.slabs.length < 2) return [];
  const { slabs, tolerance, frame } = profile;
  const jumps = slabs.map((slab, i) => {
    const next = slabs[i + 1];
    return next !== undefined && steps(slab, next, tolerance);
  });
  return openings.map((opening) => {
    const s = opening.outline.map((point) => dot(point, frame.s));
    const t = opening.outline.map((point) => dot(point, frame.t));
    const from = Math.min(...s);
    const to = Math.max(...s);
    const middle = (from + to) / 2;
    const cut = cutAt(profile, middle);
    const vertices = cornersOf(profile, opening.outline);
    const halves = ([-1, 1] as const).map((ahead): OpeningHalf => {
      const edge = ahead < 0 ? from : to;
      const strips = ahead < 0 ? cut.left : cut.right;
      const beside = stripsBeside(strips, Math.min(...t), Math.max(...t), tolerance);
      const at = nearestEnd(slabs, edge);
      const beyond = slabs[ahead < 0 ? at : at + 1] as Slab;
      const side = (slabs[at] as Slab).to;
      const edges = facing(beyond, ahead);
      const here = vertices.filter((corner) => Math.abs(corner.s - side) <= tolerance);
      const chords = beside
        .flatMap(([low, high]) => [
          { t: low, upper: false },
          { t: high, upper: true },
        ])
        .filter((edge) =>
          strips.some(([low, high]) => (edge.upper ? low > edge.t - tolerance : high < edge.t + tolerance)),
        )
        .filter((edge) => Math.min(...t) - tolerance <= edge.t && edge.t <= Math.max(...t) + tolerance)
        .map((edge): InterruptedChord => {
          const corner = nearest(here, edge.t);
          return { ...edge, corner, name: `${opening.id}/corner-${corner}` };
        });
      const wanted = stated ?? (edges[1] - edges[0]) / 2;
      // In line with a step the strips' outer edges end too: nothing is tied there, and a finding says so.
      const room: Room =
        jumps[at] === true
          ? { end: side, endsAt: 'step' }
          : roomFor(
              profile,
              at,
              ahead,
              chords.map((chord) => chord.t),
              (slab) => jumps[slab] === true,
              lines,
              wanted,
            );
      return {
        side,
        ahead,
        strips,
        beside,
        transfer: {
          name: `${opening.id}/corner-${Math.min(...chords.map(({ corner }) => corner))}`,
          step: side,
          end: room.end,
          endsAt: room.endsAt,
          chords,
          lower: edges[0],
          upper: edges[1],
          wanted,
        },
      };
    });
    return { opening, from, to, middle, halves };
  });
}

function steps(slab: Slab, next: Slab, tolerance: number): boolean {
  return (
    slab.wings.length !== next.wings.length ||
    slab.wings.some((wing, i) => {
      const other = next.wings[i] as Wing;
      return Math.abs(wing.lower1 - other.lower0) > tolerance || Math.abs(wing.upper1 - other.upper0) > tolerance;
    })
  );
}

/** The outermost edges of the floor at the end of a slab that faces the opening. */
function facing({ wings }: Slab, ahead: 1 | -1): Interval {
  const first = wings[0] as Wing;
  const last = wings[wings.length - 1] as Wing;
  return ahead < 0 ? [first.lower1, last.upper1] : [first.lower0, last.upper0];
}

/** The strips that border on an opening which reaches from `low` to `high`. */
function stripsBeside(strips: readonly Interval[], low: number, high: number, tolerance: number): Interval[] {
  return strips.filter(([a, b], i) => {
    const next = strips[i + 1];
    const previous = strips[i - 1];
    const below = b <= high - tolerance && next !== undefined && next[0] > low + tolerance && b >= low - tolerance;
    const above =
      a >= low + tolerance && previous !== undefined && previous[1] < high - tolerance && a <= high + tolerance;
    return below || above;
  });
}

/** The slab that ends nearest to a place, with another one behind it: breaks closer than the tolerance are one. */
function nearestEnd(slabs: readonly Slab[], s: number): number {
  let best = 0;
  for (let i = 1; i < slabs.length - 1; i++) {
    if (Math.abs((slabs[i] as Slab).to - s) < Math.abs((slabs[best] as Slab).to - s)) best = i;
  }
  return best;
}
