/** The difference of two building files as edits of members: each known by identity, so that any of them can be made without the others. */
import type { Building, Units } from '../building/definition.js';
import { unitOfKey } from './key-units.js';

export type Json = unknown;

/** A key of an object, or the identity of an entry of a list. */
export type Step = string | { readonly id: string };

export type MemberEdit = {
  readonly path: readonly Step[];
  readonly kind: 'set' | 'remove' | 'order';
  readonly before: Json;
  readonly after: Json;
  /** Of a list’s entry, or of a list put in order: the identities of the list after all edits. */
  readonly order: readonly string[];
  /** The path in words, and what is said of it: `wall line A`, `pier Ad`, `from` and `: 25 → 24.2 m`. */
  readonly names: readonly string[];
  readonly said: string;
};

/** @returns edits which, made one after the other, turn the earlier file into the later one; any part of them can be made alone */
export function memberEdits(before: Building, after: Building): MemberEdit[] {
  const edits: MemberEdit[] = [];
  walk(before, after, [], [], { edits, units: same(before.units, after.units) ? after.units : undefined });
  return edits;
}

type Found = { readonly edits: MemberEdit[]; readonly units: Units | undefined };

function walk(before: Json, after: Json, path: readonly Step[], names: readonly string[], found: Found): void {
  if (same(before, after)) return;
  if (isRecord(before) && isRecord(after)) {
    // In one order whatever order a file's keys come in, so that the same difference is told in the same words.
    for (const key of Object.keys(before).sort()) {
      if (key in after) continue;
      found.edits.push({
        path: [...path, key],
        kind: 'remove',
        before: before[key],
        after: undefined,
        order: [],
        names: [...names, key],
        said: ' removed',
      });
    }
    for (const key of Object.keys(after).sort()) {
      const value = after[key];
      if (key in before) walk(before[key], value, [...path, key], [...names, key], found);
      else {
        found.edits.push({
          path: [...path, key],
          kind: 'set',
          before: undefined,
          after: value,
          order: [],
          names: [...names, key],
          said: ` set to ${shown(value)}${unitText(value, key, found)}`,
        });
      }
    }
    return;
  }
  const earlier = identified(before);
  const later = identified(after);
  if (earlier !== undefined && later !== undefined) {
    walkList(earlier, later, path, names, found);
    return;
  }
  const said = `: ${shown(before)} → ${shown(after)}${unitText(after, names[names.length - 1] ?? '', found)}`;
  found.edits.push({ path, kind: 'set', before, after, order: [], names, said });
}

type Entries = ReadonlyMap<string, Json>;

function walkList(
  before: Entries,
  after: Entries,
  path: readonly Step[],
  names: readonly string[],
  found: Found,
): void {
  const order = [...after.keys()];
  const one = singular(names[names.length - 1] ?? '');
  const owner = names.slice(0, -1);
  const of = (id: string) => ({ path: [...path, { id }], order, names: [...owner, `${one} ${id}`] });
  for (const [id, value] of before) {
    if (!after.has(id)) {
      found.edits.push({ ...of(id), kind: 'remove', before: value, after: undefined, said: ' removed' });
    }
  }
  for (const [id, value] of after) {
    if (before.has(id)) walk(before.get(id), value, of(id).path, of(id).names, found);
    else found.edits.push({ ...of(id), kind: 'set', before: undefined, after: value, said: ' added' });
  }
  const kept = [...before.keys()].filter((id) => after.has(id));
  const now = order.filter((id) => before.has(id));
  if (kept.every((id, i) => id === now[i])) return;
  found.edits.push({ path, kind: 'order', before: kept, after: now, order, names, said: ' in another order' });
}

/** A list whose entries all have an identity of their own; storeys, forces and collectors are known by their level. */
export function identified(value: Json): Entries | undefined {
  if (!Array.isArray(value)) return undefined;
  const entries = new Map<string, Json>();
  for (const entry of value as Json[]) {
    const id = identityOf(entry);
    if (id === undefined || entries.has(id)) return undefined;
    entries.set(id, entry);
  }
  return entries;
}

export function identityOf(entry: Json): string | undefined {
  if (!isRecord(entry)) return undefined;
  const id = entry['id'] ?? entry['under'] ?? entry['level'] ?? entry['case'];
  return typeof id === 'string' ? id : undefined;
}

export function isRecord(value: Json): value is Record<string, Json> {
  return value !== null && typeof value === 'object' && !Array.isArray(value);
}

export function same(a: Json, b: Json): boolean {
  if (a === b) return true;
  if (Array.isArray(a) && Array.isArray(b)) return a.length === b.length && a.every((entry, i) => same(entry, b[i]));
  if (!isRecord(a) || !isRecord(b)) return false;
  const keys = Object.keys(a);
  return keys.length === Object.keys(b).length && keys.every((key) => key in b && same(a[key], b[key]));
}

const SINGULAR: Readonly<Record<string, string>> = {
  levels: 'level',
  diaphragms: 'diaphragm',
  openings: 'opening',
  zones: 'zone',
  lines: 'weight line',
  wallLines: 'wall line',
  storeys: 'storey under',
  piers: 'pier',
  collectors: 'collector at',
  gravity: 'gravity load',
  walls: 'wall assembly',
  holdDowns: 'hold-down assembly',
  loadCases: 'load case',
  bases: 'basis',
  transferMembers: 'transfer member',
  forces: 'force on',
  combinations: 'combination',
};

function singular(list: string): string {
  return SINGULAR[list] ?? list;
}

function shown(value: Json): string {
  if (typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean') return String(value);
  if (!Array.isArray(value)) return 'an entry';
  if (value.length <= 4 && value.every((entry) => typeof entry === 'number')) return `[${value.join(', ')}]`;
  const points = value.filter(
    (entry) => Array.isArray(entry) && entry.length === 2 && entry.every((part) => typeof part === 'number'),
  );
  if (points.length < value.length || points.length === 0) return `a list of ${value.length}`;
  const range = (axis: 0 | 1): string => {
    const along = (points as [number, number][]).map((point) => point[axis]);
    return `${Math.min(...along)} to ${Math.max(...along)}`;
  };
  return `x ${range(0)}, y ${range(1)}${points.length === 4 ? '' : ` (${points.length} points)`}`;
}

function unitText(value: Json, key: string, { units }: Found): string {
  if (typeof value !== 'number' || units === undefined) return '';
  const unit = unitOfKey(key, units);
  return unit === '' ? '' : ` ${unit}`;
}
