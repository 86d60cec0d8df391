/** Changes between two revisions, as lists and drawings show them. */
import type { Building, Pier, WallLine } from '@groundward/engine/building/definition';
import type { Change, ChangeClass } from '@groundward/engine/compare/result';

export const CLASSES: readonly ChangeClass[] = ['added', 'removed', 'raised', 'lowered', 'moved', 'unchanged'];

/** Every class has a sign, so that nothing hangs on its colour. */
export const SIGNS: Readonly<Record<ChangeClass, string>> = {
  added: '+',
  removed: '✕',
  raised: '▲',
  lowered: '▼',
  moved: '↔',
  unchanged: '=',
};

export const COLOURS: Readonly<Record<ChangeClass, string>> = {
  added: 'var(--added)',
  removed: 'var(--removed)',
  raised: 'var(--raised)',
  lowered: 'var(--lowered)',
  moved: 'var(--moved)',
  unchanged: 'var(--hair-2)',
};

/** The change over the larger of both values; what came or went counts as a whole. */
export function sizeOf(change: Change): number {
  const most = Math.max(Math.abs(change.before ?? 0), Math.abs(change.after ?? 0));
  return most === 0 ? 0 : Math.abs(difference(change)) / most;
}

/** After less before, by magnitude; what is not there counts as nothing. */
export function difference(change: Change): number {
  return Math.abs(change.after ?? 0) - Math.abs(change.before ?? 0);
}

/** A demand over its capacity that went past 1, or came back below it. */
export function crosses(change: Change): boolean {
  if (change.quantity !== 'ratio') return false;
  return (change.before ?? 0) > 1 !== (change.after ?? 0) > 1;
}

export type Order = 'class' | 'member' | 'quantity' | 'case' | 'combination' | 'before' | 'after' | 'change' | 'size';

const KEYS: Readonly<Record<Order, (change: Change) => number | string>> = {
  class: (change) => CLASSES.indexOf(change.class),
  member: (change) => change.member,
  quantity: (change) => change.quantity,
  case: (change) => `${change.case} ${change.sense}`,
  combination: (change) => change.combination ?? '',
  before: (change) => Math.abs(change.before ?? 0),
  after: (change) => Math.abs(change.after ?? 0),
  change: difference,
  size: sizeOf,
};

/** Sorted by one column; equals by the larger value after. */
export function sorted(changes: readonly Change[], order: Order, falling: boolean): Change[] {
  const key = KEYS[order];
  const turn = falling ? -1 : 1;
  return [...changes].sort((a, b) => {
    const [x, y] = [key(a), key(b)];
    const by = typeof x === 'string' ? x.localeCompare(String(y), 'en', { numeric: true }) : x - Number(y);
    return by === 0 ? Math.abs(b.after ?? 0) - Math.abs(a.after ?? 0) : by * turn;
  });
}

/** Keys of all piers of a building. */
export function pierKeys({ wallLines }: Building): ReadonlySet<string> {
  return new Set(
    wallLines.flatMap((line) =>
      line.storeys.flatMap(({ under, piers }) => piers.map(({ id }) => `${line.id}/${under}/${id}`)),
    ),
  );
}

export type GonePier = { readonly line: WallLine; readonly under: string; readonly pier: Pier };

/** Piers of the first building that the second no longer has. */
export function gonePiers(before: Building, after: Building): GonePier[] {
  const there = pierKeys(after);
  return before.wallLines.flatMap((line) =>
    line.storeys.flatMap(({ under, piers }) =>
      piers.filter(({ id }) => !there.has(`${line.id}/${under}/${id}`)).map((pier) => ({ line, under, pier })),
    ),
  );
}
