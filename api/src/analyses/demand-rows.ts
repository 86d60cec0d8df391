/** The demand table's rows, as the database keeps them. */
import type { Demand } from '@groundward/engine/path/result';
import type pg from 'pg';
import type { Demand as StoredRow } from '../generated/client.js';

export type DemandRow = StoredRow;

/** What of a row is a demand; the rest says where it belongs. */
type DemandColumns = Omit<DemandRow, 'revisionId' | 'projectId' | 'position' | 'level'>;

/** All demands of a revision, in the order in which the analysis gave them: tens of thousands, so without a detour. */
export async function readDemands(pool: pg.Pool, revisionId: string): Promise<Demand[]> {
  const { rows } = await pool.query<DemandColumns>(
    `SELECT "member", "kind", "quantity", "case", "sense", "combination", "value", "unit", "at_x" AS "atX", "at_y" AS "atY", "governs"
     FROM "demand" WHERE "revision_id" = $1 ORDER BY "position"`,
    [revisionId],
  );
  return rows.map(demandOf);
}

export function demandOf(row: DemandColumns): Demand {
  const demand = {
    member: row.member,
    kind: row.kind,
    quantity: row.quantity,
    case: row.case,
    sense: row.sense,
    value: row.value,
    unit: row.unit,
    ...(row.combination === null ? {} : { combination: row.combination }),
    ...(row.atX === null || row.atY === null ? {} : { at: [row.atX, row.atY] }),
    ...(row.governs === null ? {} : { governs: row.governs }),
  };
  return demand as Demand;
}
