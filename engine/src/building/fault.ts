/** One fault, from the engine to the screen: where, what was found, what was expected. */
export type Fault = {
  /** Short code in kebab case, the same in engine, service and dashboard. */
  readonly code: string;
  /** JSON path into the building file, such as `levels[1].diaphragms[0].outline`; empty for the whole file. */
  readonly path: string;
  readonly found: string;
  readonly expected: string;
  readonly hint?: string;
};

/** What a reader or an analysis answers: a value, or every fault at once. */
export type Result<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly faults: readonly Fault[] };

/** The sentence that every surface shows for a fault. */
export function faultSentence(fault: Fault): string {
  const where = fault.path === '' ? '' : `${fault.path}: `;
  const hint = fault.hint === undefined ? '' : ` (${fault.hint})`;
  return `${where}found ${fault.found}, expected ${fault.expected}${hint} [${fault.code}]`;
}
