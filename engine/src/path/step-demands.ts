/** Demands at the steps of an outline: transfer diaphragms, the struts that carry interrupted chords into them, and drags across. */
import type { Point } from '../building/definition.js';
import { axialAlong, flowsOver, type Axial, type Flow } from '../diaphragms/collector.js';
import { shearAt, type InnerForces } from '../diaphragms/inner-forces.js';
import { commonDepth, type StepPlan } from '../diaphragms/steps/step.js';
import {
  between,
  netChords,
  netPanels,
  transferFlows,
  type NetChord,
  type NetPanel,
  type Transfer,
} from '../diaphragms/steps/transfer.js';
import { cutAt, toPlan } from '../geometry/profile.js';
import { largestRatio, valueAt, type Polynomial } from '../statics/polynomial.js';
import { enter, type Ledger } from './certificate.js';
import type { DiaphragmOutcome } from './descent.js';
import type { Diagram, Quantity, StrutDiagram } from './result.js';
import { addBoth, addRow, type Table } from './table.js';

/** A drag strut across the floor: along a step, or along the end of a transfer diaphragm where no wall line runs. */
type Drag = { readonly member: string; readonly s: number };

type Where = {
  readonly level: string;
  readonly case: string;
  /** Turns the load of a frame positive. */
  readonly sign: (frame: number) => 1 | -1;
};

type Peak = { readonly value: number; readonly at: Point };
type Found = Map<string, { kind: 'transfer-diaphragm' | 'strut'; peaks: Map<Quantity, Peak> }>;

/**
 * @param inner the inner forces of one diaphragm, one entry for each frame that carries force
 */
export function stepDemands(
  table: Table,
  diagrams: Diagram[],
  ledger: Ledger,
  outcome: DiaphragmOutcome,
  inner: readonly InnerForces[],
  where: Where,
): void {
  const found: Found = new Map();
  for (const forces of inner) {
    if (forces.transfers.length === 0) continue;
    const place = `${forces.diaphragm.key}, case ${where.case}`;
    const panels = netPanels(forces);
    const edges = netChords(forces);
    const { tolerance } = forces.profile;
    for (const transfer of forces.transfers) {
      checkEdges(ledger, forces, transfer, place);
      const { from, to } = transfer;
      const own = between(panels, from, to, tolerance);
      transferRows(found, forces, transfer, own, between(edges, from, to, tolerance));
      diagrams.push(transferDiagram(forces, transfer, own, where));
      for (const strut of struts(forces, transfer, where)) {
        strutRows(found, strut);
        diagrams.push(strut);
      }
    }
    for (const drag of dragsOf(forces)) {
      const axial = alongCut(forces, outcome, drag.s);
      if (axial.scale === 0) continue;
      enter(ledger, 'step: drag struts close', place, axial.closing, axial.scale);
      const strut = dragDiagram(forces, drag, axial, where);
      strutRows(found, strut);
      diagrams.push(strut);
    }
  }
  for (const [member, { kind, peaks }] of found) {
    for (const [quantity, { value, at }] of peaks) {
      const unit = quantity === 'net-unit-shear' ? table.units.perLength : table.units.force;
      const row = { member, kind, quantity, case: where.case, value, unit, at };
      const turned = REVERSED[quantity];
      if (turned === undefined) addBoth(table, row);
      else {
        addRow(table, row, 1);
        addRow(table, { ...row, quantity: turned }, -1);
      }
    }
  }
}

/** What is tension in one sense is compression in the other. */
const REVERSED: Partial<Record<Quantity, Quantity>> = {
  'axial-tension': 'axial-compression',
  'axial-compression': 'axial-tension',
};

/** Where two frames carry force under one case, a member shows the larger. */
function keep(
  found: Found,
  member: string,
  kind: 'transfer-diaphragm' | 'strut',
  quantity: Quantity,
  peak: Peak,
): void {
  let known = found.get(member);
  if (known === undefined) found.set(member, (known = { kind, peaks: new Map() }));
  const before = known.peaks.get(quantity);
  if (before === undefined || peak.value > before.value) known.peaks.set(quantity, peak);
}

function memberOf(forces: InnerForces, transfer: Transfer): string {
  return `${forces.diaphragm.key}/${transfer.plan.name}`;
}

/** At the step the edges carry what the common depth hands over, and nothing where an edge ends. */
function checkEdges(ledger: Ledger, forces: InnerForces, transfer: Transfer, place: string): void {
  const { plan, stepPlan, lower, upper } = transfer;
  if (stepPlan === undefined) return;
  const { tolerance } = forces.profile;
  const chord = (transfer.chords[0]?.force ?? 0) * (plan.chords[0]?.upper === true ? 1 : -1);
  const goesOn = (t: number): boolean =>
    stepPlan.common.some(([a, b]) => Math.min(Math.abs(a - t), Math.abs(b - t)) <= tolerance);
  const whole = (chord * commonDepth(stepPlan)) / (plan.upper - plan.lower);
  const scale = Math.abs(chord) + Math.abs(whole);
  if (scale === 0) return;
  enter(ledger, 'step: chords close', place, whole + upper - (goesOn(plan.upper) ? chord : 0), scale);
  enter(ledger, 'step: chords close', place, -whole + lower + (goesOn(plan.lower) ? chord : 0), scale);
}

function transferRows(
  found: Found,
  forces: InnerForces,
  transfer: Transfer,
  panels: readonly NetPanel[],
  edges: readonly NetChord[],
): void {
  const { frame } = forces.profile;
  const member = memberOf(forces, transfer);
  const { plan, chords, lower } = transfer;
  let across = lower;
  let most = { value: Math.abs(lower), t: plan.lower };
  for (const { t, force } of chords) {
    across += force;
    if (Math.abs(across) > most.value) most = { value: Math.abs(across), t };
  }
  keep(found, member, 'transfer-diaphragm', 'shear', { value: most.value, at: toPlan(frame, plan.step, most.t) });
  for (const { piece, lower: below, upper: above, shear } of panels) {
    const { x, value } = largestRatio(shear, piece.depth, piece.to - piece.from);
    const t = (valueAt(below, x) + valueAt(above, x)) / 2;
    keep(found, member, 'transfer-diaphragm', 'net-unit-shear', {
      value: Math.abs(value),
      at: toPlan(frame, piece.from + x, t),
    });
  }
  for (const { piece, lower: low, upper: high } of edges) {
    for (const [axial, edge] of [
      [low, -1],
      [high, 1],
    ] as const) {
      const { x, value } = largestRatio(axial, piece.chordDepth, piece.to - piece.from);
      const t = valueAt(piece.middle, x) + (edge * valueAt(piece.chordDepth, x)) / 2;
      keep(found, member, 'transfer-diaphragm', 'chord-force', {
        value: Math.abs(value),
        at: toPlan(frame, piece.from + x, t),
      });
    }
  }
}

function transferDiagram(forces: InnerForces, transfer: Transfer, panels: readonly NetPanel[], where: Where): Diagram {
  const sign = where.sign(forces.frame);
  const { s, t } = forces.profile.frame;
  const turned = (c: Polynomial): number[] => c.map((value) => (value === 0 ? 0 : value * sign));
  const { plan } = transfer;
  return {
    kind: 'transfer-diaphragm',
    member: memberOf(forces, transfer),
    level: where.level,
    case: where.case,
    along: [t[0] === 0 ? 0 : t[0] * sign, t[1] === 0 ? 0 : t[1] * sign],
    across: [s[0], s[1]],
    step: plan.step,
    end: plan.end,
    chords: transfer.chords.map(({ corner, t: at, force }) => ({ corner, t: at, axial: zero(force) })),
    edges: [
      { t: plan.lower, axial: zero(transfer.lower) },
      { t: plan.upper, axial: zero(transfer.upper) },
    ],
    panels: panels.map(({ piece, lower, upper, shear }) => ({
      from: piece.from,
      to: piece.to,
      lower: [...lower],
      upper: [...upper],
      shear: turned(shear),
      depth: [...piece.depth],
    })),
  };
}

function zero(value: number): number {
  return value === 0 ? 0 : value;
}

/** The interrupted chords on their way from the end of the transfer diaphragm to the step. */
function struts(forces: InnerForces, transfer: Transfer, where: Where): StrutDiagram[] {
  const { plan } = transfer;
  return transfer.chords.map(({ name, t, force }) => ({
    kind: 'strut',
    member: `${forces.diaphragm.key}/${name}/strut`,
    level: where.level,
    case: where.case,
    from: toPlan(forces.profile.frame, plan.end, t),
    to: toPlan(forces.profile.frame, plan.step, t),
    points: [
      { at: 0, axial: 0 },
      { at: Math.abs(plan.step - plan.end), axial: zero(force) },
    ],
  }));
}

/** Steps, sides of openings and ends of transfer diaphragms at which no wall line's collector runs. */
function dragsOf(forces: InnerForces): Drag[] {
  const { tolerance } = forces.profile;
  const held = (s: number): boolean =>
    forces.diaphragm.touches.some(({ line }) => line.family === forces.frame && Math.abs(line.s - s) <= tolerance);
  const key = forces.diaphragm.key;
  const drags: Drag[] = [];
  const steps = new Set<StepPlan>();
  for (const { plan, stepPlan } of forces.transfers) {
    const { name, s } = stepPlan ?? { name: plan.name, s: plan.step };
    if ((stepPlan === undefined || !steps.has(stepPlan)) && !held(s)) drags.push({ member: `${key}/${name}/drag`, s });
    if (stepPlan !== undefined) steps.add(stepPlan);
    if (plan.endsAt !== 'line' && plan.endsAt !== 'step')
      drags.push({ member: `${key}/${plan.name}/end`, s: plan.end });
  }
  return drags;
}

/** Axial force along a cut where no wall line runs: the floor's net shears on both sides, with loads that lie along it. */
function alongCut(forces: InnerForces, { pushed }: DiaphragmOutcome, s: number): Axial {
  const { profile } = forces;
  const cut = cutAt(profile, s);
  const { before, after } = shearAt(forces, s);
  const flows: Flow[] = [
    ...flowsOver(cut.left, -before),
    ...flowsOver(cut.right, after),
    ...transferFlows(forces, s, -1, cut.left),
    ...transferFlows(forces, s, 1, cut.right),
  ];
  if (pushed.inertia.frame === forces.frame) {
    for (const load of pushed.inertia.along) {
      if (Math.abs(load.s - s) > profile.tolerance) continue;
      flows.push({ from: load.t0, to: load.t1, force: load.force * (pushed.force[0] as number) });
    }
  }
  return axialAlong(flows, profile.tolerance);
}

function dragDiagram(forces: InnerForces, drag: Drag, axial: Axial, where: Where): StrutDiagram {
  const first = axial.points[0]?.t ?? 0;
  const last = axial.points[axial.points.length - 1]?.t ?? 0;
  const { frame } = forces.profile;
  return {
    kind: 'strut',
    member: drag.member,
    level: where.level,
    case: where.case,
    from: toPlan(frame, drag.s, first),
    to: toPlan(frame, drag.s, last),
    points: axial.points.map((point) => ({ at: point.t - first, axial: zero(point.axial) })),
  };
}

function strutRows(found: Found, { member, from, to, points }: StrutDiagram): void {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  let tension = { at: 0, axial: 0 };
  let compression = tension;
  for (const point of points) {
    if (point.axial > tension.axial) tension = point;
    if (point.axial < compression.axial) compression = point;
  }
  const place = (at: number): Point => {
    const part = length === 0 ? 0 : at / length;
    return [from[0] + (to[0] - from[0]) * part, from[1] + (to[1] - from[1]) * part];
  };
  keep(found, member, 'strut', 'axial-tension', { value: tension.axial, at: place(tension.at) });
  keep(found, member, 'strut', 'axial-compression', { value: -compression.axial, at: place(compression.at) });
}
