/** What changed between two buildings: every demand before and after, and the edits that lie between. */
import type { Building } from '../building/definition.js';
import type { Analysis, Demand } from '../path/result.js';
import { analyse } from '../path/analyse.js';
import { editsBetween, renamingEdits } from './edits.js';
import { matchByPlace, type Match } from './match-by-place.js';
import type { Change, ChangeClass, Comparison } from './result.js';

export type Compared = { readonly building: Building; readonly analysis: Analysis };

/** Values that differ by less are unchanged. */
export type Tolerance = { readonly relative: number; readonly absolute: number };

const DEFAULT: Tolerance = { relative: 1e-3, absolute: 1e-9 };

/**
 * @param tolerance default: 0.1 % of the larger value, or 1e-9 of the unit
 * @returns changes in the order of the later analysis, then what is gone in the order of the earlier one
 */
export function compare(earlierIds: Compared, after: Compared, tolerance: Tolerance = DEFAULT): Comparison {
  const { before, matches } = underSameIds(earlierIds, after.building);
  const earlier = new Map(before.analysis.demands.map((row) => [keyOf(row), row]));
  const changes: Change[] = [];
  for (const row of after.analysis.demands) {
    const key = keyOf(row);
    const known = earlier.get(key);
    earlier.delete(key);
    changes.push(changeOf(known, row, tolerance));
  }
  for (const row of earlier.values()) changes.push(changeOf(row, undefined, tolerance));
  return {
    schema: 'groundward.comparison/1',
    edits: [...renamingEdits(earlierIds.building, before.building), ...editsBetween(before.building, after.building)],
    ...(matches.length === 0 ? {} : { matches }),
    changes,
  };
}

/**
 * The earlier building under the later one’s ids, where members are known again by their place. No force depends on an id: its analysis
 * is the same but for the names.
 */
export function underSameIds(
  before: Compared,
  after: Building,
): { readonly before: Compared; readonly matches: readonly Match[] } {
  const { building, matches } = matchByPlace(before.building, after);
  if (matches.length === 0) return { before, matches };
  const analysis = analyse(building);
  // Another id can make no fault; if it did, the ids that were stay.
  return analysis.ok ? { before: { building, analysis: analysis.value }, matches } : { before, matches: [] };
}

/** What makes two rows the same demand. */
export function keyOf(
  row: Pick<Demand, 'kind' | 'member' | 'quantity' | 'case' | 'sense'> & { readonly combination?: string | undefined },
): string {
  return JSON.stringify([row.kind, row.member, row.quantity, row.case, row.sense, row.combination ?? null]);
}

function changeOf(before: Demand | undefined, after: Demand | undefined, tolerance: Tolerance): Change {
  const row = (after ?? before) as Demand;
  return {
    member: row.member,
    kind: row.kind,
    quantity: row.quantity,
    case: row.case,
    sense: row.sense,
    ...(row.combination === undefined ? {} : { combination: row.combination }),
    before: before?.value ?? null,
    after: after?.value ?? null,
    unit: row.unit,
    class: classOf(before, after, tolerance),
    causes: [],
  };
}

function classOf(before: Demand | undefined, after: Demand | undefined, tolerance: Tolerance): ChangeClass {
  if (before === undefined) return 'added';
  if (after === undefined) return 'removed';
  const size = Math.max(Math.abs(before.value), Math.abs(after.value));
  const change = Math.abs(after.value) - Math.abs(before.value);
  // A force that turns round without growing has changed all the same.
  const difference = Math.abs(after.value - before.value);
  if (difference > Math.max(tolerance.absolute, tolerance.relative * size)) return change >= 0 ? 'raised' : 'lowered';
  const [x0, y0] = before.at ?? [0, 0];
  const [x1, y1] = after.at ?? [0, 0];
  const away = Math.hypot(x1 - x0, y1 - y0);
  return away > 1e-6 * Math.max(1, Math.hypot(x0, y0), Math.hypot(x1, y1)) && size > tolerance.absolute
    ? 'moved'
    : 'unchanged';
}
