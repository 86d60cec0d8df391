/**
 * The digits in which a working is printed. A result is printed to six significant figures. The values of a step are printed to six as
 * well, or to as many more as the formula needs to give the printed result from the printed values: who recomputes a step from what
 * stands on the paper gets what stands on the paper.
 */

/** Significant figures of results, and the fewest of values. */
export const FIGURES = 6;
/** A number is known to no more than this many. */
const ALL = 17;

export type ShownStep = { readonly values: readonly string[]; readonly result: string };

/**
 * @param values   in the order of the step
 * @param evaluate the step's formula for such values
 */
export function shownStep(values: readonly number[], evaluate: (values: readonly number[]) => number): ShownStep {
  const result = rounded(evaluate(values), FIGURES);
  for (let figures = FIGURES; figures < ALL; figures += 2) {
    const printed = values.map((value) => rounded(value, figures));
    if (rounded(evaluate(printed), FIGURES) === result) return { values: printed.map(String), result: String(result) };
  }
  return { values: values.map((value) => String(value || 0)), result: String(result) };
}

/** A number to so many significant figures, without zeros at its end; with an exponent where it is very large or very small. */
export function shown(value: number, figures: number): string {
  return String(rounded(value, figures));
}

function rounded(value: number, figures: number): number {
  // Small whole numbers and halves are what they are.
  return value === 0
    ? 0
    : Number.isInteger(value * 2) && Math.abs(value) < 1e5
      ? value
      : Number(value.toPrecision(figures));
}
