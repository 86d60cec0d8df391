-- Results written while another transaction issues their revision wait for it, and are refused when it is done.
CREATE OR REPLACE FUNCTION "keep_issued_results"() RETURNS trigger LANGUAGE plpgsql AS $$
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
  PERFORM 1 FROM "revision" WHERE "id" = ANY (revision_ids) ORDER BY "id" FOR SHARE;
  IF EXISTS (SELECT 1 FROM "revision" WHERE "id" = ANY (revision_ids) AND "state" = 'issued') THEN
    RAISE EXCEPTION 'the results of an issued revision cannot change' USING ERRCODE = 'integrity_constraint_violation';
  END IF;
  RETURN NULL;
END
$$;
