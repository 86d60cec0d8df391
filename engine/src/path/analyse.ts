/** The analysis of a building: from its file to demands, diagrams, path, findings and certificate. */
import type { Building } from '../building/definition.js';
import type { Result } from '../building/fault.js';
import { Refusal } from '../building/refusal.js';
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import { supportsOf } from '../diaphragms/flexible.js';
import { shiftedBy, spreadOver, type Inertia } from '../diaphragms/inertia.js';
import { innerForces, shearAt, type InnerForces } from '../diaphragms/inner-forces.js';
import { totalLength, type Profile } from '../geometry/profile.js';
import { combinationsOf } from '../loads/combinations.js';
import { descendPosts, GRAVITY, type Components } from '../walls/posts.js';
import { subCases, type SubCase } from './cases.js';
import { BOUND, certificateOf, checkBase, checkLevels, checkPosts, enter, type Ledger } from './certificate.js';
import { clip, collectorDemands, collectorsOf } from './collectors.js';
import { descend, rigidBodies, throughLevel, type LevelOutcome, type Pushed, type RigidBodies } from './descent.js';
import { planFindings, postFindings, torsionFinding } from './findings.js';
import { addHorizontal, addVertical, emptyGraph } from './graph.js';
import { edgeDrifts, levelDemands, torsionalAmplification } from './level-demands.js';
import { buildModel, type LevelModel, type Model } from './model.js';
import { openingDemands } from './opening-demands.js';
import type { Analysis, Diagram, Finding } from './result.js';
import { diaphragmDiagram, spanDemands, spansOf, type SpanRange } from './span-demands.js';
import { unitNames, type Table } from './table.js';
import { lineDemands, pierEndDemands, supportDemands, type LateralComponent } from './wall-demands.js';

/**
 * @param building a building that the reader has passed
 * @returns the analysis, or why it is refused: no stable path, or a certificate above its bound
 */
export function analyse(building: Building): Result<Analysis> {
  try {
    return { ok: true, value: analysisOf(building) };
  } catch (error) {
    if (error instanceof Refusal) return { ok: false, faults: error.faults };
    throw error;
  }
}

function analysisOf(building: Building): Analysis {
  refuseUnavailable(building);
  const model = buildModel(building);
  const bodies = rigidBodies(model);
  const cases = subCases(building, model);
  const table: Table = { rows: [], units: unitNames(building) };
  const diagrams: Diagram[] = [];
  const graph = emptyGraph();
  const ledger: Ledger = new Map();
  const findings: Finding[] = planFindings(model, bodies, new Set(cases.map((subCase) => subCase.frame)));
  const runs: CaseRun[] = [];
  for (const subCase of cases) {
    const run = runCase(model, bodies, subCase);
    runs.push(run);
    levelDemands(table, model, run.outcomes, subCase, run.amplification);
    for (let i = model.levels.length - 1; i > 0; i--) {
      const outcome = run.outcomes[i];
      if (outcome === undefined) continue;
      diaphragmDemands(table, diagrams, ledger, model, bodies, run, outcome);
      for (const diaphragm of outcome.diaphragms) {
        const member = outcome.diaphragms.length === 1 ? outcome.level.id : diaphragm.diaphragm.key;
        const finding = torsionFinding(member, subCase.id, edgeDrifts(diaphragm, subCase));
        if (finding !== undefined) findings.push(finding);
      }
    }
    lineDemands(table, model, run.outcomes, subCase.id);
    checkLevels(ledger, model, run.outcomes, subCase.id);
    checkBase(ledger, model, run.outcomes, subCase);
    addHorizontal(graph, model, run.outcomes, subCase.id);
  }

  const size = GRAVITY.length + cases.length;
  const descent = descendPosts(
    model,
    (line, level) => {
      const shear: Components = new Float64Array(size);
      runs.forEach((run, c) => (shear[GRAVITY.length + c] = run.outcomes[level]?.below[line.index]?.[0] ?? 0));
      return shear;
    },
    size,
  );
  const combinations = combinationsOf(building);
  const lateral = cases.map(({ id, loadCase }, c): LateralComponent => ({
    id,
    component: GRAVITY.length + c,
    combinations: combinations.filter((combination) => combination.applies === loadCase.kind),
  }));
  pierEndDemands(table, descent, lateral);
  supportDemands(
    table,
    descent,
    (foot, component) => {
      const run = runs[component - GRAVITY.length];
      return (run?.outcomes[1]?.below[foot.line.index]?.[0] ?? 0) * foot.pier.share;
    },
    lateral,
    combinations.filter((combination) => combination.applies === 'gravity'),
  );
  addVertical(graph, model, descent, lateral);
  findings.push(...postFindings(model, descent));
  checkPosts(
    ledger,
    model,
    descent,
    cases.map((subCase, c) => ({ subCase, component: GRAVITY.length + c })),
  );
  const certificate = certificateOf(ledger);
  if (!(certificate.worstResidual <= BOUND)) {
    throw new Refusal([
      {
        code: 'certificate',
        path: '',
        found: `an equilibrium residual of ${certificate.worstResidual.toExponential(2)} (${certificate.worst})`,
        expected: `at most ${BOUND.toExponential(0)} of the forces involved`,
      },
    ]);
  }
  return {
    schema: 'groundward.analysis/1',
    units: building.units,
    demands: table.rows,
    diagrams,
    path: { nodes: [...graph.nodes.values()], edges: graph.edges },
    findings,
    certificate,
  };
}

/** What the file may state and this engine does not answer yet is refused, never replaced. */
function refuseUnavailable(building: Building): void {
  const faults = [
    ...building.levels.flatMap((level, l) =>
      (level.diaphragms ?? []).flatMap((diaphragm, d) =>
        diaphragm.behaviour === 'semi-rigid' || diaphragm.behaviour === 'envelope'
          ? [
              {
                code: 'behaviour-not-available',
                path: `levels[${l}].diaphragms[${d}].behaviour`,
                found: diaphragm.behaviour,
                expected: 'flexible or rigid',
              },
            ]
          : [],
      ),
    ),
    ...building.wallLines.flatMap((line, l) =>
      line.shareBy === 'deflection'
        ? [
            {
              code: 'sharing-not-available',
              path: `wallLines[${l}].shareBy`,
              found: 'deflection',
              expected: 'length or stiffness',
            },
          ]
        : [],
    ),
  ];
  if (faults.length > 0) throw new Refusal(faults);
}

/** One load sub-case carried down with the storey forces. */
export type CaseRun = {
  readonly subCase: SubCase;
  readonly outcomes: readonly (LevelOutcome | undefined)[];
  /** The level's inertia with its accidental eccentricity, for any set of forces. */
  readonly inertias: (level: LevelModel) => readonly Inertia[];
  /** Aₓ by level index. */
  readonly amplification: (level: number) => number;
};

export function runCase(model: Model, bodies: RigidBodies, subCase: SubCase): CaseRun {
  const once = (amplification: (level: number) => number): CaseRun => {
    const made = new Map<LevelModel, Inertia[]>();
    const inertias = (level: LevelModel): Inertia[] => {
      let known = made.get(level);
      if (known === undefined) {
        known = spreadOver(level.diaphragms, subCase.frame, subCase.spread).map((inertia) =>
          eccentric(inertia, subCase.eccentricity * amplification(level.index)),
        );
        made.set(level, known);
      }
      return known;
    };
    const push = (level: LevelModel): Pushed[] => pushedBy(inertias(level), subCase.storeyForce, level, subCase.sign);
    return { subCase, outcomes: descend(model, bodies, push, 1), inertias, amplification };
  };
  const plain = once(() => 1);
  if (!subCase.amplified) return plain;
  const factors = plain.outcomes.map((outcome) =>
    Math.max(
      1,
      ...(outcome?.diaphragms ?? []).map((diaphragm) => torsionalAmplification(edgeDrifts(diaphragm, subCase))),
    ),
  );
  return once((level) => factors[level] ?? 1);
}

/** Accidental eccentricity is for diaphragms that can turn as one body. */
function eccentric(inertia: Inertia, ratio: number): Inertia {
  if (ratio === 0 || inertia.diaphragm.behaviour !== 'rigid') return inertia;
  const profile = inertia.diaphragm.profiles[inertia.frame] as Profile;
  return shiftedBy(inertia, ratio * (profile.to - profile.from));
}

export function pushedBy(
  inertias: readonly Inertia[],
  forces: readonly number[],
  level: LevelModel,
  sign: number,
): Pushed[] {
  const force = Float64Array.of((forces[level.index] as number) * sign);
  return inertias.map((inertia) => ({ inertia, force }));
}

/** The diaphragm design set of a level: inner forces, chords and collectors. */
function diaphragmDemands(
  table: Table,
  diagrams: Diagram[],
  ledger: Ledger,
  model: Model,
  bodies: RigidBodies,
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
