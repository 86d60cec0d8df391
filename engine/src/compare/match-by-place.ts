/**
 * Members whose ids changed, known again by their place: a building that was imported anew has other ids, and is the same building.
 */
import type { Building, Level, Pier, WallLine } from '../building/definition.js';
import { commonArea } from '../geometry/common-area.js';
import { isRecord, type Json } from './member-edits.js';

/** A member of the earlier building under the id that it has in the later one. */
export type Match = {
  readonly kind: 'level' | 'diaphragm' | 'wall-line' | 'pier' | 'load-case';
  readonly before: string;
  readonly after: string;
};

/** Two places of one axis are the same line within this part of its length; two intervals the same pier when they share this part. */
const ASIDE = 0.02;
const SHARED = 0.5;

/**
 * Looks for members whose id the later building does not have, among those whose id the earlier one does not have: levels by elevation,
 * diaphragms by the area in common, wall lines by axis and direction, piers by the length in common, load cases by kind and direction.
 *
 * @returns the earlier building under the ids of the later one, and what was matched; the building itself where nothing was
 */
export function matchByPlace(before: Building, after: Building): { building: Building; matches: readonly Match[] } {
  const matches: Match[] = [];
  const building = structuredClone(before);
  matchLevels(building, after, matches);
  matchLines(building, after, matches);
  matchCases(building, after, matches);
  return matches.length === 0 ? { building: before, matches } : { building, matches };
}

function matchLevels(building: Building, after: Building, matches: Match[]): void {
  const elevations = building.levels.map(({ elevation }) => elevation).sort((a, b) => a - b);
  const gaps = elevations.slice(1).map((elevation, i) => elevation - (elevations[i] as number));
  const nearest = Math.min(...gaps) / 4;
  for (const [level, known] of pairs(building.levels, after.levels, (a, b) => {
    const away = Math.abs(a.elevation - b.elevation);
    return away <= nearest ? 1 - away / nearest / 2 : 0;
  })) {
    matches.push({ kind: 'level', before: level.id, after: known.id });
    renameLevel(building, level.id, known.id);
  }
  for (const level of building.levels) {
    const known = after.levels.find(({ id }) => id === level.id);
    if (known !== undefined) matchDiaphragms(level, known, matches);
  }
}

function matchDiaphragms(level: Level, known: Level, matches: Match[]): void {
  for (const [diaphragm, other] of pairs(level.diaphragms ?? [], known.diaphragms ?? [], (a, b) => {
    const common = commonArea(a, b);
    const share = common / Math.max(commonArea(a, a), commonArea(b, b));
    return share > SHARED ? share : 0;
  })) {
    matches.push({ kind: 'diaphragm', before: `${level.id}/${diaphragm.id}`, after: `${level.id}/${other.id}` });
    diaphragm.id = other.id;
  }
}

function matchLines(building: Building, after: Building, matches: Match[]): void {
  for (const [line, known] of pairs(building.wallLines, after.wallLines, likeness)) {
    matches.push({ kind: 'wall-line', before: line.id, after: known.id });
    line.id = known.id;
  }
  for (const line of building.wallLines) {
    const known = after.wallLines.find(({ id }) => id === line.id);
    // On a line that moved, no pier has its place any more.
    if (known === undefined || likeness(line, known) === 0) continue;
    for (const storey of line.storeys) {
      const other = known.storeys.find(({ under }) => under === storey.under);
      if (other === undefined) continue;
      const shift = along(known, line.axis[0]);
      for (const [pier, same] of pairs(storey.piers, other.piers, (a, b) => shared(a, b, shift))) {
        const key = `${line.id}/${storey.under}`;
        matches.push({ kind: 'pier', before: `${key}/${pier.id}`, after: `${key}/${same.id}` });
        pier.id = same.id;
      }
    }
  }
}

/** 1 for the same axis in the same direction; 0 for another line. */
function likeness(a: WallLine, b: WallLine): number {
  const [u, v] = [directionOf(a), directionOf(b)];
  if (u.x * v.x + u.y * v.y < 0.9998) return 0;
  const reach = ASIDE * Math.max(u.length, v.length);
  const [start] = a.axis;
  const [from] = b.axis;
  const aside = Math.abs((start[0] - from[0]) * v.y - (start[1] - from[1]) * v.x);
  if (aside > reach) return 0;
  const first = along(b, start);
  const common = Math.min(first + u.length, v.length) - Math.max(first, 0);
  const share = common / Math.max(u.length, v.length);
  return share > SHARED ? share * (1 - aside / reach / 2) : 0;
}

/** Part of the longer pier that two have in common, on the later line’s axis. */
function shared(a: Pier, b: Pier, shift: number): number {
  const common = Math.min(a.to + shift, b.to) - Math.max(a.from + shift, b.from);
  const share = common / Math.max(a.to - a.from, b.to - b.from);
  return share > SHARED ? share : 0;
}

function directionOf({ axis: [a, b] }: WallLine): { x: number; y: number; length: number } {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  return { x: (b[0] - a[0]) / length, y: (b[1] - a[1]) / length, length };
}

/** Distance along a line’s axis of a point. */
function along(line: WallLine, [x, y]: readonly [number, number]): number {
  const { x: ux, y: uy } = directionOf(line);
  const [from] = line.axis;
  return (x - from[0]) * ux + (y - from[1]) * uy;
}

function matchCases(building: Building, after: Building, matches: Match[]): void {
  for (const [loadCase, known] of pairs(building.loadCases, after.loadCases, (a, b) => {
    if (a.kind !== b.kind || a.from !== b.from) return 0;
    const [first, second] = [a, b].map((each) => ('direction' in each ? each.direction : undefined));
    return first !== undefined && first === second ? 1 : 0;
  })) {
    matches.push({ kind: 'load-case', before: loadCase.id, after: known.id });
    loadCase.id = known.id;
  }
}

/** Pairs of what is new on either side, the likest first; each once. */
function pairs<T extends { readonly id: string }>(
  before: readonly T[],
  after: readonly T[],
  like: (a: T, b: T) => number,
): [T, T][] {
  const [old, now] = [new Set(before.map(({ id }) => id)), new Set(after.map(({ id }) => id))];
  const gone = before.filter(({ id }) => !now.has(id));
  const come = after.filter(({ id }) => !old.has(id));
  const found = gone
    .flatMap((a) => come.map((b) => ({ a, b, score: like(a, b) })))
    .filter(({ score }) => score > 0)
    .sort((x, y) => y.score - x.score);
  const taken = new Set<T>();
  return found.flatMap(({ a, b }): [T, T][] => {
    if (taken.has(a) || taken.has(b)) return [];
    taken.add(a).add(b);
    return [[a, b]];
  });
}

/** A level is named by its own id, and by `under` and `level` wherever else the file means it. */
function renameLevel(building: Building, before: string, after: string): void {
  for (const level of building.levels) if (level.id === before) level.id = after;
  const visit = (value: Json): void => {
    if (Array.isArray(value)) for (const entry of value as Json[]) visit(entry);
    if (!isRecord(value)) return;
    for (const [key, part] of Object.entries(value)) {
      if ((key === 'under' || key === 'level') && part === before) value[key] = after;
      else visit(part);
    }
  };
  visit(building);
}
