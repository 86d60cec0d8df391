/** Shear and moment along a diaphragm that lies like a beam on its wall lines. */
import { integral, sum, valueAt, type Polynomial } from './polynomial.js';
import { resultantWithin, type SpanLoad } from './span-load.js';

export type SpanStatics = {
  /** One for each pair of neighbouring supports: the load on the span and what its ends hand over [force] */
  readonly spans: readonly { force: number; near: number; far: number }[];
  /** What goes straight into each support [force] */
  readonly direct: readonly number[];
};

/**
 * Simple spans between adjacent supports; a part beyond the outermost support is an overhang of the end span.
 * A point load at a support goes straight into it.
 *
 * @param load     load along `s` [force/length], [force]
 * @param supports positions, ascending, two or more [length]
 * @param tolerance positions closer than this are one [length]
 * Source: statics of a simply supported beam with overhangs.
 */
export function simpleSpans(load: SpanLoad, supports: readonly number[], tolerance: number): SpanStatics {
  const spans = supports.slice(1).map(() => ({ force: 0, near: 0, far: 0 }));
  const direct = supports.map(() => 0);
  const last = spans.length - 1;
  const add = (span: number, force: number, moment: number): void => {
    const a = supports[span] as number;
    const b = supports[span + 1] as number;
    const far = (moment - force * a) / (b - a);
    const into = spans[span] as { force: number; near: number; far: number };
    into.force += force;
    into.near += force - far;
    into.far += far;
  };
  for (const piece of load.pieces) {
    for (let span = 0; span <= last; span++) {
      const from = span === 0 ? -Infinity : (supports[span] as number);
      const to = span === last ? Infinity : (supports[span + 1] as number);
      if (piece.to <= from || piece.from >= to) continue;
      const part = resultantWithin(piece, from, to);
      add(span, part.force, part.moment);
    }
  }
  for (const point of load.points) {
    const at = supports.findIndex((s) => Math.abs(s - point.s) <= tolerance);
    if (at >= 0) {
      direct[at] = (direct[at] as number) + point.force;
      continue;
    }
    let span = 0;
    while (span < last && (supports[span + 1] as number) < point.s) span += 1;
    add(span, point.force, point.force * point.s);
  }
  return { spans, direct };
}

/** One reaction a support [force] */
export function reactionsOf({ spans, direct }: SpanStatics): number[] {
  return direct.map((force, i) => force + (spans[i - 1]?.far ?? 0) + (spans[i]?.near ?? 0));
}

export type BeamPiece = {
  readonly from: number;
  readonly to: number;
  /** Polynomials in (s − from) */
  readonly load: Polynomial;
  readonly shear: Polynomial;
  readonly moment: Polynomial;
};

export type Beam = {
  readonly pieces: readonly BeamPiece[];
  /** V and M past the far end: zero in equilibrium [force], [force·length] */
  readonly closingShear: number;
  readonly closingMoment: number;
};

/**
 * V(s) and M(s) from the near end on, exact per piece, with all loads and reactions known.
 * V is positive where the part on the near side pushes the far side against the load: dV/ds = −w, dM/ds = V + couple.
 *
 * @param load      what acts on the diaphragm, along the load positive
 * @param breaks    ascending places where a piece must end (depth breaks, supports) [length]
 * @param reactions point forces that hold it, positive against the load
 * @param tolerance positions closer than this are one [length]
 */
export function beamAlong(
  load: SpanLoad,
  breaks: readonly number[],
  reactions: readonly { readonly s: number; readonly force: number }[],
  tolerance: number,
): Beam {
  const jumps = [
    ...reactions.map((r) => ({ s: r.s, force: r.force })),
    ...load.points.map((p) => ({ s: p.s, force: -p.force })),
  ].sort((a, b) => a.s - b.s);
  const ends = mergedBreaks(breaks, load, jumps, tolerance);
  const pieces: BeamPiece[] = [];
  let shear = 0;
  let moment = 0;
  let next = 0;
  const jumpUpTo = (s: number): void => {
    for (let jump = jumps[next]; jump !== undefined && jump.s <= s + tolerance; jump = jumps[++next])
      shear += jump.force;
  };
  for (let i = 0; i + 1 < ends.length; i++) {
    const from = ends[i] as number;
    const to = ends[i + 1] as number;
    jumpUpTo(from);
    const middle = (from + to) / 2;
    let w: number[] = [0];
    let couple: number[] | undefined;
    for (const piece of load.pieces) {
      if (piece.from > middle || piece.to < middle) continue;
      w = sum(w, shifted(piece.w, from - piece.from));
      if (piece.couple !== undefined) couple = sum(couple ?? [0], shifted(piece.couple, from - piece.from));
    }
    const shearPiece = integral(
      w.map((value) => -value),
      shear,
    );
    const momentPiece = integral(couple === undefined ? shearPiece : sum(shearPiece, couple), moment);
    pieces.push({ from, to, load: w, shear: shearPiece, moment: momentPiece });
    shear = valueAt(shearPiece, to - from);
    moment = valueAt(momentPiece, to - from);
  }
  jumpUpTo(Infinity);
  return { pieces, closingShear: shear, closingMoment: moment };
}

function shifted(c: Polynomial, by: number): number[] {
  const [c0 = 0, c1 = 0] = c;
  return by === 0 ? [c0, c1] : [c0 + c1 * by, c1];
}

function mergedBreaks(
  breaks: readonly number[],
  load: SpanLoad,
  jumps: readonly { readonly s: number }[],
  tolerance: number,
): number[] {
  const all = [...breaks];
  for (const piece of load.pieces) all.push(piece.from, piece.to);
  for (const jump of jumps) all.push(jump.s);
  all.sort((a, b) => a - b);
  const out: number[] = [];
  for (const s of all) {
    const last = out[out.length - 1];
    if (last === undefined || s - last > tolerance) out.push(s);
  }
  return out;
}
