/**
 * Transfer diaphragms: the chord force that ends at a step runs on into the floor beside it as a strut and is given off there evenly; the
 * floor takes it like a little beam that lies across, between the edges of the floor.
 */
import type { Interval, Strip } from '../../geometry/profile.js';
import { sum, valueAt, type Polynomial } from '../../statics/polynomial.js';
import type { Flow } from '../collector.js';
import type { InnerForces, InnerPiece } from '../inner-forces.js';
import { commonDepth, type InterruptedChord, type StepPlan, type TransferPlan } from './step.js';

export type CarriedChord = InterruptedChord & {
  /** Axial force at the step, tension positive [force] */
  readonly force: number;
  /** Rise of the unit shear from the floor above it in t to that below it [force/length] */
  readonly flow: number;
};

export type Transfer = {
  readonly plan: TransferPlan;
  /** Absent beside an opening. */
  readonly stepPlan?: StepPlan;
  readonly from: number;
  readonly to: number;
  readonly chords: readonly CarriedChord[];
  /** What the edges take of it at the step, axial, tension positive [force] */
  readonly lower: number;
  readonly upper: number;
};

/**
 * What an interrupted chord carries where it ends is given to the floor beside it over the length of the transfer diaphragm, whose edges
 * resist by statics of a beam across.
 *
 * @param chord axial force of an edge at higher t; one at lower t carries as much the other way [force]
 * @returns nothing where the plan has no length
 */
export function transferOf(
  plan: TransferPlan,
  chord: number,
  tolerance: number,
  stepPlan?: StepPlan,
): Transfer | undefined {
  const length = plan.step - plan.end;
  if (Math.abs(length) <= tolerance) return undefined;
  const depth = plan.upper - plan.lower;
  const chords = plan.chords.map((each): CarriedChord => {
    const force = each.upper ? chord : -chord;
    return { ...each, force, flow: force / length };
  });
  let lower = 0;
  let upper = 0;
  for (const { t, force } of chords) {
    lower -= (force * (plan.upper - t)) / depth;
    upper -= (force * (t - plan.lower)) / depth;
  }
  return {
    plan,
    ...(stepPlan === undefined ? {} : { stepPlan }),
    from: Math.min(plan.step, plan.end),
    to: Math.max(plan.step, plan.end),
    chords,
    lower,
    upper,
  };
}

/**
 * At a step the common depth alone carries the moment: ±M/D at its edges, an edge at higher t in tension under positive M.
 *
 * @param steps ascending in s
 * Source: statics; the arrangement is that of R. T. Malone and R. W. Rice, The Analysis of Irregular Shaped Structures (2012), Ch. 4.
 */
export function stepTransfers(
  steps: readonly StepPlan[],
  pieces: readonly InnerPiece[],
  tolerance: number,
): readonly Transfer[] {
  if (steps.length === 0) return NONE;
  const out: Transfer[] = [];
  let largest = 0;
  for (const piece of pieces) {
    const length = piece.to - piece.from;
    for (const x of [length / 2, length]) largest = Math.max(largest, Math.abs(valueAt(piece.moment, x)));
  }
  let next = 0;
  for (const step of steps) {
    while (next + 1 < pieces.length && (pieces[next] as InnerPiece).to < step.s - tolerance) next += 1;
    const piece = pieces[next];
    if (piece === undefined) continue;
    const found = valueAt(piece.moment, step.s - piece.from);
    // What is only the rounding of larger moments is none: at the end of a simple span.
    const moment = Math.abs(found) <= 1e-12 * largest ? 0 : found;
    for (const plan of step.transfers) {
      const transfer = transferOf(plan, moment / commonDepth(step), tolerance, step);
      if (transfer !== undefined) out.push(transfer);
    }
  }
  return out;
}

const NONE: readonly Transfer[] = [];

/** A panel of floor between two edges or interrupted chords over a piece: its net unit shear is shear over depth. */
export type NetPanel = {
  readonly piece: InnerPiece;
  readonly lower: Polynomial;
  readonly upper: Polynomial;
  readonly shear: Polynomial;
};

/**
 * The panels of every piece in which a transfer acts: the net unit shear is V/d and what the interrupted chords give off,
 * flow·d_beyond/d on the near side of each and −flow·d_before/d on its far side, which adds up to nothing over the cut.
 */
export function netPanels(inner: InnerForces): NetPanel[] {
  const out: NetPanel[] = [];
  for (const [piece, active] of activePieces(inner)) {
    const chords = active.flatMap((transfer) => transfer.chords);
    const places = apart(
      chords.map(({ t }) => t),
      inner.profile.tolerance,
    );
    const edges = edgesOf(piece);
    const bounds: Polynomial[] = [edges.lower, ...places.map((t) => [t]), edges.upper];
    for (let k = 0; k + 1 < bounds.length; k++) {
      let shear: Polynomial = piece.shear;
      for (const { t, flow } of chords) {
        const below = k < places.length && (places[k] as number) <= t + inner.profile.tolerance;
        const part = depthBeyond(piece, t, below ? 1 : -1);
        shear = sum(
          shear,
          part.map((d) => (below ? flow : -flow) * d),
        );
      }
      out.push({ piece, lower: bounds[k] as Polynomial, upper: bounds[k + 1] as Polynomial, shear });
    }
  }
  return out;
}

/** The edges' axial force over a piece times the chord depth: M and the part of the transfers, tension of the upper edge positive. */
export type NetChord = { readonly piece: InnerPiece; readonly lower: Polynomial; readonly upper: Polynomial };

export function netChords(inner: InnerForces): NetChord[] {
  return activePieces(inner).map(([piece, active]): NetChord => {
    const edges = edgesOf(piece);
    let lower: Polynomial = piece.moment.map((c) => -c);
    let upper: Polynomial = piece.moment;
    for (const { plan, chords } of active) {
      for (const { t, flow } of chords) {
        // Axial force of the strut at s, and its arms to the edges there.
        const strut = [flow * (piece.from - plan.end), flow];
        lower = sum(lower, product(strut, difference([t], edges.upper)));
        upper = sum(upper, product(strut, difference(edges.lower, [t])));
      }
    }
    return { piece, lower, upper };
  });
}

/** Rows of the pieces between two places, of rows in the order of their pieces. */
export function between<Row extends { readonly piece: InnerPiece }>(
  rows: readonly Row[],
  from: number,
  to: number,
  tolerance: number,
): Row[] {
  const out: Row[] = [];
  for (let i = firstFrom(rows.length, (k) => (rows[k] as Row).piece.from, from - tolerance); i < rows.length; i++) {
    const row = rows[i] as Row;
    if (row.piece.to > to + tolerance) break;
    out.push(row);
  }
  return out;
}

function activePieces({ pieces, profile, transfers }: InnerForces): [InnerPiece, Transfer[]][] {
  const { tolerance } = profile;
  const active = new Map<number, Transfer[]>();
  for (const transfer of transfers) {
    for (
      let i = firstFrom(pieces.length, (k) => (pieces[k] as InnerPiece).from, transfer.from - tolerance);
      i < pieces.length;
      i++
    ) {
      const piece = pieces[i] as InnerPiece;
      if (piece.to > transfer.to + tolerance) break;
      const known = active.get(i);
      if (known === undefined) active.set(i, [transfer]);
      else known.push(transfer);
    }
  }
  return [...active.keys()].sort((a, b) => a - b).map((i) => [pieces[i] as InnerPiece, active.get(i) as Transfer[]]);
}

/** Index of the first of ascending places that lies at or after `s`. */
function firstFrom(count: number, place: (i: number) => number, s: number): number {
  let low = 0;
  let high = count;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (place(middle) < s) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** The floor's outermost edges over a piece, linear in (s − from). */
function edgesOf({ slab, from }: InnerPiece): { lower: Polynomial; upper: Polynomial } {
  const first = slab.wings[0];
  const last = slab.wings[slab.wings.length - 1];
  return {
    lower: linear(slab, first?.lower0 ?? 0, first?.lower1 ?? 0, from),
    upper: linear(slab, last?.upper0 ?? 0, last?.upper1 ?? 0, from),
  };
}

/** Net depth of the floor on one side of a chord over a piece, linear in (s − from). */
function depthBeyond({ slab, from }: InnerPiece, t: number, side: 1 | -1): Polynomial {
  const at = (strip: Strip, end: 0 | 1): number => {
    const lower = end === 0 ? strip.lower0 : strip.lower1;
    const upper = end === 0 ? strip.upper0 : strip.upper1;
    return side > 0 ? Math.max(0, upper - Math.max(lower, t)) : Math.max(0, Math.min(upper, t) - lower);
  };
  let start = 0;
  let end = 0;
  for (const strip of slab.strips) {
    start += at(strip, 0);
    end += at(strip, 1);
  }
  return linear(slab, start, end, from);
}

/** A linear function of a slab as a polynomial from `from` on. */
export function linear(slab: { from: number; to: number }, v0: number, v1: number, from: number): number[] {
  const slope = (v1 - v0) / (slab.to - slab.from);
  return [v0 + slope * (from - slab.from), slope];
}

function difference(a: Polynomial, b: Polynomial): number[] {
  return sum(
    a,
    b.map((c) => -c),
  );
}

function product(a: Polynomial, b: Polynomial): number[] {
  const out = new Array<number>(a.length + b.length - 1).fill(0);
  a.forEach((x, i) => b.forEach((y, j) => (out[i + j] = (out[i + j] as number) + x * y)));
  return out;
}

/**
 * What the transfers beside a cut put into a line along it, over what V alone puts there: +1 just after, −1 just before the place.
 *
 * @param cut the floor on that side of the place
 */
export function transferFlows(inner: InnerForces, s: number, side: 1 | -1, cut: readonly Interval[]): Flow[] {
  const { tolerance } = inner.profile;
  const just = s + 2 * side * tolerance;
  const chords = inner.transfers
    .filter(({ from, to }) => from < just && just < to)
    .flatMap((transfer) => transfer.chords);
  if (chords.length === 0) return [];
  const above = (t: number): number => cut.reduce((d, [a, b]) => d + Math.max(0, b - Math.max(a, t)), 0);
  const depth = above(-Infinity);
  const places = chords.map(({ t }) => t);
  return split(cut, places, tolerance).map(([a, b]): Flow => {
    let v = 0;
    for (const { t, flow } of chords) v += (flow * ((a + b) / 2 < t ? above(t) : above(t) - depth)) / depth;
    return { from: a, to: b, force: side * v * (b - a) };
  });
}

function split(cut: readonly Interval[], places: readonly number[], tolerance: number): Interval[] {
  return cut.flatMap(([a, b]) => {
    const inside = apart(
      places.filter((t) => t > a + tolerance && t < b - tolerance),
      tolerance,
    );
    const ends = [a, ...inside, b];
    return ends.slice(1).map((end, i): Interval => [ends[i] as number, end]);
  });
}

/** Ascending, near-repetitions left out. */
function apart(places: readonly number[], tolerance: number): number[] {
  const out: number[] = [];
  for (const t of [...places].sort((a, b) => a - b)) {
    const last = out[out.length - 1];
    if (last === undefined || t - last > tolerance) out.push(t);
  }
  return out;
}
