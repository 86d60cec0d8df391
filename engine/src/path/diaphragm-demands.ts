/** The diaphragm design set of a level: inner forces, chords, openings and collectors. */
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import { supportsOf } from '../diaphragms/flexible.js';
import { innerForces, shearAt, type InnerForces } from '../diaphragms/inner-forces.js';
import { totalLength } from '../geometry/profile.js';
import type { Bodies } from './bodies.js';
import { enter, type Ledger } from './certificate.js';
import { clip, collectorDemands, collectorsOf } from './collectors.js';
import { throughLevel, type LevelOutcome } from './descent.js';
import type { Model } from './model.js';
import { openingDemands } from './opening-demands.js';
import type { Diagram } from './result.js';
import { pushedBy, type CaseRun } from './run.js';
import { diaphragmDiagram, spanDemands, spansOf, type SpanRange } from './span-demands.js';
import { stepDemands } from './step-demands.js';
import type { Table } from './table.js';

export function diaphragmDemands(
  table: Table,
  diagrams: Diagram[],
  ledger: Ledger,
  model: Model,
  bodies: Bodies,
  run: CaseRun,
  storey: LevelOutcome,
): void {
  const { subCase } = run;
  const { level } = storey;
  const same = subCase.diaphragmForce[level.index] === subCase.storeyForce[level.index];
  const outcome = same
    ? storey
    : throughLevel(
        model,
        bodies,
        level,
        storey.above,
        pushedBy(run.inertias(level), subCase.diaphragmForce, level, subCase.sign),
        1,
      );
  const inner = new Map<DiaphragmModel, Map<number, InnerForces>>();
  for (const { diaphragm, pushed, given, taken, rigid } of outcome.diaphragms) {
    const frames = new Set([subCase.frame]);
    if (rigid === undefined) for (const [line, force] of taken) if (force[0] !== 0) frames.add(line.family);
    const byFrame = new Map<number, InnerForces>();
    inner.set(diaphragm, byFrame);
    for (const frame of frames) {
      const factor = frame === subCase.frame ? (pushed.force[0] as number) : 0;
      const load = {
        pieces: factor === 0 ? [] : pushed.inertia.load.pieces.map((p) => ({ ...p, w: p.w.map((w) => w * factor) })),
        points: factor === 0 ? [] : pushed.inertia.load.points.map((p) => ({ s: p.s, force: p.force * factor })),
      };
      const lines = [...new Set([...given.keys(), ...taken.keys()])]
        .filter((line) => rigid !== undefined || line.family === frame)
        .map((line) => ({ line, given: given.get(line)?.[0] ?? 0, taken: taken.get(line)?.[0] ?? 0 }));
      const forces = innerForces(diaphragm, frame, load, lines);
      byFrame.set(frame, forces);
      const scale = lines.reduce((sum, { given: g, taken: t }) => sum + Math.abs(g) + Math.abs(t), Math.abs(factor));
      if (scale === 0) continue;
      const where = `${diaphragm.key}, case ${subCase.id}`;
      enter(ledger, 'diaphragm: shear closes', where, forces.closingShear, scale);
      enter(ledger, 'diaphragm: moment closes', where, forces.closingMoment, scale * model.extent);
      const supports = supportsOf(diaphragm, frame);
      const spans = spansOf(forces, supports);
      spanDemands(table, forces, spans, subCase.id, (span) => shearAtCollectors(forces, span, level.id));
      openingDemands(table, forces, subCase.id);
      diagrams.push(
        diaphragmDiagram(
          forces,
          spans,
          supports.flatMap((support) =>
            support.lines.map(({ line }) => ({
              line: line.line.id,
              s: line.s,
              reaction:
                ((given.get(line)?.[0] ?? 0) - (rigid === undefined ? 0 : (taken.get(line)?.[0] ?? 0))) *
                line.sign *
                subCase.sign,
            })),
          ),
          subCase.id,
          level.id,
          frame === subCase.frame ? subCase.sign : 1,
        ),
      );
    }
  }
  for (const each of outcome.diaphragms) {
    const frames = [...(inner.get(each.diaphragm)?.values() ?? [])];
    stepDemands(table, diagrams, ledger, each, frames, {
      level: level.id,
      case: subCase.id,
      sign: (frame) => (frame === subCase.frame ? subCase.sign : 1),
    });
  }
  for (const collector of collectorsOf(model, outcome, inner)) {
    const where = `collector ${level.id}/${collector.lines.map((line) => line.line.id).join('+')}, case ${subCase.id}`;
    enter(ledger, 'collector: closes', where, collector.axial.closing, collector.axial.scale);
    diagrams.push(...collectorDemands(table, collector, level.id, subCase.id));
  }
}

/** Unit shear along a stated collector that is shorter than the cut, at either end of a span. */
function shearAtCollectors(inner: InnerForces, span: SpanRange, level: string): number {
  let largest = 0;
  for (const { line, cut } of inner.diaphragm.touches) {
    if (line.family !== inner.frame || (line.line.collectors ?? []).every((collector) => collector.level !== level))
      continue;
    const { before, after } = shearAt(inner, line.s);
    const tolerance = inner.profile.tolerance;
    if (Math.abs(line.s - span.from) <= tolerance)
      largest = Math.max(largest, Math.abs(after) / totalLength(clip(cut.right, [line], level)));
    if (Math.abs(line.s - span.to) <= tolerance)
      largest = Math.max(largest, Math.abs(before) / totalLength(clip(cut.left, [line], level)));
  }
  return largest;
}
