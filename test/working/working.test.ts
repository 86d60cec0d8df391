import { readdirSync, readFileSync } from 'node:fs';
import { readBuildingText } from '@groundward/engine/building/read';
import type { DemandKind, Quantity } from '@groundward/engine/path/result';
import { workingContext, type Context } from '@groundward/engine/working/context';
import { explain } from '@groundward/engine/working/explain';
import { referenceOf } from '@groundward/engine/working/reference';
import { Working, type WorkingStep, type WorkingValue } from '@groundward/engine/working/result';
import { workingFor } from '@groundward/engine/working/registry';
import { describe, expect, test } from 'vitest';
import { calculate } from './pocket-calculator.js';

const folders = ['../../prisma/demo/', '../buildings/'].map((folder) => new URL(folder, import.meta.url));
const files = folders.flatMap((folder) =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.json') && name !== 'revisions.json')
    .map((name) => ({ name: name.slice(0, -5), url: new URL(name, folder) })),
);

function contextOf(url: URL): Context {
  const read = readBuildingText(readFileSync(url, 'utf8'));
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const context = workingContext(read.value);
  if (!context.ok) throw new Error(JSON.stringify(context.faults));
  return context.value;
}

/** Half a unit in the last of six significant figures, and a hair. */
const HALF_A_FIGURE = 0.5001e-5;

/** Recomputes a step from what is printed; says what is wrong, or nothing. */
function recomputed({ symbol, formula, values, shown, result }: WorkingStep): string | undefined {
  const [left, ...right] = formula.split(' = ');
  if (left !== symbol || right.length !== 1) return `${formula} is no formula of ${symbol}`;
  if (Math.abs(Number(shown) - result) > HALF_A_FIGURE * Math.abs(result))
    return `${symbol} = ${result} is printed ${shown}`;
  const printed = new Map(values.map((value) => [value.symbol, Number(value.shown)]));
  for (const value of values) {
    if (Math.abs(Number(value.shown) - value.value) > HALF_A_FIGURE * Math.abs(value.value))
      return `${value.symbol} is printed ${value.shown}`;
  }
  const expression = right[0] ?? '';
  const again = calculate(expression, printed);
  const size = Math.abs(Number(shown));
  if (Math.abs(again - Number(shown)) <= HALF_A_FIGURE * size) return undefined;
  // A sum that cancels: what is left is the rounding of its addends.
  const addends = calculate(
    expression.replaceAll('−', '+').replace(/^\+ ?|(?<=[(,] ?)\+ ?/g, ''),
    new Map([...printed].map(([name, value]) => [name, Math.abs(value)])),
  );
  return Math.abs(again - Number(shown)) <= 1e-12 * Math.abs(addends)
    ? undefined
    : `${formula} gives ${again}, printed ${shown}`;
}

/** What stands at a path of the file. */
function inFile(building: unknown, path: string): unknown {
  return path
    .split(/[.[\]]/)
    .filter((part) => part !== '')
    .reduce(
      (at: unknown, part) =>
        typeof at === 'object' && at !== null ? (at as Record<string, unknown>)[part] : undefined,
      building,
    );
}

function unresolved(
  context: Context,
  { symbol, from, value }: WorkingValue,
  earlier: ReadonlyMap<string, number>,
): string | undefined {
  if (from === undefined) return `${symbol} comes from nowhere`;
  if (from.startsWith('default ')) {
    return inFile(context.building, from.slice('default '.length)) === undefined ? undefined : `${from} is stated`;
  }
  if (earlier.has(from))
    return earlier.get(from) === value ? undefined : `step ${from} gave ${earlier.get(from)}, not ${value}`;
  if (from.includes(' ')) {
    const demand = context.demands.get(from);
    return demand?.value === value ? undefined : `${from} is ${demand?.value}, not ${value}`;
  }
  const found = inFile(context.building, from);
  if (typeof found === 'number') return found === value ? undefined : `${from} is ${found}, not ${value}`;
  // A drawing from which a length or an area was read, or a direction.
  return typeof found === 'object' ? undefined : `${from} is ${typeof found}`;
}

/** Quantities that `explain` still refuses with a sentence. One that gets its working leaves this list. */
const REFUSED = new Set([
  'collector connection-force',
  'collector design-tension',
  'collector design-compression',
  'diaphragm-span net-unit-shear',
  'transfer-diaphragm shear',
  'transfer-diaphragm net-unit-shear',
  'transfer-diaphragm chord-force',
  'strut axial-tension',
  'strut axial-compression',
]);

test('what is refused has no working', () => {
  for (const name of REFUSED) {
    const [kind, quantity] = name.split(' ') as [DemandKind, Quantity];
    expect(workingFor(kind, quantity), name).toBeUndefined();
  }
});

describe.each(files)('every demand of $name', ({ url }) => {
  test('has a working whose printed steps a checker can recompute, down to the file', () => {
    const context = contextOf(url);
    const largest = new Map<string, number>();
    for (const { unit, value } of context.analysis.demands)
      largest.set(unit, Math.max(largest.get(unit) ?? 0, Math.abs(value)));
    const wrong: string[] = [];
    let count = 0;
    let refused = 0;
    const sound = new Set<string>();
    const { demands } = context.analysis;
    for (const demand of demands) {
      const at = referenceOf(demand);
      if (workingFor(demand.kind, demand.quantity) === undefined) {
        if (!REFUSED.has(`${demand.kind} ${demand.quantity}`))
          wrong.push(`no working for ${demand.quantity} of a ${demand.kind}`);
        refused += 1;
        continue;
      }
      const working = explain(context, demand);
      count += 1;
      const earlier = new Map<string, number>();
      for (const step of working.steps) {
        // The same step stands in many workings.
        const printed = `${step.formula} ${step.shown} ${step.values.map((value) => value.shown).join(' ')}`;
        const fault = sound.has(printed) ? undefined : recomputed(step);
        if (fault === undefined) sound.add(printed);
        else wrong.push(`${at}: ${fault}`);
        for (const value of step.values) {
          const broken = unresolved(context, value, earlier);
          if (broken !== undefined) wrong.push(`${at}: ${step.symbol}: ${broken}`);
        }
        if (earlier.has(step.symbol)) wrong.push(`${at}: two steps for ${step.symbol}`);
        earlier.set(step.symbol, step.result);
      }
      const last = working.steps[working.steps.length - 1];
      const slack = 1e-9 * (largest.get(demand.unit) ?? 0);
      if (last === undefined || last.unit !== demand.unit || !(Math.abs(last.result - demand.value) <= slack)) {
        wrong.push(`${at}: ${demand.value} ${demand.unit}, the working gives ${last?.result} ${last?.unit}`);
      }
    }
    const kinds = [...new Set(wrong)];
    expect(kinds.slice(0, 20), `${kinds.length} faults`).toEqual([]);
    expect(count + refused).toBe(demands.length);
  });
});

test('a working is valid against its definition', () => {
  const context = contextOf(files[0]?.url as URL);
  const { demands } = context.analysis;
  for (const demand of demands.filter((row) => workingFor(row.kind, row.quantity) !== undefined).slice(0, 200))
    expect(Working.safeParse(explain(context, demand)).error).toBeUndefined();
});
