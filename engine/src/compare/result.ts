/** What changed between two buildings, `groundward.comparison/1`. */
import type { Operation } from 'rfc6902';
import type { Match } from './match-by-place.js';
import type { Method } from './shapley.js';
import type { DemandKind, Quantity, Sense } from '../path/result.js';

export type ChangeClass = 'added' | 'removed' | 'moved' | 'raised' | 'lowered' | 'unchanged';

export type Cause = {
  readonly edit: string;
  /** In the demand’s own unit. */
  readonly share: number;
  /** Standard error of a share that was sampled. */
  readonly error?: number;
};

export type Change = {
  readonly member: string;
  readonly kind: DemandKind;
  readonly quantity: Quantity;
  readonly case: string;
  readonly sense: Sense;
  readonly combination?: string;
  /** null for what did not exist before */
  readonly before: number | null;
  /** null for what does not exist any more */
  readonly after: number | null;
  readonly unit: string;
  readonly class: ChangeClass;
  /** Shares add up to `after − before`, null counted as 0; empty where causes were not asked for. */
  readonly causes: readonly Cause[];
};

export type Edit = {
  readonly id: string;
  /** One sentence in the trade's words. */
  readonly what: string;
  readonly patch: readonly Operation[];
};

export type Comparison = {
  readonly schema: 'groundward.comparison/1';
  readonly edits: readonly Edit[];
  /** Members whose ids changed and that were known again by their place: the edits and changes are under their later ids. */
  readonly matches?: readonly Match[];
  /** How the causes were found; absent where they were not asked for. */
  readonly method?: Method;
  readonly changes: readonly Change[];
};
