/** Workings under a load case that is made of others: the sum of the parts' own demands. */
import type { CombinedRun } from '../path/combined.js';
import type { Demand } from '../path/result.js';
import { fromDemand, fromFile, type Context } from './context.js';
import type { Steps, Value } from './steps.js';

/**
 * Adds the step that puts a wall line's demand together from those of the parts.
 *
 * @returns whether the demand's case is a combined one
 */
export function addedUp(context: Context, demand: Demand, symbol: string, steps: Steps): boolean {
  const combined = context.combined.find((candidate) => candidate.id === demand.case);
  if (combined === undefined) return false;
  const terms: string[] = [];
  const values: Value[] = [];
  combined.parts.forEach(({ run, factor }, p) => {
    const of = { case: run.subCase.id, sense: demand.sense };
    const part = fromDemand(context, `${symbol}_${p + 1}`, of, demand.member, demand.quantity);
    if (part === undefined) return;
    const stated = fromFile(context, `f_${p + 1}`, `${pathOf(context, combined)}.parts[${p}].factor`, '1');
    const reversed = factor * stated.value < 0;
    terms.push(`${reversed ? '−' : terms.length === 0 ? '' : '+'} ${stated.symbol}·${part.symbol}`);
    values.push(stated, part);
  });
  const formula = terms.length === 0 ? '0' : terms.join(' ').trim().replace(/^− /, '−');
  steps.add(symbol, formula, values, demand.unit, {
    what: `the parts together: ${combined.parts.map(({ run }) => run.subCase.id).join(', ')}`,
    clause: 'superposition',
  });
  return true;
}

function pathOf(context: Context, { loadCase }: CombinedRun): string {
  return `loadCases[${context.building.loadCases.indexOf(loadCase)}]`;
}
