/** Loads along the span of a diaphragm: exact pieces and point loads. */
import type { Polynomial } from './polynomial.js';

export type LoadPiece = {
  readonly from: number;
  readonly to: number;
  /** Load per unit span, at most linear in (s − from) [force/length] */
  readonly w: Polynomial;
  /** Couple per unit span, at most linear in (s − from) [force]; absent where there is none */
  readonly couple?: Polynomial;
};

export type PointLoad = {
  readonly s: number;
  readonly force: number;
};

export type SpanLoad = {
  readonly pieces: readonly LoadPiece[];
  readonly points: readonly PointLoad[];
};

/** @returns resultant [force] and its first moment about s = 0 [force·length], couples left out */
export function resultant(load: SpanLoad): { force: number; moment: number } {
  let force = 0;
  let moment = 0;
  for (const piece of load.pieces) {
    const part = resultantWithin(piece, piece.from, piece.to);
    force += part.force;
    moment += part.moment;
  }
  for (const point of load.points) {
    force += point.force;
    moment += point.force * point.s;
  }
  return { force, moment };
}

/** Resultant of the part of a piece that lies in [from, to]. */
export function resultantWithin(piece: LoadPiece, from: number, to: number): { force: number; moment: number } {
  const a = Math.max(piece.from, from);
  const b = Math.min(piece.to, to);
  if (b <= a) return { force: 0, moment: 0 };
  const length = b - a;
  const slope = piece.w[1] ?? 0;
  const w0 = (piece.w[0] ?? 0) + slope * (a - piece.from);
  const w1 = w0 + slope * length;
  const force = ((w0 + w1) / 2) * length;
  return { force, moment: force * a + (length * length * (w0 + 2 * w1)) / 6 };
}
