/**
 * The digits in which a working is printed. A result is printed to six significant figures. The values of a step are printed to six as
 * well, or to as many more as the formula needs to give the printed result from the printed values: who recomputes a step from what
 * stands on the paper gets what stands on the paper.
 */

/** Significant figures of results, and the fewest of values. */
export const FIGURES = 6;
/** A number is known to no more than this many. */
const ALL = 17;

/** What is below this part of a step's largest addend is rounding. */
const NOTHING = 1e-9;

export type ShownStep = { readonly values: readonly string[]; readonly result: string };

/**
 * @param values   in the order of the step
 * @param evaluate the step's formula for such values
 */
export function shownStep(values: readonly number[], evaluate: (values: readonly number[]) => number): ShownStep {
  const result = shown(evaluate(values), FIGURES);
  for (let figures = FIGURES; figures < ALL; figures += 2) {
    const printed = values.map((value) => shown(value, figures));
    if (shown(evaluate(printed.map(Number)), FIGURES) === result) return { values: printed, result };
  }
  return { values: values.map(String), result };
}

/** A number to so many significant figures, without zeros at its end; with an exponent where it is very large or very small. */
export function shown(value: number, figures: number): string {
  if (value === 0) return '0';
  return String(Number(value.toPrecision(figures)));
}

/** Whether a result is no more than the rounding of what it was made from. */
export function negligible(result: number, beside: number): boolean {
  return Math.abs(result) <= NOTHING * beside;
}
