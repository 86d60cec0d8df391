/** What changed between two buildings, `groundward.comparison/1`. */
import type { Operation } from 'rfc6902';
import type { DemandKind, Quantity, Sense } from '../path/result.js';

export type ChangeClass = 'added' | 'removed' | 'moved' | 'raised' | 'lowered' | 'unchanged';

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
  readonly causes: readonly { readonly edit: string; readonly share: number }[];
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
  readonly changes: readonly Change[];
};
