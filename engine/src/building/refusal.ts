/** Carries faults out of the depth of an analysis that cannot be completed; turned into a `Result` at the engine's door. */
import type { Fault } from './fault.js';

export class Refusal extends Error {
  readonly faults: readonly Fault[];

  constructor(faults: readonly Fault[]) {
    super(faults.map((fault) => `${fault.path}: ${fault.found}`).join('; '));
    this.name = 'Refusal';
    this.faults = faults;
  }
}
