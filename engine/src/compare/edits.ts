/** The edits between two building files: what was added, removed or set, matched by id, as RFC 6902 patches. */
import { applyPatch, type Operation } from 'rfc6902';
import type { Building, Units } from '../building/definition.js';
import { unitOfKey } from './key-units.js';
import type { Edit } from './result.js';

type Json = unknown;

/** Edits so far; units where they are the same before and after. */
type Steps = {
  readonly list: { what: string; operation: Operation }[];
  readonly units: Units | undefined;
};

/**
 * @returns edits whose patches, applied in order to the earlier file, give the later one
 */
export function editsBetween(before: Building, after: Building): Edit[] {
  const steps: Steps = { list: [], units: same(before.units, after.units) ? after.units : undefined };
  // Each operation's path holds for the document as the operations before it left it.
  walk(structuredClone(before), after, '', [], steps);
  return steps.list.map(({ what, operation }, i) => ({ id: `e${i + 1}`, what, patch: [operation] }));
}

function walk(before: Json, after: Json, pointer: string, names: readonly string[], steps: Steps): void {
  if (same(before, after)) return;
  if (isRecord(before) && isRecord(after)) {
    for (const key of Object.keys(before)) {
      if (key in after) continue;
      steps.list.push({
        what: `${label([...names, key])} removed`,
        operation: { op: 'remove', path: `${pointer}/${escape(key)}` },
      });
    }
    for (const [key, value] of Object.entries(after)) {
      const path = `${pointer}/${escape(key)}`;
      if (!(key in before)) {
        steps.list.push({
          what: `${label([...names, key])} set to ${shown(value)}${unitText(value, key, steps)}`,
          operation: { op: 'add', path, value },
        });
      } else walk(before[key], value, path, [...names, key], steps);
    }
    return;
  }
  const beforeList = identified(before);
  const afterList = identified(after);
  if (beforeList !== undefined && afterList !== undefined) {
    walkList(beforeList, afterList, pointer, names, steps);
    return;
  }
  steps.list.push({
    what: `${label(names)}: ${shown(before)} → ${shown(after)}${unitText(after, names[names.length - 1] ?? '', steps)}`,
    operation: { op: 'replace', path: pointer, value: after },
  });
}

type Identified = { readonly id: string; readonly value: Json }[];

/** Lists of members: removed from the end, added in place, moved into order, then each compared with itself. */
function walkList(
  before: Identified,
  after: Identified,
  pointer: string,
  names: readonly string[],
  steps: Steps,
): void {
  const kept = new Set(after.map((entry) => entry.id));
  const current = [...before];
  const one = singular(names[names.length - 1] ?? '');
  const owner = names.slice(0, -1);
  for (let i = current.length - 1; i >= 0; i--) {
    const entry = current[i] as Identified[number];
    if (kept.has(entry.id)) continue;
    steps.list.push({
      what: `${label([...owner, `${one} ${entry.id}`])} removed`,
      operation: { op: 'remove', path: `${pointer}/${i}` },
    });
    current.splice(i, 1);
  }
  after.forEach((entry, i) => {
    const at = current.findIndex((candidate) => candidate.id === entry.id);
    if (at < 0) {
      steps.list.push({
        what: `${label([...owner, `${one} ${entry.id}`])} added`,
        operation: { op: 'add', path: `${pointer}/${i}`, value: entry.value },
      });
      current.splice(i, 0, entry);
    } else if (at !== i) {
      steps.list.push({
        what: `${label([...owner, `${one} ${entry.id}`])} at another place of the list`,
        operation: { op: 'move', from: `${pointer}/${at}`, path: `${pointer}/${i}` },
      });
      current.splice(i, 0, ...current.splice(at, 1));
    }
  });
  after.forEach((entry, i) => {
    const known = current[i] as Identified[number];
    walk(known.value, entry.value, `${pointer}/${i}`, [...owner, `${one} ${entry.id}`], steps);
  });
}

/** A list whose entries all have an identity of their own; storeys, forces and collectors are known by their level. */
function identified(value: Json): Identified | undefined {
  if (!Array.isArray(value)) return undefined;
  const out: { id: string; value: Json }[] = [];
  const seen = new Set<string>();
  for (const entry of value as Json[]) {
    if (!isRecord(entry)) return undefined;
    const id = entry['id'] ?? entry['under'] ?? entry['level'] ?? entry['case'];
    if (typeof id !== 'string' || seen.has(id)) return undefined;
    seen.add(id);
    out.push({ id, value: entry });
  }
  return out;
}

function isRecord(value: Json): value is Record<string, Json> {
  return value !== null && typeof value === 'object' && !Array.isArray(value);
}

function same(a: Json, b: Json): boolean {
  if (a === b) return true;
  if (Array.isArray(a) && Array.isArray(b)) return a.length === b.length && a.every((entry, i) => same(entry, b[i]));
  if (!isRecord(a) || !isRecord(b)) return false;
  const keys = Object.keys(a);
  return keys.length === Object.keys(b).length && keys.every((key) => key in b && same(a[key], b[key]));
}

function escape(key: string): string {
  return key.replaceAll('~', '~0').replaceAll('/', '~1');
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
  forces: 'force on',
  combinations: 'combination',
};

function singular(list: string): string {
  return SINGULAR[list] ?? list;
}

function label(names: readonly string[]): string {
  return names.join(', ');
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

function unitText(value: Json, key: string, { units }: Steps): string {
  if (typeof value !== 'number' || units === undefined) return '';
  const unit = unitOfKey(key, units);
  return unit === '' ? '' : ` ${unit}`;
}

/** Applies edits to a building file; used to check that they tell the whole difference. */
export function applyEdits(before: Building, edits: readonly Edit[]): unknown {
  const document = structuredClone(before) as Json;
  for (const edit of edits) {
    for (const error of applyPatch(document, [...edit.patch])) if (error !== null) throw error;
  }
  return document;
}
