/** The analysis of a building: from its file to demands, diagrams, path, findings and certificate. */
import type { Building, LoadCase } from '../building/definition.js';
import type { Result } from '../building/fault.js';
import { Refusal } from '../building/refusal.js';
import type { SeismicRules } from '../loads/asce7/overstrength.js';
import { basisFindings } from '../loads/basis-findings.js';
import { combinationsFor, formatFor, gravityCombinations, overstrengthFor } from '../loads/combinations.js';
import { GRAVITY, type PostDescent } from '../walls/posts.js';
import { sharingFaults } from '../walls/sharing-faults.js';
import { neededRuns, withoutAccidental } from './accidental.js';
import { bodiesOf, type Bodies } from './bodies.js';
import { subCases } from './cases.js';
import { addCombined, combinedRuns, type CombinedRun } from './combined.js';
import {
  BOUND,
  MEMBRANE_BOUND,
  certificateOf,
  checkBase,
  checkLevels,
  checkPosts,
  type Ledger,
} from './certificate.js';
import { diaphragmDemands } from './diaphragm-demands.js';
import { planFindings, postFindings, torsionFindings } from './findings.js';
import { addHorizontal, addVertical, emptyGraph } from './graph.js';
import { levelDemands } from './level-demands.js';
import { buildModel, type Model } from './model.js';
import { pierRatios, slenderFindings } from './pier-ratios.js';
import {
  redundanciesOf,
  redundancyFindings,
  requirementFindings,
  requirementsOf,
  withRedundancies,
  type Redundancies,
  type Requirements,
} from './requirements.js';
import type { Analysis, Diagram, Finding } from './result.js';
import { descendAll, runCase, type CaseRun } from './run.js';
import { checkMembranes, semiRigidFindings } from './semi-rigid-findings.js';
import { supportingOf, type Supporting } from './supporting.js';
import { unitNames, type Table } from './table.js';
import { lineDemands, pierEndDemands, supportDemands, type LateralComponent } from './wall-demands.js';

/**
 * @param building a building that the reader has passed
 * @returns the analysis, or why it is refused: no stable path, or a certificate above its bound
 */
export function analyse(building: Building): Result<Analysis> {
  try {
    return { ok: true, value: analysisOf(prepare(building)) };
  } catch (error) {
    if (error instanceof Refusal) return { ok: false, faults: error.faults };
    throw error;
  }
}

/** Everything that an analysis reads its demands off: also what a working goes back to. */
export type Prepared = {
  readonly building: Building;
  readonly model: Model;
  readonly bodies: Bodies;
  readonly runs: readonly CaseRun[];
  readonly combined: readonly CombinedRun[];
  readonly descent: PostDescent;
  /** Of the plan, then of torsion: what irregularities are read from. */
  readonly irregular: readonly Finding[];
  /** What decided on accidental torsion. */
  readonly accidental: readonly Finding[];
  readonly redundancies: Redundancies;
  readonly requirements: Requirements;
  /** What stands under walls that stop. */
  readonly supporting: Supporting;
};

/** @throws Refusal where no stable path is found */
export function prepare(building: Building): Prepared {
  refuseUnavailable(building);
  const model = buildModel(building);
  const bodies = bodiesOf(model);
  const { runs, findings: accidental } = neededRuns(
    subCases(building, model).map((subCase) => runCase(model, bodies, subCase)),
  );
  const combined = combinedRuns(building, model, runs);
  const descent = descendAll(model, [...runs, ...combined]);
  const irregular = [
    ...planFindings(model, bodies, new Set(runs.map(({ subCase }) => subCase.frame))),
    ...runs.flatMap((run) => torsionFindings(run)),
  ];
  const rules = requirementsOf(building, model, irregular, descent);
  const redundancies = redundanciesOf(building, model, runs, rules);
  return {
    building,
    model,
    bodies,
    runs,
    combined,
    descent,
    irregular,
    accidental,
    redundancies,
    requirements: withRedundancies(rules, redundancies),
    supporting: supportingOf(descent),
  };
}

/** @throws Refusal where the certificate is above its bound */
export function analysisOf(prepared: Prepared): Analysis {
  const { building, model, bodies, runs, combined, descent, irregular, requirements, redundancies, supporting } =
    prepared;
  const table: Table = { rows: [], units: unitNames(building) };
  const diagrams: Diagram[] = [];
  const graph = emptyGraph();
  const ledger: Ledger = new Map();
  const findings: Finding[] = [
    ...irregular,
    ...prepared.accidental,
    ...withoutAccidental(building, model),
    ...redundancyFindings(redundancies),
    ...requirementFindings(building, requirements, supporting.feet.size + supporting.columns.size > 0),
  ];
  findings.push(...basisFindings(building));
  for (const run of runs) {
    const { subCase } = run;
    levelDemands(table, model, run);
    for (let i = model.levels.length - 1; i > 0; i--) {
      const outcome = run.outcomes[i];
      if (outcome === undefined) continue;
      diaphragmDemands(table, diagrams, ledger, model, bodies, run, outcome, requirements.get(subCase.loadCase.id));
    }
    lineDemands(table, model, run.outcomes, subCase.id);
    checkLevels(ledger, model, run.outcomes, subCase.id);
    checkBase(ledger, model, run.outcomes, subCase.id);
    addHorizontal(graph, model, run.outcomes, subCase.id);
  }

  for (const { id, outcomes } of combined) {
    lineDemands(table, model, outcomes, id);
    checkLevels(ledger, model, outcomes, id);
    checkBase(ledger, model, outcomes, id);
  }
  addCombined(graph, combined);

  const carried = [
    ...runs.map((run) => ({ ...run.subCase, outcomes: run.outcomes, parts: [{ subCase: run.subCase, factor: 1 }] })),
    ...combined.map(({ parts, ...rest }) => ({
      ...rest,
      parts: parts.map(({ run, factor }) => ({ subCase: run.subCase, factor })),
    })),
  ];
  const lateral = carried.map(({ id, loadCase }, c): LateralComponent => ({
    id,
    component: GRAVITY.length + c,
    combinations: combinationsFor(building, loadCase, redundancies.get(loadCase.id)?.factor),
    overstrength: overstrengthOf(building, loadCase, requirements.get(loadCase.id)),
  }));
  pierEndDemands(table, descent, supporting, lateral);
  findings.push(
    ...slenderFindings(model),
    ...pierRatios(
      table,
      descent,
      runs.map((run, c) => ({
        ...(lateral[c] as LateralComponent),
        run,
        format: formatFor(building, run.subCase.loadCase),
      })),
    ),
  );
  supportDemands(
    table,
    descent,
    supporting,
    (foot, component) => {
      const run = carried[component - GRAVITY.length];
      return (run?.outcomes[1]?.below[foot.line.index]?.[0] ?? 0) * foot.pier.share;
    },
    lateral,
    gravityCombinations(building),
  );
  addVertical(graph, model, descent, lateral);
  findings.push(...semiRigidFindings(bodies, runs), ...postFindings(model, descent));
  checkPosts(
    ledger,
    model,
    descent,
    carried.map(({ id, parts }, c) => ({ id, parts, component: GRAVITY.length + c })),
  );
  const membranes = checkMembranes(ledger, bodies);
  const certificate = certificateOf(ledger, membranes ? MEMBRANE_BOUND : BOUND);
  if (!(certificate.worstResidual <= certificate.bound)) {
    throw new Refusal([
      {
        code: 'certificate',
        path: '',
        found: `an equilibrium residual of ${certificate.worstResidual.toExponential(2)} (${certificate.worst})`,
        expected: `at most ${certificate.bound.toExponential(0)} of the forces involved`,
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

function overstrengthOf(building: Building, loadCase: LoadCase, rules: SeismicRules | undefined) {
  return rules === undefined ? [] : overstrengthFor(building, loadCase, rules.overstrength);
}

/** What the file may state and this engine does not answer yet is refused, never replaced. */
function refuseUnavailable(building: Building): void {
  const faults = [
    ...building.levels.flatMap((level, l) =>
      (level.diaphragms ?? []).flatMap((diaphragm, d) =>
        diaphragm.behaviour === 'envelope'
          ? [
              {
                code: 'behaviour-not-available',
                path: `levels[${l}].diaphragms[${d}].behaviour`,
                found: diaphragm.behaviour,
                expected: 'flexible, rigid or semi-rigid',
              },
            ]
          : [],
      ),
    ),
    ...sharingFaults(building),
  ];
  if (faults.length > 0) throw new Refusal(faults);
}
