/** Design forces of collectors at strength level: which of the standard's sets of forces governs each. */
import { axialSum, type Axial, type AxialPoint } from '../diaphragms/collector.js';
import type { SeismicRules } from '../loads/asce7/overstrength.js';
import { distanceAt, pointOn, type LineModel } from '../walls/wall-line.js';
import type { Bodies } from './bodies.js';
import { collectorsOf, rangesOf, type CollectorLine } from './collectors.js';
import { throughLevel, type Channels, type LevelOutcome } from './descent.js';
import { stopsAt } from './design-set.js';
import { innerByFrame } from './inner-by-frame.js';
import type { Model } from './model.js';
import type { CaseRun } from './run.js';
import { addGoverned, type Table } from './table.js';

type Candidate = { readonly governs: string; readonly points: readonly AxialPoint[] };

/** What a collector is designed for: the largest of `rules`, but not more than `most`. */
type Choice = { readonly rules: readonly Candidate[]; readonly most?: Candidate };

/**
 * @param design the collectors under the diaphragm design set
 * Source: ASCE 7-16 12.10.2.1 with its exceptions, 12.3.3.4; from memory, not checked against the document.
 */
export function collectorDesign(
  table: Table,
  model: Model,
  bodies: Bodies,
  run: CaseRun,
  storey: LevelOutcome,
  design: readonly CollectorLine[],
  rules: SeismicRules,
): void {
  const tolerance = 1e-9 * model.extent;
  const fields = rules.collectors ? fieldsOf(model, bodies, run, storey) : undefined;
  for (const collector of design) {
    const choice =
      fields === undefined
        ? withoutOverstrength(collector, rules)
        : withOverstrength(fields, collector, run, storey.level.index, rules, tolerance);
    for (const { line, low, high } of rangesOf(collector.lines)) {
      for (const sense of [1, -1] as const) {
        for (const [quantity, side] of [
          ['design-tension', sense],
          ['design-compression', -sense],
        ] as const) {
          const { governs, point } = chosen(choice, low, high, side);
          addGoverned(
            table,
            {
              member: `${storey.level.id}/${line.line.id}`,
              kind: 'collector',
              quantity,
              case: run.subCase.id,
              value: Math.max(0, side * (point?.axial ?? 0)),
              unit: table.units.force,
              at: point === undefined ? undefined : pointOn(line, distanceAt(line, point.t)),
            },
            sense,
            governs,
          );
        }
      }
    }
  }
}

function chosen(
  { rules, most }: Choice,
  low: number,
  high: number,
  side: number,
): { governs: string; point: AxialPoint | undefined } {
  const largest = ({ points }: Candidate): AxialPoint | undefined => {
    let best: AxialPoint | undefined;
    for (const point of points) {
      if (point.t < low || point.t > high) continue;
      if (best === undefined || side * point.axial > side * best.axial) best = point;
    }
    return best;
  };
  let governs = '';
  let point: AxialPoint | undefined;
  for (const rule of rules) {
    const candidate = largest(rule);
    if (candidate === undefined) continue;
    if (point !== undefined && side * candidate.axial <= side * point.axial) continue;
    governs = rule.governs;
    point = candidate;
  }
  const cap = most === undefined ? undefined : largest(most);
  if (most === undefined || cap === undefined || point === undefined || side * cap.axial >= side * point.axial)
    return { governs, point };
  return { governs: most.governs, point: cap };
}

/** The diaphragm design set itself, raised where irregularities ask for it. */
function withoutOverstrength({ axial }: CollectorLine, { connections }: SeismicRules): Choice {
  if (connections === 1) return { rules: [{ governs: 'F_px (12.10.1.1)', points: axial.points }] };
  const points = axial.points.map(({ t, axial: force }) => ({ t, axial: connections * force }));
  return { rules: [{ governs: `${connections}·F_px (12.10.1.1, 12.3.3.4)`, points }] };
}

/** Axial forces of a level's collectors from its inertia under a unit force, and from the walls above. */
type Fields = {
  readonly inertia: ReadonlyMap<LineModel, Axial>;
  readonly continuing: ReadonlyMap<LineModel, Axial>;
  readonly stopping: ReadonlyMap<LineModel, Axial>;
};

function fieldsOf(model: Model, bodies: Bodies, run: CaseRun, storey: LevelOutcome): Fields {
  const { level } = storey;
  const field = (force: number, above: readonly Channels[]): ReadonlyMap<LineModel, Axial> => {
    if (force === 0 && above.every(([shear]) => shear === 0)) return new Map();
    const pushed = run.inertias(level).map((inertia) => ({ inertia, force: Float64Array.of(force) }));
    const outcome = throughLevel(model, bodies, level, above, pushed, 1);
    const collectors = collectorsOf(model, outcome, innerByFrame(outcome, run.subCase.frame));
    return new Map(
      collectors.flatMap(({ lines: [head], axial }) => (head === undefined ? [] : [[head, axial] as const])),
    );
  };
  const only = (keep: (line: number) => boolean): Channels[] =>
    storey.above.map((force, i) => (keep(i) ? force : new Float64Array(1)));
  const stops = (line: number): boolean => stopsAt(model, line, level.index);
  return {
    inertia: field(
      run.subCase.sign,
      only(() => false),
    ),
    continuing: field(
      0,
      only((line) => !stops(line)),
    ),
    stopping: field(0, only(stops)),
  };
}

function withOverstrength(
  fields: Fields,
  collector: CollectorLine,
  run: CaseRun,
  level: number,
  rules: SeismicRules,
  tolerance: number,
): Choice {
  const { subCase } = run;
  const head = collector.lines[0] as LineModel;
  const set = (inertia: number, continuing: number, stopping: number): AxialPoint[] =>
    axialSum(
      [
        { axial: fields.inertia.get(head), factor: inertia },
        { axial: fields.continuing.get(head), factor: continuing },
        { axial: fields.stopping.get(head), factor: stopping },
      ],
      tolerance,
    );
  const { overstrength, redundancy } = rules;
  const storeyForce = subCase.storeyForce[level] as number;
  const limits = subCase.diaphragmLimits?.[level];
  // A case with stated forces states its diaphragm force whole: it stands for Eq. 12.10-1.
  const inertial = limits?.inertial ?? subCase.diaphragmForce[level] ?? 0;
  const candidates: Candidate[] = [
    {
      governs: 'Ω₀·F_x (12.10.2.1 item 1)',
      points: set(overstrength * storeyForce, overstrength, overstrength),
    },
    {
      governs: 'Ω₀·F_px (12.10.2.1 item 2)',
      points: set(overstrength * inertial, overstrength, overstrength),
    },
  ];
  if (limits === undefined) return { rules: candidates };
  candidates.push({
    governs: '0.2·S_DS·I_e·w_px (12.10.2.1 item 3)',
    points: set(limits.least, redundancy, overstrength),
  });
  return {
    rules: candidates,
    most: {
      governs: '0.4·S_DS·I_e·w_px (12.10.2.1 exception 1)',
      points: set(limits.most, redundancy, overstrength),
    },
  };
}
