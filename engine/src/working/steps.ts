/** Steps of a working while they are put together: every result is computed from the formula that is shown. */
import { expressionOf } from './expression.js';
import type { WorkingStep } from './result.js';
import { shownStep } from './shown.js';

/** A value before it is printed. */
export type Value = {
  readonly symbol: string;
  readonly value: number;
  readonly unit: string;
  readonly what?: string | undefined;
  readonly from?: string | undefined;
};

export type StepNotes = { readonly what?: string | undefined; readonly clause?: string | undefined };

export type Steps = {
  readonly list: WorkingStep[];
  /**
   * Adds a step; `formula` is the right-hand side in the symbols of `values`. Answers its result as a value for later steps.
   *
   * @throws Error where a symbol has no value, or where an earlier step has the same symbol
   */
  readonly add: (symbol: string, formula: string, values: readonly Value[], unit: string, notes?: StepNotes) => Value;
  /** A symbol that no step has yet: `name`, `name_2`, … */
  readonly fresh: (name: string) => string;
};

export function newSteps(): Steps {
  const list: WorkingStep[] = [];
  const taken = new Set<string>();
  return {
    list,
    fresh(name) {
      for (let i = 1; ; i++) {
        const symbol = i === 1 ? name : `${name}_${i}`;
        if (!taken.has(symbol)) return symbol;
      }
    },
    add(symbol, formula, given, unit, { what, clause } = {}) {
      if (taken.has(symbol)) throw new Error(`${symbol} stands for two steps`);
      taken.add(symbol);
      const values = [...new Map(given.map((value) => [value.symbol, value])).values()];
      const place = new Map(values.map((value, i) => [value.symbol, i]));
      const expression = expressionOf(formula);
      const evaluate = (numbers: readonly number[]): number =>
        expression((name) => {
          const number = numbers[place.get(name) ?? -1];
          if (number === undefined) throw new Error(`${symbol} = ${formula}: no value for ${name}`);
          return number;
        });
      const numbers = values.map(({ value }) => value);
      const result = evaluate(numbers) || 0;
      const printed = shownStep(numbers, evaluate);
      list.push({
        symbol,
        ...(what === undefined ? {} : { what }),
        formula: `${symbol} = ${formula}`,
        values: values.map((value, i) => ({
          symbol: value.symbol,
          value: value.value || 0,
          shown: printed.values[i] ?? '',
          unit: value.unit,
          ...(value.what === undefined ? {} : { what: value.what }),
          ...(value.from === undefined ? {} : { from: value.from }),
        })),
        result,
        shown: printed.result,
        unit,
        ...(clause === undefined ? {} : { clause }),
      });
      return { symbol, value: result, unit, from: symbol };
    },
  };
}

/** `a + b − c` of values; `0` where there is none. */
export function sumOf(values: readonly Value[]): string {
  return values.length === 0 ? '0' : values.map(({ symbol }) => symbol).join(' + ');
}
