-- The audit trail: every write of projects, members, links and revisions, by whom, in the transaction that wrote it. The service names
-- its user in "groundward.actor"; a write without one came from outside the service.
CREATE TABLE "audit" (
  "id" BIGINT GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  "at" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "project_id" UUID,
  "actor_id" TEXT,
  "actor_name" TEXT,
  "subject" TEXT NOT NULL,
  "operation" TEXT NOT NULL,
  "before" JSONB,
  "after" JSONB
);
CREATE INDEX "audit_project_id_id_idx" ON "audit" ("project_id", "id");

CREATE FUNCTION "write_audit"() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  earlier JSONB := CASE WHEN TG_OP = 'INSERT' THEN NULL ELSE to_jsonb(OLD) - '{building,summary,token_hash}'::text[] END;
  later JSONB := CASE WHEN TG_OP = 'DELETE' THEN NULL ELSE to_jsonb(NEW) - '{building,summary,token_hash}'::text[] END;
  project TEXT := COALESCE(later, earlier) ->> CASE WHEN TG_TABLE_NAME = 'project' THEN 'id' ELSE 'project_id' END;
BEGIN
  INSERT INTO "audit" ("project_id", "actor_id", "actor_name", "subject", "operation", "before", "after")
  VALUES (project::uuid, NULLIF(current_setting('groundward.actor', true), ''), NULLIF(current_setting('groundward.actor_name', true), ''),
          TG_TABLE_NAME, lower(TG_OP), earlier, later);
  RETURN NULL;
END
$$;

CREATE TRIGGER "project_audit" AFTER INSERT OR DELETE ON "project" FOR EACH ROW EXECUTE FUNCTION "write_audit"();
-- That something in it changed is told by what changed.
CREATE TRIGGER "project_audit_name" AFTER UPDATE ON "project" FOR EACH ROW
  WHEN (OLD."name" IS DISTINCT FROM NEW."name") EXECUTE FUNCTION "write_audit"();
CREATE TRIGGER "membership_audit" AFTER INSERT OR UPDATE OR DELETE ON "membership" FOR EACH ROW EXECUTE FUNCTION "write_audit"();
CREATE TRIGGER "link_audit" AFTER INSERT OR UPDATE OR DELETE ON "link" FOR EACH ROW EXECUTE FUNCTION "write_audit"();
CREATE TRIGGER "revision_audit" AFTER INSERT OR UPDATE OR DELETE ON "revision" FOR EACH ROW EXECUTE FUNCTION "write_audit"();

-- What was written is never changed.
CREATE FUNCTION "keep_audit"() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'the audit trail is only added to' USING ERRCODE = 'integrity_constraint_violation';
END
$$;
CREATE TRIGGER "audit_keep" BEFORE UPDATE OR DELETE ON "audit" FOR EACH ROW EXECUTE FUNCTION "keep_audit"();
CREATE TRIGGER "audit_no_truncate" BEFORE TRUNCATE ON "audit" FOR EACH STATEMENT EXECUTE FUNCTION "keep_audit"();
