/** The exact pieces of a diagram, evaluated for drawing and reading. */
import type { DiaphragmDiagram, SpanPiece } from '@groundward/engine/path/result';

export function valueAt(c: readonly number[], x: number): number {
  let sum = 0;
  for (let i = c.length - 1; i >= 0; i--) sum = sum * x + (c[i] ?? 0);
  return sum;
}

/** Load, shear, unit shear, moment and chord force at s. */
export type DiagramPoint = {
  readonly s: number;
  readonly w: number;
  readonly V: number;
  readonly v: number;
  readonly M: number;
  readonly T: number;
};

const STEPS = 20;

/** Points along s, two at every break so that jumps stay jumps. */
export function pointsOf(diagram: DiaphragmDiagram, sense: number): DiagramPoint[] {
  return diagram.pieces.flatMap((piece) =>
    Array.from({ length: STEPS + 1 }, (_, i) => pointAt(piece, ((piece.to - piece.from) * i) / STEPS, sense)),
  );
}

/** Both ends of every piece: what a table needs, jumps included. */
export function breaksOf(diagram: DiaphragmDiagram, sense: number): DiagramPoint[] {
  return diagram.pieces.flatMap((piece) => [pointAt(piece, 0, sense), pointAt(piece, piece.to - piece.from, sense)]);
}

/** The diagram read at s; at a break the piece that begins there. */
export function readAt(diagrams: readonly DiaphragmDiagram[], s: number, sense: number): DiagramPoint | undefined {
  for (const { pieces } of diagrams) {
    const piece = pieces.find(({ from, to }) => from <= s && s < to) ?? pieces.find(({ to }) => to === s);
    if (piece !== undefined) return pointAt(piece, s - piece.from, sense);
  }
  return undefined;
}

function pointAt(piece: SpanPiece, x: number, sense: number): DiagramPoint {
  const depth = valueAt(piece.depth, x);
  const chordDepth = valueAt(piece.chordDepth, x);
  const V = valueAt(piece.shear, x) * sense;
  const M = valueAt(piece.moment, x) * sense;
  return {
    s: piece.from + x,
    w: valueAt(piece.load, x) * sense,
    V,
    v: depth > 0 ? V / depth : 0,
    M,
    T: chordDepth > 0 ? M / chordDepth : 0,
  };
}
