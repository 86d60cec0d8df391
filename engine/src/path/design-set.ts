/** The diaphragm design set of a level: its design force, with the transfers arriving from above as the standard raises them. */
import type { SeismicRules } from '../loads/asce7/overstrength.js';
import type { Bodies } from './bodies.js';
import { throughLevel, type Channels, type LevelOutcome } from './descent.js';
import type { Model } from './model.js';
import { pushedBy, type CaseRun } from './run.js';

export function designSet(
  model: Model,
  bodies: Bodies,
  run: CaseRun,
  storey: LevelOutcome,
  rules: SeismicRules | undefined,
): LevelOutcome {
  const { subCase } = run;
  const { level } = storey;
  const above = raisedAbove(model, storey, rules);
  const same = subCase.diaphragmForce[level.index] === subCase.storeyForce[level.index];
  if (same && above === storey.above) return storey;
  const pushed = pushedBy(run.inertias(level), subCase.diaphragmForce, level, subCase.sign);
  return throughLevel(model, bodies, level, above, pushed, 1);
}

/**
 * Shears of the walls above as transfers: with Ω₀ where the wall stops (horizontal irregularity type 4), with ρ where it goes on; the
 * level's own design force takes neither.
 *
 * Source: ASCE 7-16 12.10.1.1 and 12.3.4.1; from memory, not checked against the document.
 */
function raisedAbove(model: Model, storey: LevelOutcome, rules: SeismicRules | undefined): readonly Channels[] {
  if (rules === undefined) return storey.above;
  const factors = model.lines.map((line) => {
    if (storey.above[line.index]?.[0] === 0) return 1;
    return stopsAt(model, line.index, storey.level.index) ? rules.overstrength : rules.redundancy;
  });
  if (factors.every((factor) => factor === 1)) return storey.above;
  return storey.above.map((force, i) => force.map((value) => value * (factors[i] as number)));
}

/** Whether a wall line stands on a level and not under it. */
export function stopsAt(model: Model, line: number, level: number): boolean {
  const storeys = model.lines[line]?.storeys;
  return storeys?.[level + 1] !== undefined && storeys[level] === undefined;
}
