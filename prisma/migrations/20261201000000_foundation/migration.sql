-- Accounts and sessions.
CREATE TABLE "user" (
  "id" TEXT PRIMARY KEY,
  "name" TEXT NOT NULL,
  "email" TEXT NOT NULL UNIQUE,
  "emailVerified" BOOLEAN NOT NULL DEFAULT false,
  "image" TEXT,
  "createdAt" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "updatedAt" TIMESTAMPTZ NOT NULL DEFAULT now()
);

CREATE TABLE "session" (
  "id" TEXT PRIMARY KEY,
  "expiresAt" TIMESTAMPTZ NOT NULL,
  "token" TEXT NOT NULL UNIQUE,
  "createdAt" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "updatedAt" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "ipAddress" TEXT,
  "userAgent" TEXT,
  "userId" TEXT NOT NULL REFERENCES "user" ("id") ON DELETE CASCADE
);
CREATE INDEX "session_userId_idx" ON "session" ("userId");

CREATE TABLE "account" (
  "id" TEXT PRIMARY KEY,
  "accountId" TEXT NOT NULL,
  "providerId" TEXT NOT NULL,
  "userId" TEXT NOT NULL REFERENCES "user" ("id") ON DELETE CASCADE,
  "accessToken" TEXT,
  "refreshToken" TEXT,
  "idToken" TEXT,
  "accessTokenExpiresAt" TIMESTAMPTZ,
  "refreshTokenExpiresAt" TIMESTAMPTZ,
  "scope" TEXT,
  "password" TEXT,
  "createdAt" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "updatedAt" TIMESTAMPTZ NOT NULL DEFAULT now()
);
CREATE INDEX "account_userId_idx" ON "account" ("userId");

CREATE TABLE "verification" (
  "id" TEXT PRIMARY KEY,
  "identifier" TEXT NOT NULL,
  "value" TEXT NOT NULL,
  "expiresAt" TIMESTAMPTZ NOT NULL,
  "createdAt" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "updatedAt" TIMESTAMPTZ NOT NULL DEFAULT now()
);
CREATE INDEX "verification_identifier_idx" ON "verification" ("identifier");

-- Projects and their people.
CREATE TYPE "role" AS ENUM ('owner', 'engineer', 'checker', 'foundation-designer', 'reader');

CREATE TABLE "project" (
  "id" UUID PRIMARY KEY DEFAULT gen_random_uuid(),
  "name" TEXT NOT NULL,
  "version" INTEGER NOT NULL DEFAULT 1,
  "demo" BOOLEAN NOT NULL DEFAULT false,
  "created_at" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "updated_at" TIMESTAMPTZ NOT NULL DEFAULT now()
);

CREATE TABLE "membership" (
  "project_id" UUID NOT NULL REFERENCES "project" ("id") ON DELETE CASCADE,
  "user_id" TEXT NOT NULL REFERENCES "user" ("id") ON DELETE CASCADE,
  "role" "role" NOT NULL,
  PRIMARY KEY ("project_id", "user_id")
);
CREATE INDEX "membership_user_id_idx" ON "membership" ("user_id");

-- One-time links: the first owner's, and invitations. Only the token's hash is kept.
CREATE TABLE "link" (
  "id" UUID PRIMARY KEY DEFAULT gen_random_uuid(),
  "token_hash" TEXT NOT NULL UNIQUE,
  "project_id" UUID REFERENCES "project" ("id") ON DELETE CASCADE,
  "email" TEXT,
  "role" "role" NOT NULL,
  "expires_at" TIMESTAMPTZ NOT NULL,
  "used_at" TIMESTAMPTZ,
  "created_at" TIMESTAMPTZ NOT NULL DEFAULT now()
);

-- Revisions: the building as one document.
CREATE TYPE "revision_state" AS ENUM ('draft', 'issued');

CREATE TABLE "revision" (
  "id" UUID PRIMARY KEY DEFAULT gen_random_uuid(),
  "project_id" UUID NOT NULL REFERENCES "project" ("id") ON DELETE CASCADE,
  "number" INTEGER NOT NULL,
  "name" TEXT NOT NULL,
  "state" "revision_state" NOT NULL DEFAULT 'draft',
  "building" JSONB NOT NULL,
  "hash" TEXT NOT NULL,
  "version" INTEGER NOT NULL DEFAULT 1,
  "based_on" UUID REFERENCES "revision" ("id") ON DELETE SET NULL,
  "created_at" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "created_by" TEXT NOT NULL,
  "updated_at" TIMESTAMPTZ NOT NULL DEFAULT now(),
  "issued_at" TIMESTAMPTZ,
  "purpose" TEXT,
  "remarks" TEXT,
  "summary" JSONB NOT NULL,
  UNIQUE ("project_id", "number")
);

-- What an analysis answers beside its demand rows.
CREATE TABLE "analysis" (
  "revision_id" UUID PRIMARY KEY REFERENCES "revision" ("id") ON DELETE CASCADE,
  "document" JSONB NOT NULL,
  "created_at" TIMESTAMPTZ NOT NULL DEFAULT now()
);

CREATE TABLE "demand" (
  "revision_id" UUID NOT NULL REFERENCES "revision" ("id") ON DELETE CASCADE,
  "position" INTEGER NOT NULL,
  "project_id" UUID NOT NULL REFERENCES "project" ("id") ON DELETE CASCADE,
  "member" TEXT NOT NULL,
  "level" TEXT NOT NULL,
  "kind" TEXT NOT NULL,
  "quantity" TEXT NOT NULL,
  "case" TEXT NOT NULL,
  "sense" SMALLINT NOT NULL,
  "combination" TEXT,
  "value" DOUBLE PRECISION NOT NULL,
  "unit" TEXT NOT NULL,
  "at_x" DOUBLE PRECISION,
  "at_y" DOUBLE PRECISION,
  PRIMARY KEY ("revision_id", "position")
);
CREATE INDEX "demand_project_member_quantity_idx" ON "demand" ("project_id", "member", "quantity");

-- An issued revision never changes, and neither do its results.
CREATE FUNCTION "keep_issued_revision"() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF OLD."state" = 'issued' THEN
    RAISE EXCEPTION 'revision % is issued and cannot change', OLD."id" USING ERRCODE = 'integrity_constraint_violation';
  END IF;
  RETURN COALESCE(NEW, OLD);
END
$$;
CREATE TRIGGER "revision_keep_issued" BEFORE UPDATE OR DELETE ON "revision"
  FOR EACH ROW EXECUTE FUNCTION "keep_issued_revision"();

CREATE FUNCTION "keep_issued_results"() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  revision_ids UUID[];
BEGIN
  IF TG_OP = 'INSERT' THEN
    SELECT array_agg(DISTINCT "revision_id") INTO revision_ids FROM "changed";
  ELSIF TG_OP = 'DELETE' THEN
    SELECT array_agg(DISTINCT "revision_id") INTO revision_ids FROM "gone";
  ELSE
    SELECT array_agg(DISTINCT "revision_id") INTO revision_ids
      FROM (SELECT "revision_id" FROM "changed" UNION SELECT "revision_id" FROM "gone") AS "both";
  END IF;
  IF EXISTS (SELECT 1 FROM "revision" WHERE "id" = ANY (revision_ids) AND "state" = 'issued') THEN
    RAISE EXCEPTION 'the results of an issued revision cannot change' USING ERRCODE = 'integrity_constraint_violation';
  END IF;
  RETURN NULL;
END
$$;
CREATE TRIGGER "analysis_keep_issued_insert" AFTER INSERT ON "analysis" REFERENCING NEW TABLE AS "changed"
  FOR EACH STATEMENT EXECUTE FUNCTION "keep_issued_results"();
CREATE TRIGGER "analysis_keep_issued_update" AFTER UPDATE ON "analysis" REFERENCING NEW TABLE AS "changed" OLD TABLE AS "gone"
  FOR EACH STATEMENT EXECUTE FUNCTION "keep_issued_results"();
CREATE TRIGGER "analysis_keep_issued_delete" AFTER DELETE ON "analysis" REFERENCING OLD TABLE AS "gone"
  FOR EACH STATEMENT EXECUTE FUNCTION "keep_issued_results"();
CREATE TRIGGER "demand_keep_issued_insert" AFTER INSERT ON "demand" REFERENCING NEW TABLE AS "changed"
  FOR EACH STATEMENT EXECUTE FUNCTION "keep_issued_results"();
CREATE TRIGGER "demand_keep_issued_update" AFTER UPDATE ON "demand" REFERENCING NEW TABLE AS "changed" OLD TABLE AS "gone"
  FOR EACH STATEMENT EXECUTE FUNCTION "keep_issued_results"();
CREATE TRIGGER "demand_keep_issued_delete" AFTER DELETE ON "demand" REFERENCING OLD TABLE AS "gone"
  FOR EACH STATEMENT EXECUTE FUNCTION "keep_issued_results"();

-- TRUNCATE fires no row trigger.
CREATE FUNCTION "refuse_truncate"() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'table % cannot be truncated', TG_TABLE_NAME USING ERRCODE = 'integrity_constraint_violation';
END
$$;
CREATE TRIGGER "revision_no_truncate" BEFORE TRUNCATE ON "revision" FOR EACH STATEMENT EXECUTE FUNCTION "refuse_truncate"();
CREATE TRIGGER "analysis_no_truncate" BEFORE TRUNCATE ON "analysis" FOR EACH STATEMENT EXECUTE FUNCTION "refuse_truncate"();
CREATE TRIGGER "demand_no_truncate" BEFORE TRUNCATE ON "demand" FOR EACH STATEMENT EXECUTE FUNCTION "refuse_truncate"();
