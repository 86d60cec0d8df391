/** Where a member's horizontal force comes from and where it ends, `groundward.trace/1`. */
import type { Units } from '../building/definition.js';

/** One part of a force. The parts of a list add up to the whole force exactly; a part may be negative (torsion). */
export type Part = {
  /** `level/diaphragm` for a source; a support's or member's key for an end. */
  readonly member: string;
  readonly level: string;
  /** [force], signed like the member's own force, for sense 1 */
  readonly force: number;
  /** force over the member's force; 0 when that is 0 */
  readonly share: number;
};

export type Trace = {
  readonly schema: 'groundward.trace/1';
  readonly units: Units;
  readonly member: string;
  readonly case: string;
  /** The force traced, for sense 1 [force] */
  readonly force: number;
  /** What feeds it: the masses, by diaphragm, from the top down */
  readonly up: readonly Part[];
  /** Where it ends: supports at the base */
  readonly down: readonly Part[];
};
