/** The reader: from text or parsed JSON to a building, or every fault at once. */
import { meetingFaults } from '../path/meeting-faults.js';
import { Basis, Building, Combinations, Assemblies, Level, LoadCase, WallLine } from './definition.js';
import type { Fault, Result } from './fault.js';
import { levelFaults } from './plan-faults.js';
import { referenceFaults, type Parts } from './reference-faults.js';
import { shapeFaults } from './shape-faults.js';
import { wallLineFaults } from './wall-faults.js';

/** Characters that a building file may have at the most. */
export const LARGEST_FILE = 20_000_000;

/** Faults that are listed at the most; a last one says how many more there are. */
const MOST_FAULTS = 500;

/** @param text a building file as it was written */
export function readBuildingText(text: string): Result<Building> {
  if (text.length > LARGEST_FILE) {
    return fault('too-large', `${text.length} characters`, `at most ${LARGEST_FILE} characters`);
  }
  if (text.trim() === '') return fault('empty', 'an empty file', 'a building file');
  let input: unknown;
  try {
    input = JSON.parse(text.charCodeAt(0) === 0xfeff ? text.slice(1) : text);
  } catch (error) {
    return fault('not-json', `text that is not JSON${placeOf(error, text)}`, 'a building file in JSON');
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
  const whole = Building.safeParse(input, { reportInput: true });
  const faults: Fault[] = whole.success ? [] : shapeFaults(whole.error);
  const parts = partsOf(whole.success ? whole.data : input);
  parts.levels.forEach((level, l) => level !== undefined && faults.push(...levelFaults(level, `levels[${l}]`)));
  parts.wallLines.forEach((line, l) => line !== undefined && faults.push(...wallLineFaults(line, `wallLines[${l}]`)));
  faults.push(...referenceFaults(parts));
  if (whole.success && faults.length === 0) faults.push(...meetingFaults(whole.data));
  if (whole.success && faults.length === 0) return { ok: true, value: whole.data };
  return { ok: false, faults: capped(faults) };
}

/** What can be read of a file, whatever the rest is like. */
function partsOf(input: object): Parts {
  const record = input as Record<string, unknown>;
  const list = <T>(value: unknown, read: (entry: unknown) => T | undefined): (T | undefined)[] =>
    Array.isArray(value) ? value.map(read) : [];
  const levels = list(record['levels'], (entry) => Level.safeParse(entry).data);
  return {
    levels,
    wallLines: list(record['wallLines'], (entry) => WallLine.safeParse(entry).data),
    loadCases: list(record['loadCases'], (entry) => LoadCase.safeParse(entry).data),
    assemblies: Assemblies.safeParse(record['assemblies']).data,
    basis: Basis.safeParse(record['basis']).data,
    combinations: Combinations.safeParse(record['combinations']).data,
    levelsComplete: levels.length > 0 && levels.every((level) => level !== undefined),
  };
}

function fault(code: string, found: string, expected: string): Result<never> {
  return { ok: false, faults: [{ code, path: '', found, expected }] };
}

function capped(faults: readonly Fault[]): readonly Fault[] {
  if (faults.length <= MOST_FAULTS) return faults;
  return [
    ...faults.slice(0, MOST_FAULTS),
    { code: 'more-faults', path: '', found: `${faults.length - MOST_FAULTS} more faults`, expected: 'none' },
  ];
}

/** Line and column where the parser says at which character it stopped. */
function placeOf(error: unknown, text: string): string {
  const message = error instanceof Error ? error.message : String(error);
  const position = /at position (\d+)/.exec(message)?.[1];
  if (position === undefined) return ` (${message.slice(0, 120)})`;
  const before = text.slice(0, Number(position)).split('\n');
  return `: line ${before.length}, column ${(before[before.length - 1] ?? '').length + 1}`;
}
