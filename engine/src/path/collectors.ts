/** Collectors of a level: the axial force along every line of resistance, from everything that the floor and the piers put into it. */
import { Refusal } from '../building/refusal.js';
import { axialAlong, flowsOver, type Axial, type Flow } from '../diaphragms/collector.js';
import type { DiaphragmModel, Touch } from '../diaphragms/diaphragm.js';
import { cutOf, shearAt, type InnerForces } from '../diaphragms/inner-forces.js';
import { transferFlows } from '../diaphragms/steps/transfer.js';
import { totalLength, type Interval } from '../geometry/profile.js';
import { distanceAt, pointOn, tOn, type LineModel } from '../walls/wall-line.js';
import type { DiaphragmOutcome, LevelOutcome } from './descent.js';
import type { Model } from './model.js';
import type { CollectorDiagram } from './result.js';
import { addRow, type Table } from './table.js';

/** Lines of one plane at a level, whose collector is one. */
export type CollectorLine = {
  readonly lines: readonly LineModel[];
  readonly axial: Axial;
};

/** Inner forces of a diaphragm by frame. */
export type InnerByFrame = ReadonlyMap<DiaphragmModel, ReadonlyMap<number, InnerForces>>;

export function collectorsOf(model: Model, outcome: LevelOutcome, inner: InnerByFrame): CollectorLine[] {
  const tolerance = 1e-9 * model.extent;
  const groups: LineModel[][] = [];
  const touching = model.lines
    .filter((line) => outcome.diaphragms.some(({ diaphragm }) => touchOf(diaphragm, line) !== undefined))
    .sort((a, b) => a.family - b.family || a.s - b.s);
  for (const line of touching) {
    const last = groups[groups.length - 1];
    const head = last?.[0];
    if (last !== undefined && head !== undefined && head.family === line.family && line.s - head.s <= tolerance)
      last.push(line);
    else groups.push([line]);
  }
  const out: CollectorLine[] = [];
  for (const lines of groups) {
    const flows: Flow[] = [];
    for (const diaphragm of outcome.diaphragms)
      flows.push(...floorFlows(diaphragm, outcome.level.id, lines, inner, tolerance));
    for (const line of lines) {
      flows.push(...pierFlows(line, outcome.level.index + 1, outcome.above[line.index]?.[0] ?? 0));
      flows.push(...pierFlows(line, outcome.level.index, -(outcome.below[line.index]?.[0] ?? 0)));
    }
    const axial = axialAlong(flows, tolerance);
    if (axial.scale > 0) out.push({ lines, axial });
  }
  return out;
}

function touchOf(diaphragm: DiaphragmModel, line: LineModel): Touch | undefined {
  return diaphragm.touches.find((touch) => touch.line === line);
}

/** What a diaphragm puts into the line from its near and its far side, along the family's t. */
function floorFlows(
  outcome: DiaphragmOutcome,
  level: string,
  lines: readonly LineModel[],
  inner: InnerByFrame,
  tolerance: number,
): Flow[] {
  const { diaphragm } = outcome;
  const touched = lines.filter((line) => touchOf(diaphragm, line) !== undefined);
  const line = touched[0];
  if (line === undefined) return [];
  const cut = (touchOf(diaphragm, line) as Touch).cut;
  const frame = line.family;
  const within = inner.get(diaphragm)?.get(frame);
  if (within === undefined) {
    let net = 0;
    for (const each of touched) {
      net += ((outcome.given.get(each)?.[0] ?? 0) - (outcome.taken.get(each)?.[0] ?? 0)) * each.sign;
    }
    return into(clip(cutOf(diaphragm, line), lines, level), net, diaphragm, line);
  }
  const { before, after } = shearAt(within, line.s);
  const scale = Math.abs(before) + Math.abs(after);
  const flows = [
    ...into(clip(cut.left, lines, level), negligible(before, scale) ? 0 : -before, diaphragm, line),
    ...into(clip(cut.right, lines, level), negligible(after, scale) ? 0 : after, diaphragm, line),
    ...transferFlows(within, line.s, -1, cut.left),
    ...transferFlows(within, line.s, 1, cut.right),
  ];
  const { inertia, force } = outcome.pushed;
  if (inertia.frame === frame) {
    for (const load of inertia.along) {
      if (Math.abs(load.s - line.s) > tolerance) continue;
      flows.push({ from: load.t0, to: load.t1, force: load.force * (force[0] as number) });
    }
  }
  return flows;
}

function negligible(value: number, scale: number): boolean {
  return Math.abs(value) <= 1e-12 * scale;
}

function into(intervals: readonly Interval[], force: number, diaphragm: DiaphragmModel, line: LineModel): Flow[] {
  if (force !== 0 && totalLength(intervals) === 0) {
    throw new Refusal([
      {
        code: 'no-collector',
        path: `wallLines[${line.index}]`,
        found: `diaphragm ${diaphragm.key} hands force to wall line ${line.line.id} where no collector or floor runs along it`,
        expected: 'a collector, or a cut of the diaphragm, along the line',
      },
    ]);
  }
  return flowsOver(intervals, force);
}

/** The part of a cut along which a stated collector runs; the whole cut where none is stated. */
export function clip(cut: readonly Interval[], lines: readonly LineModel[], level: string): readonly Interval[] {
  const stated = lines.flatMap((line) =>
    (line.line.collectors ?? [])
      .filter((collector) => collector.level === level)
      .map(({ from, to }): Interval => {
        const a = tOn(line, from);
        const b = tOn(line, to);
        return [Math.min(a, b), Math.max(a, b)];
      }),
  );
  if (stated.length === 0) return cut;
  return cut.flatMap(([a, b]) =>
    stated.map(([low, high]): Interval => [Math.max(a, low), Math.min(b, high)]).filter(([low, high]) => high > low),
  );
}

function pierFlows(line: LineModel, level: number, force: number): Flow[] {
  if (force === 0) return [];
  return (line.storeys[level]?.piers ?? []).map((pier) => ({
    from: tOn(line, pier.from),
    to: tOn(line, pier.to),
    force: force * pier.share * line.sign,
  }));
}

/** Each line of a plane reports the part of the collector that is nearer to it than to its neighbours. */
export function collectorDemands(
  table: Table,
  collector: CollectorLine,
  level: string,
  caseId: string,
): CollectorDiagram[] {
  return rangesOf(collector.lines).map(({ line, low, high }) => {
    const points = collector.axial.points.filter(({ t }) => t >= low && t <= high);
    let tension = { t: start(line), axial: 0 };
    let compression = tension;
    for (const point of points) {
      if (point.axial > tension.axial) tension = point;
      if (point.axial < compression.axial) compression = point;
    }
    const member = `${level}/${line.line.id}`;
    const row = (quantity: 'axial-tension' | 'axial-compression', point: { t: number; axial: number }, sense: 1 | -1) =>
      addRow(
        table,
        {
          member,
          kind: 'collector',
          quantity,
          case: caseId,
          value: Math.abs(point.axial),
          unit: table.units.force,
          at: pointOn(line, distanceAt(line, point.t)),
        },
        sense,
      );
    row('axial-tension', tension, 1);
    row('axial-compression', compression, 1);
    row('axial-tension', compression, -1);
    row('axial-compression', tension, -1);
    const diagram = points.map(({ t, axial }) => ({ at: distanceAt(line, t), axial }));
    if (line.sign < 0) diagram.reverse();
    return { kind: 'collector', member, level, line: line.line.id, case: caseId, points: diagram };
  });
}

/** The lines of a plane, each with the stretch that is nearer to it than to its neighbours. */
export function rangesOf(lines: readonly LineModel[]): { line: LineModel; low: number; high: number }[] {
  const sorted = [...lines].sort((a, b) => middle(a) - middle(b));
  return sorted.map((line, i) => {
    const previous = sorted[i - 1];
    const next = sorted[i + 1];
    return {
      line,
      low: previous === undefined ? -Infinity : (end(previous) + start(line)) / 2,
      high: next === undefined ? Infinity : (end(line) + start(next)) / 2,
    };
  });
}

function start(line: LineModel): number {
  return Math.min(tOn(line, 0), tOn(line, line.length));
}

function end(line: LineModel): number {
  return Math.max(tOn(line, 0), tOn(line, line.length));
}

function middle(line: LineModel): number {
  return (start(line) + end(line)) / 2;
}
