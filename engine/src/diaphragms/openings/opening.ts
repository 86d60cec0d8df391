/** What an opening adds to a diaphragm: the strips beside it bend on their own, and the floor beyond takes their inner edges. */
import { totalLength, type Interval } from '../../geometry/profile.js';
import { integral, valueAt } from '../../statics/polynomial.js';
import type { InnerForces, InnerPiece } from '../inner-forces.js';
import { transferOf, type Transfer } from '../steps/transfer.js';
import type { OpeningHalf, OpeningPlan } from './opening-plan.js';

/** A strip beside an opening at one of the opening's sides. */
export type StripEnd = {
  readonly strip: Interval;
  readonly side: number;
  /** Its own moment there, none at the middle of the opening [force·length] */
  readonly moment: number;
  /** Axial force of its edges at lower and higher t, tension positive [force] */
  readonly lower: number;
  readonly upper: number;
};

export type OpeningForces = {
  readonly plan: OpeningPlan;
  readonly ends: readonly StripEnd[];
  /** Largest secondary moment of a strip beside the opening [force·length] */
  readonly secondaryMoment: number;
  /** Largest force in a strip's edge that is an edge of the floor, at the opening's sides [force] */
  readonly chordForce: number;
  /** Largest force of a strip's inner edge, tied into the floor at the opening's corners [force] */
  readonly cornerForce: number;
};

/**
 * The shear at the opening is shared by the strips in proportion to their depth (equal sheathing); each strip bends with a point of
 * inflection at the middle of the opening, where the outermost edges alone carry the moment: M/D.
 *
 * At a side the edges carry that and the strip's own moment over its depth: with A = ∫V from the side to the middle, A/d for every strip,
 * whatever its depth. So the sum over all edges is the moment at the side, and equilibrium holds at every cut.
 *
 * @returns undefined where no strip borders on the opening
 * Source: method of ATC-7, Guidelines for the Design of Horizontal Wood Diaphragms (1981), and E. F. Diekmann (1982);
 * from memory, not checked against the documents.
 */
export function openingForces(inner: InnerForces, plan: OpeningPlan): OpeningForces | undefined {
  const ends: StripEnd[] = [];
  let secondaryMoment = 0;
  let chordForce = 0;
  let cornerForce = 0;
  for (const half of plan.halves) {
    const local = localChord(inner.pieces, plan, half);
    const whole = chordAt(inner, plan.middle, half.ahead);
    const first = half.strips[0] as Interval;
    const last = half.strips[half.strips.length - 1] as Interval;
    for (const strip of half.beside) {
      const lower = (strip === first ? -whole : 0) - local;
      const upper = (strip === last ? whole : 0) + local;
      const moment = local * (strip[1] - strip[0]);
      ends.push({ strip, side: half.side, moment, lower, upper });
      secondaryMoment = Math.max(secondaryMoment, Math.abs(moment));
      if (strip === first) chordForce = Math.max(chordForce, Math.abs(lower));
      if (strip === last) chordForce = Math.max(chordForce, Math.abs(upper));
      cornerForce = Math.max(cornerForce, Math.abs(local));
    }
  }
  if (ends.length === 0) return undefined;
  return { plan, ends, secondaryMoment, chordForce, cornerForce };
}

/** What the inner edges of the strips give to the floor beyond the opening's sides. */
export function openingTransfers(
  plans: readonly OpeningPlan[],
  pieces: readonly InnerPiece[],
  tolerance: number,
): Transfer[] {
  return plans.flatMap((plan) =>
    plan.halves.flatMap((half) => {
      if (half.transfer.chords.length === 0) return [];
      const transfer = transferOf(half.transfer, localChord(pieces, plan, half), tolerance);
      return transfer === undefined ? [] : [transfer];
    }),
  );
}

/** Axial force that a strip's own moment puts into its edge at higher t, at a side of the opening: ∫V ds over d [force] */
function localChord(
  pieces: readonly InnerPiece[],
  { middle }: OpeningPlan,
  { side, ahead, strips }: OpeningHalf,
): number {
  const area = shearArea(pieces, Math.min(side, middle), Math.max(side, middle));
  return (ahead * area) / totalLength(strips);
}

/** ∫V ds between two places [force·length] */
function shearArea(pieces: readonly InnerPiece[], from: number, to: number): number {
  let area = 0;
  for (const piece of pieces) {
    const a = Math.max(from, piece.from);
    const b = Math.min(to, piece.to);
    if (b <= a) continue;
    const primitive = integral(piece.shear, 0);
    area += valueAt(primitive, b - piece.from) - valueAt(primitive, a - piece.from);
  }
  return area;
}

/** M/D just before (-1) or just after (1) a place [force] */
function chordAt({ pieces, profile }: InnerForces, s: number, side: 1 | -1): number {
  const { tolerance } = profile;
  for (const piece of pieces) {
    const inside =
      side < 0
        ? s > piece.from + tolerance && s <= piece.to + tolerance
        : s >= piece.from - tolerance && s < piece.to - tolerance;
    if (!inside) continue;
    const depth = valueAt(piece.chordDepth, s - piece.from);
    return depth > tolerance ? valueAt(piece.moment, s - piece.from) / depth : 0;
  }
  return 0;
}
