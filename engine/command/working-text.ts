/** A working as the terminal shows it: each step with its formula, its values and where they come from, its result and its law. */
import { CAUTION } from '../src/foundation/csv.js';
import { FIGURES, shown } from '../src/working/shown.js';
import type { Working, WorkingStep } from '../src/working/result.js';
import { senseText } from './table.js';

export function workingText({ demand, steps }: Working): string {
  const { member, quantity, case: caseId, sense, combination, value, unit } = demand;
  const under = `${caseId} ${senseText(sense)}${combination === undefined ? '' : `, ${combination}`}`;
  return [
    `${member}  ${quantity}  ${under}\n= ${shown(value, FIGURES)}${unitText(unit)}\n`,
    ...steps.map(stepText),
    `Results have ${FIGURES} significant figures; values have as many or more: as many as their step needs to give its printed result.\n`,
    `${CAUTION}\n`,
  ].join('\n');
}

function stepText(step: WorkingStep, i: number): string {
  const head = `${i + 1}. ${step.what ?? ''}`.trimEnd();
  const widths = [0, 1, 2].map((column) =>
    Math.max(0, ...step.values.map((value) => (cells(value)[column] ?? '').length)),
  );
  const lines = step.values.map((value) => {
    const [symbol, number, from] = cells(value);
    const what = value.what === undefined ? '' : `; ${value.what}`;
    return `     ${symbol.padEnd(widths[0] ?? 0)} = ${number.padEnd(widths[1] ?? 0)}  ${from}${what}`.trimEnd();
  });
  const clause = step.clause === undefined ? '' : `   [${step.clause}]`;
  return `${[head, `   ${step.formula} = ${step.shown}${unitText(step.unit)}${clause}`, ...lines].join('\n')}\n`;
}

function cells(value: WorkingStep['values'][number]): [string, string, string] {
  return [
    value.symbol,
    `${value.shown}${unitText(value.unit)}`,
    value.from === value.symbol ? 'above' : (value.from ?? ''),
  ];
}

function unitText(unit: string): string {
  return unit === '1' ? '' : ` ${unit}`;
}
