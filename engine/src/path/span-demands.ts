/** Demands of diaphragm spans: the largest shear, unit shear, moment and chord force between adjacent wall lines. */
import type { Point } from '../building/definition.js';
import { Refusal } from '../building/refusal.js';
import type { Support } from '../diaphragms/flexible.js';
import type { InnerForces, InnerPiece } from '../diaphragms/inner-forces.js';
import { between, netPanels, type NetPanel } from '../diaphragms/steps/transfer.js';
import { toPlan } from '../geometry/profile.js';
import { largest, largestRatio, valueAt, type Extreme } from '../statics/polynomial.js';
import type { DiaphragmDiagram, Quantity } from './result.js';
import { addBoth, type Table } from './table.js';

export type SpanRange = { readonly member: string; readonly from: number; readonly to: number };

/** Spans between adjacent supports and the overhangs beyond, ascending in s. */
export function spansOf(inner: InnerForces, supports: readonly Support[]): SpanRange[] {
  const { from, to, tolerance } = inner.profile;
  const stations = [{ s: from, name: 'edge' }, ...supports, { s: to, name: 'edge' }];
  const spans: SpanRange[] = [];
  for (let i = 0; i + 1 < stations.length; i++) {
    const a = stations[i] as { s: number; name: string };
    const b = stations[i + 1] as { s: number; name: string };
    if (b.s - a.s > tolerance) spans.push({ member: `${inner.diaphragm.key}/${a.name}-${b.name}`, from: a.s, to: b.s });
  }
  return spans;
}

/**
 * `unit-shear` is V/d; `net-unit-shear` holds what interrupted chords add to it beside the steps of the outline.
 *
 * @param collectorShear unit shear along the collectors at the ends of a span, where one runs over less than the whole cut
 */
export function spanDemands(
  table: Table,
  inner: InnerForces,
  spans: readonly SpanRange[],
  caseId: string,
  collectorShear: (span: SpanRange) => number,
): void {
  const { units } = table;
  const panels = inner.transfers.length === 0 ? [] : netPanels(inner);
  for (const span of spans) {
    const shear = new Largest();
    const unitShear = new Largest();
    const moment = new Largest();
    const chord = new Largest();
    for (const piece of inner.pieces) {
      const middle = (piece.from + piece.to) / 2;
      if (middle < span.from || middle > span.to) continue;
      const length = piece.to - piece.from;
      shear.take(piece, largest(piece.shear, length));
      unitShear.take(piece, largestRatio(piece.shear, piece.depth, length));
      moment.take(piece, largest(piece.moment, length));
      chord.take(piece, largestRatio(piece.moment, piece.chordDepth, length));
    }
    const atCollector = collectorShear(span);
    const add = (quantity: Quantity, found: Largest, unit: string, least = 0): void => {
      const value = Math.max(Math.abs(found.value), least);
      if (!Number.isFinite(value)) throw new Refusal([noDepth(inner, span)]);
      addBoth(table, {
        member: span.member,
        kind: 'diaphragm-span',
        quantity,
        case: caseId,
        value,
        unit,
        at: found.place(inner),
      });
    };
    add('shear', shear, units.force);
    add('unit-shear', unitShear, units.perLength, atCollector);
    const net = largestNetUnitShear(inner, panels, span);
    if (net !== undefined) {
      const value = Math.max(net.value, Math.abs(unitShear.value));
      addBoth(table, {
        member: span.member,
        kind: 'diaphragm-span',
        quantity: 'net-unit-shear',
        case: caseId,
        value,
        unit: units.perLength,
        at: value === net.value ? net.at : unitShear.place(inner),
      });
    }
    add('moment', moment, units.moment);
    add('chord-force', chord, units.force);
  }
}

/** With what interrupted chords give off beside the steps of the outline; nothing where no transfer acts in the span. */
function largestNetUnitShear(
  inner: InnerForces,
  panels: readonly NetPanel[],
  span: SpanRange,
): { value: number; at: Point } | undefined {
  let best: { value: number; at: Point } | undefined;
  for (const { piece, lower, upper, shear } of between(panels, span.from, span.to, inner.profile.tolerance)) {
    const { x, value } = largestRatio(shear, piece.depth, piece.to - piece.from);
    if (best !== undefined && Math.abs(value) <= best.value) continue;
    const t = (valueAt(lower, x) + valueAt(upper, x)) / 2;
    best = { value: Math.abs(value), at: toPlan(inner.profile.frame, piece.from + x, t) };
  }
  return best;
}

class Largest {
  value = 0;
  private piece: InnerPiece | undefined;
  private x = 0;

  take(piece: InnerPiece, extreme: Extreme): void {
    if (this.piece !== undefined && !(Math.abs(extreme.value) > Math.abs(this.value))) return;
    this.value = extreme.value;
    this.piece = piece;
    this.x = extreme.x;
  }

  place(inner: InnerForces): Point | undefined {
    if (this.piece === undefined) return undefined;
    return toPlan(inner.profile.frame, this.piece.from + this.x, valueAt(this.piece.middle, this.x));
  }
}

function noDepth(inner: InnerForces, span: SpanRange) {
  return {
    code: 'no-depth',
    path: inner.diaphragm.path,
    found: `span ${span.member} carries shear where its outline has no depth`,
    expected: 'a diaphragm with depth wherever it hands force to a wall line',
  };
}

/** The exact pieces behind a diaphragm's demands, turned so that the load is positive. */
export function diaphragmDiagram(
  inner: InnerForces,
  spans: readonly SpanRange[],
  lines: DiaphragmDiagram['lines'],
  caseId: string,
  level: string,
  sign: 1 | -1,
): DiaphragmDiagram {
  const { s, t } = inner.profile.frame;
  const turned = (c: readonly number[]): number[] => c.map((value) => (value === 0 ? 0 : value * sign));
  return {
    kind: 'diaphragm',
    member: inner.diaphragm.key,
    level,
    case: caseId,
    along: [t[0] === 0 ? 0 : t[0] * sign, t[1] === 0 ? 0 : t[1] * sign],
    across: [s[0], s[1]],
    lines,
    spans: spans.map((span) => ({ ...span })),
    pieces: inner.pieces.map((piece) => ({
      from: piece.from,
      to: piece.to,
      load: turned(piece.load),
      shear: turned(piece.shear),
      moment: turned(piece.moment),
      depth: [...piece.depth],
      chordDepth: [...piece.chordDepth],
    })),
  };
}
