-- A demand's project is its revision's: one key says both, and is checked once a row instead of twice.
ALTER TABLE "revision" ADD CONSTRAINT "revision_id_project_id_key" UNIQUE ("id", "project_id");
ALTER TABLE "demand" DROP CONSTRAINT "demand_project_id_fkey";
ALTER TABLE "demand" DROP CONSTRAINT "demand_revision_id_fkey";
ALTER TABLE "demand" ADD CONSTRAINT "demand_revision_id_project_id_fkey"
  FOREIGN KEY ("revision_id", "project_id") REFERENCES "revision" ("id", "project_id") ON DELETE CASCADE;
