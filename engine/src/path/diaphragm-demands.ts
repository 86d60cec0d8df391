/** The diaphragm design set of a level: inner forces, chords, openings and collectors. */
import { supportsOf } from '../diaphragms/flexible.js';
import { shearAt, type InnerForces } from '../diaphragms/inner-forces.js';
import { totalLength } from '../geometry/profile.js';
import type { SeismicRules } from '../loads/asce7/overstrength.js';
import type { Bodies } from './bodies.js';
import { enter, type Ledger } from './certificate.js';
import { collectorDesign } from './collector-design.js';
import { clip, collectorDemands, collectorsOf, type CollectorLine } from './collectors.js';
import type { LevelOutcome } from './descent.js';
import { designSet } from './design-set.js';
import { innerByFrame } from './inner-by-frame.js';
import type { Model } from './model.js';
import { openingDemands } from './opening-demands.js';
import type { Diagram } from './result.js';
import type { CaseRun } from './run.js';
import { diaphragmDiagram, spanDemands, spansOf, type SpanRange } from './span-demands.js';
import { stepDemands } from './step-demands.js';
import { addGoverned, type Table } from './table.js';

export function diaphragmDemands(
  table: Table,
  diagrams: Diagram[],
  ledger: Ledger,
  model: Model,
  bodies: Bodies,
  run: CaseRun,
  storey: LevelOutcome,
  rules: SeismicRules | undefined,
): void {
  const { subCase } = run;
  const { level } = storey;
  const outcome = designSet(model, bodies, run, storey, rules);
  const inner = innerByFrame(outcome, subCase.frame);
  for (const { diaphragm, pushed, given, taken, rigid } of outcome.diaphragms) {
    for (const [frame, forces] of inner.get(diaphragm) ?? []) {
      const factor = frame === subCase.frame ? (pushed.force[0] as number) : 0;
      const lines = [...new Set([...given.keys(), ...taken.keys()])].filter(
        (line) => rigid !== undefined || line.family === frame,
      );
      const scale = lines.reduce(
        (sum, line) => sum + Math.abs(given.get(line)?.[0] ?? 0) + Math.abs(taken.get(line)?.[0] ?? 0),
        Math.abs(factor),
      );
      if (scale === 0) continue;
      const where = `${diaphragm.key}, case ${subCase.id}`;
      enter(ledger, 'diaphragm: shear closes', where, forces.closingShear, scale);
      enter(ledger, 'diaphragm: moment closes', where, forces.closingMoment, scale * model.extent);
      const supports = supportsOf(diaphragm, frame);
      const spans = spansOf(forces, supports);
      spanDemands(table, forces, spans, subCase.id, (span) => shearAtCollectors(forces, span, level.id));
      openingDemands(table, diagrams, forces, { level: level.id, case: subCase.id });
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
  const collectors = collectorsOf(model, outcome, inner);
  for (const collector of collectors) {
    const where = `collector ${level.id}/${collector.lines.map((line) => line.line.id).join('+')}, case ${subCase.id}`;
    enter(ledger, 'collector: closes', where, collector.axial.closing, collector.axial.scale);
    diagrams.push(...collectorDemands(table, collector, level.id, subCase.id));
  }
  if (rules === undefined) return;
  collectorDesign(table, model, bodies, run, storey, collectors, rules);
  if (rules.connections > 1) connectionDemands(table, outcome, collectors, subCase.id, rules);
}

/** What the floor hands to each line of walls, raised where irregularities ask for it. */
function connectionDemands(
  table: Table,
  outcome: LevelOutcome,
  collectors: readonly CollectorLine[],
  caseId: string,
  rules: SeismicRules,
): void {
  for (const line of collectors.flatMap(({ lines }) => lines)) {
    let force = 0;
    for (const { given, taken } of outcome.diaphragms)
      force += (given.get(line)?.[0] ?? 0) - (taken.get(line)?.[0] ?? 0);
    if (force === 0) continue;
    const row = {
      member: `${outcome.level.id}/${line.line.id}`,
      kind: 'collector' as const,
      quantity: 'connection-force' as const,
      case: caseId,
      value: rules.connections * Math.abs(force),
      unit: table.units.force,
    };
    const governs = `${rules.connections}·F_px (12.3.3.4)`;
    addGoverned(table, row, 1, governs);
    addGoverned(table, row, -1, governs);
  }
}

/** Unit shear along a stated collector that is shorter than the cut, at either end of a span. */
export function shearAtCollectors(inner: InnerForces, span: SpanRange, level: string): number {
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
