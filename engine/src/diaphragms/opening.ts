/** What an opening adds to a diaphragm: the strips beside it bend on their own. */
import type { Opening } from '../building/definition.js';
import { dot } from '../geometry/frame.js';
import type { Interval } from '../geometry/profile.js';
import { cutAt, totalLength } from '../geometry/profile.js';
import { integral, valueAt } from '../statics/polynomial.js';
import type { InnerForces } from './inner-forces.js';

export type OpeningForces = {
  /** Place of the opening's near and far side along s, and of its middle [length] */
  readonly from: number;
  readonly to: number;
  /** Largest secondary moment of a strip beside the opening [force·length] */
  readonly secondaryMoment: number;
  /** Largest force in a strip's outer chord at the opening's sides: the diaphragm's chord force and the strip's own [force] */
  readonly chordForce: number;
  /** Largest force of a strip's inner edge, to be tied into the floor at the opening's corners [force] */
  readonly cornerForce: number;
};

/**
 * The shear at the opening is shared by the strips in proportion to their depth (equal sheathing); each strip bends locally with a point
 * of inflection at the middle of the opening, and the couple of its edges is tied into the full floor beyond.
 *
 * @returns undefined where the opening does not lie between floor on both sides along t
 * Source: method of ATC-7, Guidelines for the Design of Horizontal Wood Diaphragms (1981), and E. F. Diekmann (1982);
 * from memory, not checked against the documents.
 */
export function openingForces(inner: InnerForces, opening: Opening): OpeningForces | undefined {
  const { frame, tolerance } = inner.profile;
  const s = opening.outline.map((point) => dot(point, frame.s));
  const t = opening.outline.map((point) => dot(point, frame.t));
  const from = Math.min(...s);
  const to = Math.max(...s);
  const middle = (from + to) / 2;
  const cut = cutAt(inner.profile, middle);
  // Each half shares by its own side of the middle: they differ where a step of the outline meets it.
  const halves = [
    { strips: cut.left, shear: shearArea(inner, from, middle), chord: chordAt(inner, from, 'before') },
    { strips: cut.right, shear: shearArea(inner, middle, to), chord: chordAt(inner, to, 'after') },
  ];
  let bordered = false;
  let secondaryMoment = 0;
  let chordForce = 0;
  let cornerForce = 0;
  for (const { strips, shear, chord } of halves) {
    const depth = totalLength(strips);
    for (const [a, b] of stripsBeside(strips, Math.min(...t), Math.max(...t), tolerance)) {
      bordered = true;
      // The strip's shear at the inflection times half the opening, with what the strip's own load adds on the way.
      const moment = Math.abs(shear) * ((b - a) / depth);
      const local = moment / (b - a);
      secondaryMoment = Math.max(secondaryMoment, moment);
      cornerForce = Math.max(cornerForce, local);
      chordForce = Math.max(chordForce, Math.abs(chord) + local);
    }
  }
  if (!bordered) return undefined;
  return { from, to, secondaryMoment, chordForce, cornerForce };
}

/** The strips that border on the opening. */
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

/** ∫V ds between two places [force·length] */
function shearArea(inner: InnerForces, from: number, to: number): number {
  let area = 0;
  for (const piece of inner.pieces) {
    const a = Math.max(from, piece.from);
    const b = Math.min(to, piece.to);
    if (b <= a) continue;
    const primitive = integral(piece.shear, 0);
    area += valueAt(primitive, b - piece.from) - valueAt(primitive, a - piece.from);
  }
  return area;
}

/** M/D just before or just after a place [force] */
function chordAt(inner: InnerForces, s: number, side: 'before' | 'after'): number {
  const { tolerance } = inner.profile;
  for (const piece of inner.pieces) {
    const inside =
      side === 'before'
        ? s > piece.from + tolerance && s <= piece.to + tolerance
        : s >= piece.from - tolerance && s < piece.to - tolerance;
    if (!inside) continue;
    const depth = valueAt(piece.chordDepth, s - piece.from);
    return depth > tolerance ? valueAt(piece.moment, s - piece.from) / depth : 0;
  }
  return 0;
}
