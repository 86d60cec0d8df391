/** Why the demands changed: the share of each edit in each change. */
import type { Building } from '../building/definition.js';
import { readBuilding } from '../building/read.js';
import { analyse } from '../path/analyse.js';
import type { Analysis } from '../path/result.js';
import { compare, keyOf, underSameIds, type Compared, type Tolerance } from './compare.js';
import { changesNothing, editGroups } from './edit-groups.js';
import { editsOf, renamingEdits } from './edits.js';
import { makeEdit } from './make-edit.js';
import { memberEdits, type MemberEdit } from './member-edits.js';
import type { Cause, Comparison } from './result.js';
import { bySize, EXACT_UP_TO, shapley } from './shapley.js';

type Group = readonly MemberEdit[];

/** A share below this part of all shares together is rounding. */
const ROUNDING = 1e-12;

/**
 * A comparison with causes. Every set of edits makes a building of its own, which is analysed; edits that do not make a valid building
 * without each other become one.
 *
 * @param pairs antithetic pairs of orders drawn beyond ten edits
 * @returns the comparison whose shares add up to `after − before`, null counted as 0
 */
export function compareWithCauses(
  earlierIds: Compared,
  after: Compared,
  options: { readonly tolerance?: Tolerance; readonly pairs?: number } = {},
): Comparison {
  const { before, matches } = underSameIds(earlierIds, after.building);
  const plain = compare(before, after, options.tolerance);
  const changed = plain.changes.filter((change) => change.class !== 'unchanged');
  const rowOf = new Map(changed.map((change, row) => [keyOf(change), row]));
  const known = new Map<string, Float64Array | null>();
  const edits = memberEdits(before.building, after.building);
  const idle = edits.filter(changesNothing);
  const between = hybrids(before, after, edits, idle, rowOf, known);
  let groups: readonly Group[] = editGroups(edits.filter((edit) => !changesNothing(edit)));
  for (;;) {
    const stuck = firstInvalid(groups, between);
    if (stuck !== undefined) {
      groups = merged(groups, stuck, between);
      continue;
    }
    try {
      const { shares, errors, method } = shapley(
        groups.length,
        changed.length,
        (set) => {
          const values = between(chosen(groups, set));
          if (values === null) throw new Invalid(set);
          return values;
        },
        options.pairs,
      );
      const listed = [...groups, ...idle.map((edit) => [edit])];
      const causes = (row: number): Cause[] => {
        const whole = shares.reduce((sum, share) => sum + Math.abs(share[row] as number), 0);
        return shares.flatMap((share, g) => {
          const value = share[row] as number;
          const error = errors?.[g]?.[row];
          if (Math.abs(value) <= ROUNDING * whole && (error ?? 0) <= ROUNDING * whole) return [];
          return [{ edit: `e${g + 1}`, share: value, ...(error === undefined ? {} : { error }) }];
        });
      };
      return {
        ...plain,
        edits: [...renamingEdits(earlierIds.building, before.building), ...editsOf(before.building, listed)],
        method,
        ...(matches.length === 0 ? {} : { matches }),
        changes: plain.changes.map((change) => {
          const row = rowOf.get(keyOf(change));
          return row === undefined ? change : { ...change, causes: causes(row) };
        }),
      };
    } catch (error) {
      if (!(error instanceof Invalid)) throw error;
      groups = merged(groups, error.set, between);
    }
  }
}

class Invalid extends Error {
  readonly set: bigint;
  constructor(set: bigint) {
    super('edits that make no valid building');
    this.set = set;
  }
}

/** Values of the changed demands of a building between the two; null where it is no valid building. */
type Between = (groups: readonly Group[]) => Float64Array | null;

function hybrids(
  before: Compared,
  after: Compared,
  edits: readonly MemberEdit[],
  idle: readonly MemberEdit[],
  rowOf: ReadonlyMap<string, number>,
  known: Map<string, Float64Array | null>,
): Between {
  const position = new Map(edits.map((edit, i) => [edit, i]));
  const active = edits.length - idle.length;
  const valuesOf = (analysis: Analysis): Float64Array => {
    const values = new Float64Array(rowOf.size);
    for (const demand of analysis.demands) {
      const row = rowOf.get(keyOf(demand));
      if (row !== undefined) values[row] = demand.value;
    }
    return values;
  };
  return (groups) => {
    const made = groups.flat().sort((a, b) => (position.get(a) ?? 0) - (position.get(b) ?? 0));
    if (made.length === 0) return cached(known, '', () => valuesOf(before.analysis));
    if (made.length === active) return cached(known, 'all', () => valuesOf(after.analysis));
    return cached(known, made.map((edit) => position.get(edit)).join(' '), () => {
      const document: Building = structuredClone(before.building);
      for (const edit of made) makeEdit(document, edit);
      const read = readBuilding(document);
      if (!read.ok) return null;
      const analysis = analyse(read.value);
      return analysis.ok ? valuesOf(analysis.value) : null;
    });
  };
}

function cached<T>(known: Map<string, T>, key: string, make: () => T): T {
  const found = known.get(key);
  if (found !== undefined) return found;
  const value = make();
  known.set(key, value);
  return value;
}

function chosen(groups: readonly Group[], set: bigint): Group[] {
  return groups.filter((_, i) => ((set >> BigInt(i)) & 1n) === 1n);
}

/** The smallest set that makes no valid building: looked for among single edits, all but one, and all sets where there are few. */
function firstInvalid(groups: readonly Group[], between: Between): bigint | undefined {
  const all = (1n << BigInt(groups.length)) - 1n;
  const singles = groups.map((_, i) => 1n << BigInt(i));
  const sets =
    groups.length <= EXACT_UP_TO ? bySize(groups.length) : [...singles, ...singles.map((single) => all & ~single)];
  return sets.find((set) => between(chosen(groups, set)) === null);
}

/** One group fewer: a member of the set that is too much joins the one outside whose coming makes the set valid. */
function merged(groups: readonly Group[], set: bigint, between: Between): Group[] {
  const inside = groups.map((_, i) => i).filter((i) => ((set >> BigInt(i)) & 1n) === 1n);
  const outside = groups.map((_, i) => i).filter((i) => !inside.includes(i));
  const without = (i: number) => set & ~(1n << BigInt(i));
  const [someInside = 0] = inside;
  const [someOutside = 0] = outside;
  const toBlame = inside.find((i) => between(chosen(groups, without(i))) !== null) ?? someInside;
  const helper = outside.find((i) => between(chosen(groups, set | (1n << BigInt(i)))) !== null) ?? someOutside;
  const [first, second] = [Math.min(toBlame, helper), Math.max(toBlame, helper)];
  return groups.flatMap((group, i) => {
    if (i === second) return [];
    return [i === first ? [...group, ...(groups[second] as Group)] : group];
  });
}
