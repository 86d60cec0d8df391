/** How an address names a demand: `member quantity case sense`, with the combination behind it where there is one. */
import type { Demand } from '@groundward/engine/path/result';

export function referenceOf({
  member,
  quantity,
  case: caseId,
  sense,
  combination,
}: Pick<Demand, 'member' | 'quantity' | 'case' | 'sense' | 'combination'>): string {
  const head = `${member} ${quantity} ${caseId} ${sense}`;
  return combination === undefined ? head : `${head} ${combination}`;
}

/** What the service asks for; undefined for a text that names no demand. */
export function queryOf(reference: string): Readonly<Record<string, string>> | undefined {
  const [member, quantity, caseId, sense, ...rest] = reference.split(' ');
  if (member === undefined || quantity === undefined || caseId === undefined || sense === undefined) return undefined;
  const head = { member, quantity, case: caseId, sense };
  return rest.length === 0 ? head : { ...head, combination: rest.join(' ') };
}

/** Where a value of a working comes from. */
export type Source =
  | { readonly kind: 'step'; readonly index: number }
  | { readonly kind: 'demand'; readonly reference: string }
  | { readonly kind: 'default'; readonly path: string }
  | { readonly kind: 'file'; readonly path: string };

/** @param earlier symbols of the steps before */
export function sourceOf(from: string, earlier: readonly string[]): Source {
  const index = earlier.lastIndexOf(from);
  if (index >= 0) return { kind: 'step', index };
  if (from.startsWith('default ')) return { kind: 'default', path: from.slice('default '.length) };
  return from.includes(' ') ? { kind: 'demand', reference: from } : { kind: 'file', path: from };
}
