/** The reader: from text or parsed JSON to a building, or every fault at once. */
import { meetingFaults } from '../path/meeting-faults.js';
import { Basis, NamedBasis } from './basis.js';
import { Combinations } from './combination.js';
import { Assemblies } from './assemblies.js';
import { Building, Level, Units, WallLine } from './definition.js';
import { LoadCase } from './load-cases.js';
import type { Fault, Result } from './fault.js';
import { jsonBreak } from './json-place.js';
import { levelFaults } from './plan-faults.js';
import { sizeFaults } from './plan-size.js';
import { referenceFaults, type Parts } from './reference-faults.js';
import { shapeFaults } from './shape-faults.js';
import { wallLineFaults } from './wall-faults.js';

/** Characters that a building file may have at the most. */
export const LARGEST_FILE = 20_000_000;

/** Numbers, texts, lists and objects that a building file may have at the most. */
export const MOST_VALUES = 500_000;

/** Faults that are listed at the most; a last one says how many more there are. */
const MOST_FAULTS = 500;

/** @param text a building file as it was written */
export function readBuildingText(text: string): Result<Building> {
  if (text.length > LARGEST_FILE) {
    return fault('too-large', `${text.length} characters`, `at most ${LARGEST_FILE} characters`);
  }
  if (text.trim() === '') return fault('empty', 'an empty file', 'a building file');
  const json = text.startsWith('\ufeff') ? text.slice(1) : text;
  let input: unknown;
  try {
    input = JSON.parse(json);
  } catch {
    return fault('not-json', `text that is not JSON, ${placeOfBreak(json)}`, 'a building file in JSON');
  }
  return readBuilding(input);
}

/** @param input parsed JSON */
export function readBuilding(input: unknown): Result<Building> {
  if (input === null || typeof input !== 'object' || Array.isArray(input)) {
    return fault(
      'wrong-type',
      Array.isArray(input) ? 'a list' : input === null ? 'null' : `a ${typeof input}`,
      'a building file: an object',
    );
  }
  if (valuesIn(input, MOST_VALUES) > MOST_VALUES) {
    return fault('too-large', `more than ${MOST_VALUES} values`, `at most ${MOST_VALUES} values`);
  }
  const whole = Building.safeParse(input, { reportInput: true });
  const faults: Fault[] = whole.success ? [] : shapeFaults(whole.error, MOST_FAULTS);
  const parts: Parts = whole.success ? { ...whole.data, levelsComplete: true } : partsOf(input);
  const ofShape = faults.length;
  parts.levels.forEach((level, l) => {
    if (level !== undefined && faults.length <= MOST_FAULTS) faults.push(...levelFaults(level, `levels[${l}]`));
  });
  parts.wallLines.forEach((line, l) => line !== undefined && faults.push(...wallLineFaults(line, `wallLines[${l}]`)));
  const between = referenceFaults(parts);
  const sound = faults.length === ofShape && between.every((each) => ASIDE.has(each.code));
  faults.push(...between);
  const plan = whole.success ? whole.data : planOf(parts, input);
  if (sound && plan !== undefined) {
    const size = sizeFaults(plan);
    faults.push(...(size.length > 0 ? size : meetingFaults(plan)));
  }
  if (whole.success && faults.length === 0) return { ok: true, value: whole.data };
  return { ok: false, faults: capped(faults) };
}

/** Faults that do not touch where walls and floors stand: whether they meet can be judged all the same. */
const ASIDE = new Set([
  'unknown-assembly',
  'unknown-basis',
  'no-basis',
  'basis-not-named',
  'not-with-wind',
  'unknown-part',
  'part-twice',
  'two-lateral-loads',
  'reserved-id',
]);

/** What can be read of a file, whatever the rest is like. */
function partsOf(input: object): Parts {
  const record = input as Record<string, unknown>;
  const list = <T>(value: unknown, most: number, read: (entry: unknown) => T | undefined): (T | undefined)[] =>
    Array.isArray(value) ? value.slice(0, most).map(read) : [];
  const levels = list(record['levels'], 500, (entry) => Level.safeParse(entry).data);
  return {
    levels,
    wallLines: list(record['wallLines'], 2000, (entry) => WallLine.safeParse(entry).data),
    loadCases: list(record['loadCases'], 64, (entry) => LoadCase.safeParse(entry).data),
    assemblies: Assemblies.safeParse(record['assemblies']).data,
    basis: Basis.safeParse(record['basis']).data,
    bases: list(record['bases'], 20, (entry) => NamedBasis.safeParse(entry).data),
    combinations: Combinations.safeParse(record['combinations']).data,
    levelsComplete: levels.length > 0 && levels.every((level) => level !== undefined),
  };
}

/** What stands on plan, where levels, wall lines and load cases can all be read though something else cannot. */
function planOf({ levels, wallLines, loadCases }: Parts, input: object): Building | undefined {
  const units = Units.safeParse((input as Record<string, unknown>)['units']).data;
  if (units === undefined || levels.length < 2 || loadCases.length === 0) return undefined;
  if (!levels.every(isRead) || !wallLines.every(isRead) || !loadCases.every(isRead)) return undefined;
  return {
    schema: 'groundward.building/1',
    name: '',
    units,
    levels: [...levels],
    wallLines: [...wallLines],
    loadCases: [...loadCases],
  };
}

function isRead<T>(part: T | undefined): part is T {
  return part !== undefined;
}

function fault(code: string, found: string, expected: string): Result<never> {
  return { ok: false, faults: [{ code, path: '', found, expected }] };
}

function capped(faults: readonly Fault[]): readonly Fault[] {
  if (faults.length <= MOST_FAULTS) return faults;
  return [
    ...faults.slice(0, MOST_FAULTS),
    { code: 'more-faults', path: '', found: `at least ${faults.length - MOST_FAULTS} more faults`, expected: 'none' },
  ];
}

/** How many values a document has; counting ends once there are more than `most`. */
function valuesIn(input: object, most: number): number {
  const waiting: object[] = [input];
  let count = 1;
  for (let value = waiting.pop(); value !== undefined && count <= most; value = waiting.pop()) {
    const entries: readonly unknown[] = Array.isArray(value) ? value : Object.values(value);
    count += entries.length;
    if (count > most) break;
    for (const entry of entries) if (entry !== null && typeof entry === 'object') waiting.push(entry);
  }
  return count;
}

function placeOfBreak(text: string): string {
  const at = jsonBreak(text);
  const before = text.slice(0, at);
  const line = before.split('\n').length;
  const column = at - before.lastIndexOf('\n');
  const next = at < text.length ? JSON.stringify(String.fromCodePoint(text.codePointAt(at) as number)) : 'its end';
  return `${next} at line ${line}, column ${column}`;
}
