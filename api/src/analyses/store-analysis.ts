import type { Building } from '@groundward/engine/building/definition';
import type { Analysis } from '@groundward/engine/path/result';
import type { Transaction } from '../database/database.service.js';
import { levelOfDemand } from './level-of-demand.js';

/** Writes an analysis beside its revision: the demand table as rows, the rest as one document. What stood there is replaced. */
export async function storeAnalysis(
  transaction: Transaction,
  place: { readonly projectId: string; readonly revisionId: string },
  building: Building,
  analysis: Analysis,
): Promise<void> {
  const { projectId, revisionId } = place;
  await transaction.$executeRaw`DELETE FROM "demand" WHERE "revision_id" = ${revisionId}::uuid`;
  const levelOf = levelOfDemand(building);
  const rows = analysis.demands.map((demand, position) => ({
    position,
    member: demand.member,
    level: levelOf(demand),
    kind: demand.kind,
    quantity: demand.quantity,
    case: demand.case,
    sense: demand.sense,
    combination: demand.combination ?? null,
    value: demand.value,
    unit: demand.unit,
    x: demand.at?.[0] ?? null,
    y: demand.at?.[1] ?? null,
    governs: demand.governs ?? null,
  }));
  await transaction.$executeRaw`
    INSERT INTO "demand" ("revision_id", "project_id", "position", "member", "level", "kind", "quantity", "case", "sense",
                          "combination", "value", "unit", "at_x", "at_y", "governs")
    SELECT ${revisionId}::uuid, ${projectId}::uuid, r."position", r."member", r."level", r."kind", r."quantity", r."case", r."sense",
           r."combination", r."value", r."unit", r."x", r."y", r."governs"
    FROM json_to_recordset(${JSON.stringify(rows)}::json) AS r("position" int, "member" text, "level" text, "kind" text,
      "quantity" text, "case" text, "sense" smallint, "combination" text, "value" float8, "unit" text, "x" float8, "y" float8, "governs" text)`;
  const { demands: _rows, ...document } = analysis;
  const text = JSON.stringify(document);
  await transaction.$executeRaw`
    INSERT INTO "analysis" ("revision_id", "document") VALUES (${revisionId}::uuid, ${text}::jsonb)
    ON CONFLICT ("revision_id") DO UPDATE SET "document" = EXCLUDED."document", "created_at" = now()`;
}
