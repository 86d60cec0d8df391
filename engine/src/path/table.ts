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

/** One row; `-0` and rounding's sign of zero do not show. */
export function addRow(table: Table, row: Row, sense: Sense, combination?: string): void {
  const { member, kind, quantity, unit, at } = row;
  const value = row.value === 0 ? 0 : row.value;
  const demand: Demand = { member, kind, quantity, case: row.case, sense, value, unit };
  if (combination !== undefined) demand.combination = combination;
  if (at !== undefined) demand.at = at;
  table.rows.push(demand);
}

/** A demand that is the same in both senses. */
export function addBoth(table: Table, row: Row): void {
  addRow(table, row, 1);
  addRow(table, row, -1);
}
