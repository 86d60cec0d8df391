/** Edits that an engineer would call one change. */
import { isRecord, type Json, type MemberEdit } from './member-edits.js';

/**
 * Groups edits: what happens to one member is one change, and so is the same thing done to a pier in several storeys, to several piers of
 * one storey, or to several floors; an edit goes with the one that brings or takes away what it refers to.
 *
 * @returns groups in the order of their first edits
 */
export function editGroups(edits: readonly MemberEdit[]): MemberEdit[][] {
  const leader = edits.map((_, i) => i);
  const find = (i: number): number => {
    while (leader[i] !== i) i = leader[i] as number;
    return i;
  };
  const join = (a: number, b: number): void => {
    const [first, second] = [find(a), find(b)].sort((x, y) => x - y) as [number, number];
    leader[second] = first;
  };
  const seen = new Map<string, number>();
  edits.forEach((edit, i) => {
    for (const key of keysOf(edit)) {
      const known = seen.get(key);
      if (known === undefined) seen.set(key, i);
      else join(known, i);
    }
  });
  const brought = new Map<string, number>();
  edits.forEach((edit, i) => {
    const last = edit.path[edit.path.length - 1];
    const members = edit.path.length === 2 || edit.path[0] === 'assemblies';
    if (members && typeof last === 'object' && edit.kind !== 'order') brought.set(last.id, i);
  });
  if (brought.size > 0) {
    edits.forEach((edit, i) => {
      for (const id of referencesOf(edit)) {
        const by = brought.get(id);
        if (by !== undefined) join(by, i);
      }
    });
  }
  const groups = new Map<number, MemberEdit[]>();
  edits.forEach((edit, i) => {
    const first = find(i);
    const group = groups.get(first);
    if (group === undefined) groups.set(first, [edit]);
    else group.push(edit);
  });
  return [...groups.values()];
}

/** Keys that edits of one change have in common. */
function keysOf(edit: MemberEdit): string[] {
  const { path } = edit;
  const change = JSON.stringify([edit.kind, edit.before, edit.after]);
  const text = (steps: readonly unknown[]): string => JSON.stringify(steps);
  const member = memberLength(path);
  const own = text(path.slice(0, member));
  const tail = path.slice(member);
  if (path[0] === 'wallLines' && path[4] === 'piers') {
    const [, line, , storey, , pier] = path;
    const tailKey = tail.length === 0 ? edit.kind : `${text(tail)} ${change}`;
    return [
      own,
      `pier ${text([line, pier])} ${tailKey}`,
      ...(tail.length === 0 ? [] : [`piers ${text([line, storey])} ${tailKey}`]),
    ];
  }
  if (path[0] === 'levels' && tail.length > 0 && path.length > 3) {
    const keys = path.map((step) => (typeof step === 'string' ? step : '*'));
    return [own, `floors ${text(keys)} ${change}`];
  }
  return [own];
}

/** Up to where a path names the member itself. */
function memberLength(path: MemberEdit['path']): number {
  if (path[0] !== 'levels' && path[0] !== 'wallLines' && path[0] !== 'assemblies') return Math.min(2, path.length);
  let length = 1;
  path.forEach((step, i) => {
    const collection = path[i - 1];
    if (typeof step !== 'object' || typeof collection !== 'string') return;
    if (MEMBERS.has(collection)) length = i + 1;
  });
  return length;
}

const MEMBERS: ReadonlySet<string> = new Set([
  'levels',
  'diaphragms',
  'openings',
  'wallLines',
  'storeys',
  'piers',
  'walls',
  'holdDowns',
]);

const REFERENCES: ReadonlySet<string> = new Set(['under', 'level', 'assembly', 'holdDown', 'basis']);

/** What an edit refers to: by the identity of a storey or a force, or by a key that names a level, an assembly, a basis. */
function referencesOf(edit: MemberEdit): string[] {
  const found: string[] = [];
  edit.path.forEach((step, i) => {
    const collection = edit.path[i - 1];
    if (
      typeof step === 'object' &&
      (collection === 'storeys' || collection === 'forces' || collection === 'collectors')
    ) {
      found.push(step.id);
    }
  });
  const last = edit.path[edit.path.length - 1];
  for (const value of [edit.before, edit.after]) {
    if (typeof last === 'string' && REFERENCES.has(last) && typeof value === 'string') found.push(value);
    else collect(value, found);
  }
  return found;
}

function collect(value: Json, found: string[]): void {
  if (Array.isArray(value)) for (const entry of value as Json[]) collect(entry, found);
  if (!isRecord(value)) return;
  for (const [key, part] of Object.entries(value)) {
    if (REFERENCES.has(key) && typeof part === 'string') found.push(part);
    else collect(part, found);
  }
}

/** Whether an edit can change no demand: a name, or the order of a list. */
export function changesNothing(edit: MemberEdit): boolean {
  return edit.kind === 'order' || edit.path[edit.path.length - 1] === 'name';
}

/** A group in one sentence: what is done alike is said once. */
export function groupSentence(group: readonly MemberEdit[]): string {
  const alike = new Map<string, MemberEdit[]>();
  for (const edit of group) {
    const key = JSON.stringify([edit.said, edit.names.length, edit.kind === 'order' ? edit.names : kindsOf(edit)]);
    const known = alike.get(key);
    if (known === undefined) alike.set(key, [edit]);
    else known.push(edit);
  }
  const told = [...alike.values()].map((edits) => ({
    names: (edits[0]?.names ?? []).map((_, i) => together(edits.map(({ names }) => names[i] ?? ''))),
    said: edits[0]?.said ?? '',
  }));
  const [first] = told;
  if (first === undefined) return '';
  let common = 0;
  while (told.every(({ names }) => names.length > common + 1 && names[common] === first.names[common])) common += 1;
  if (told.length === 1) return `${first.names.join(', ')}${first.said}`;
  const parts = told.map(({ names, said }) => `${names.slice(common).join(', ')}${said}`);
  const shown = parts.length > 4 ? [...parts.slice(0, 3), `${parts.length - 3} more`] : parts;
  return common === 0 ? shown.join('; ') : `${first.names.slice(0, common).join(', ')}, ${shown.join('; ')}`;
}

/** The names of a path without identities: `wall line`, `storey under`, `pier`, `to`. */
function kindsOf({ names }: MemberEdit): string[] {
  return names.map((name) => (name.includes(' ') ? name.slice(0, name.lastIndexOf(' ')) : name));
}

/** `pier Fa` and `pier Fb` → `pier Fa, Fb`. */
function together(names: readonly string[]): string {
  const [first = '', ...others] = [...new Set(names)];
  const kind = first.slice(0, first.lastIndexOf(' ') + 1);
  return [first, ...others.map((name) => (name.startsWith(kind) ? name.slice(kind.length) : name))].join(' and ');
}
