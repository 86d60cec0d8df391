/** Load cases that act together, as the superposition of their parts: what reaches walls, posts and supports. */
import type { Building, CombinedCase } from '../building/definition.js';
import type { Channels, DiaphragmOutcome, LevelOutcome } from './descent.js';
import type { Graph } from './graph.js';
import type { Model } from './model.js';
import type { PathEdge } from './result.js';
import type { CaseRun } from './run.js';

export type WeightedRun = { readonly run: CaseRun; readonly factor: number };

export type CombinedRun = {
  /** `E`; `E/+-` with the second part in the other sense; `E/+e-e` and `E/+-/+e-e` with the parts' eccentricities */
  readonly id: string;
  readonly loadCase: CombinedCase;
  readonly parts: readonly WeightedRun[];
  /** Shears added up; a diaphragm stands there once for each part, with the part's forces. */
  readonly outcomes: readonly (LevelOutcome | undefined)[];
};

/**
 * Every combined case with all combinations of the senses of its parts (the first in its own: both senses of the whole are run), without
 * eccentricities and with those of all parts that have them, in every combination of their signs.
 */
export function combinedRuns(building: Building, model: Model, runs: readonly CaseRun[]): CombinedRun[] {
  const byId = new Map(runs.map((run) => [run.subCase.id, run]));
  return building.loadCases.flatMap((loadCase) => {
    if (loadCase.from !== 'combined') return [];
    const eccentric = loadCase.parts.map((part) => byId.has(`${part.case}/+e`));
    const senses = signs(loadCase.parts.length - 1).map((rest) => ['+', ...rest]);
    const offsets = [undefined, ...(eccentric.includes(true) ? signs(eccentric.filter(Boolean).length) : [])];
    return senses.flatMap((sense) =>
      offsets.map((offset) => {
        let next = 0;
        const parts = loadCase.parts.flatMap(({ case: id, factor }, p) => {
          const name = offset !== undefined && eccentric[p] === true ? `${id}/${offset[next++] as string}e` : id;
          const run = byId.get(name);
          return run === undefined ? [] : [{ run, factor: sense[p] === '-' ? -factor : factor }];
        });
        const id = [
          loadCase.id,
          ...(sense.includes('-') ? [sense.join('')] : []),
          ...(offset === undefined ? [] : [offset.map((sign) => `${sign}e`).join('')]),
        ].join('/');
        return { id, loadCase, parts, outcomes: superposed(model, parts) };
      }),
    );
  });
}

/** All rows of a number of signs. */
function signs(count: number): ('+' | '-')[][] {
  return count === 0
    ? [[]]
    : signs(count - 1).flatMap((rest) => [
        [...rest, '+' as const],
        [...rest, '-' as const],
      ]);
}

function superposed(model: Model, parts: readonly WeightedRun[]): (LevelOutcome | undefined)[] {
  return model.levels.map((level, i) => {
    const here = parts.flatMap(({ run, factor }) => {
      const outcome = run.outcomes[i];
      return outcome === undefined ? [] : [{ outcome, factor }];
    });
    if (here.length === 0) return undefined;
    const sum = (of: (outcome: LevelOutcome) => readonly Channels[]): Channels[] =>
      model.lines.map((_, line) =>
        Float64Array.of(here.reduce((total, { outcome, factor }) => total + factor * (of(outcome)[line]?.[0] ?? 0), 0)),
      );
    return {
      level,
      above: sum((outcome) => outcome.above),
      below: sum((outcome) => outcome.below),
      diaphragms: here.flatMap(({ outcome, factor }) => outcome.diaphragms.map((each) => scaled(each, factor))),
    };
  });
}

function scaled({ diaphragm, pushed, given, taken }: DiaphragmOutcome, factor: number): DiaphragmOutcome {
  const times = (force: Channels): Channels => force.map((value) => value * factor);
  const all = (forces: DiaphragmOutcome['given']) => new Map([...forces].map(([line, force]) => [line, times(force)]));
  return {
    diaphragm,
    pushed: { inertia: pushed.inertia, force: times(pushed.force) },
    given: all(given),
    taken: all(taken),
  };
}

/** The horizontal edges of combined cases, added up from those of their parts. */
export function addCombined(graph: Graph, combined: readonly CombinedRun[]): void {
  if (combined.length === 0) return;
  const byCase = new Map<string, PathEdge[]>();
  for (const edge of graph.edges) {
    const known = byCase.get(edge.case);
    if (known === undefined) byCase.set(edge.case, [edge]);
    else known.push(edge);
  }
  for (const { id, parts } of combined) {
    const sums = new Map<string, { from: string; to: string; force: number; size: number }>();
    for (const { run, factor } of parts) {
      for (const { from, to, force, acts } of byCase.get(run.subCase.id) ?? []) {
        if (acts !== 'horizontal') continue;
        const key = `${from} ${to}`;
        const sum = sums.get(key) ?? { from, to, force: 0, size: 0 };
        sum.force += factor * force;
        sum.size += Math.abs(factor * force);
        sums.set(key, sum);
      }
    }
    for (const { from, to, force, size } of sums.values()) {
      if (Math.abs(force) > 1e-12 * size) graph.edges.push({ from, to, case: id, force, acts: 'horizontal' });
    }
  }
}
