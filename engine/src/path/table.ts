/** The demand table while it is filled. */
import type { Building, Point } from '../building/definition.js';
import type { Demand, DemandKind, Quantity, Sense } from './result.js';

export type UnitNames = {
  readonly none: string;
  readonly length: string;
  readonly force: string;
  readonly perLength: string;
  readonly moment: string;
};

export function unitNames(building: Building): UnitNames {
  const { length, force } = building.units;
  return { none: '1', length, force, perLength: `${force}/${length}`, moment: `${force}·${length}` };
}

export type Table = { readonly rows: Demand[]; readonly units: UnitNames };

export type Row = {
  readonly member: string;
  readonly kind: DemandKind;
  readonly quantity: Quantity;
  readonly case: string;
  readonly value: number;
  readonly unit: string;
  readonly at?: Point | undefined;
};

/** One row; `-0` does not show. */
export function addRow(table: Table, row: Row, sense: Sense, combination?: string): void {
  const { member, kind, quantity, unit, at } = row;
  put(table, member, kind, quantity, row.case, sense, row.value, unit, at, combination);
}

/** One row that names the rule which governed it. */
export function addGoverned(table: Table, row: Row, sense: Sense, governs: string): void {
  const { member, kind, quantity, unit, at, value } = row;
  const head = { member, kind, quantity, case: row.case, sense, value: value === 0 ? 0 : value, unit };
  table.rows.push(at === undefined ? { ...head, governs } : { ...head, at, governs });
}

/** One row from its columns: the way for rows by the ten thousand, without a record in between. */
export function put(
  table: Table,
  member: string,
  kind: DemandKind,
  quantity: Quantity,
  caseId: string,
  sense: Sense,
  size: number,
  unit: string,
  at: Point | undefined,
  combination: string | undefined,
): void {
  const value = size === 0 ? 0 : size;
  // One literal for each set of columns, so that rows of a kind share their shape in memory.
  if (combination === undefined) {
    table.rows.push(
      at === undefined
        ? { member, kind, quantity, case: caseId, sense, value, unit }
        : { member, kind, quantity, case: caseId, sense, value, unit, at },
    );
  } else {
    table.rows.push(
      at === undefined
        ? { member, kind, quantity, case: caseId, sense, value, unit, combination }
        : { member, kind, quantity, case: caseId, sense, value, unit, combination, at },
    );
  }
}

/** A demand that is the same in both senses. */
export function addBoth(table: Table, row: Row): void {
  addRow(table, row, 1);
  addRow(table, row, -1);
}
