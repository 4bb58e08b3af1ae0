ALTER TABLE "appointments" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "wheel_entries" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ("ended_at", "version", "updated_at") ON "appointments" TO "ringtrue_app";--> statement-breakpoint
GRANT SELECT, INSERT ON "wheel_entries" TO "ringtrue_app";--> statement-breakpoint

-- A part of a text is found by its trigrams, which no index under a policy serves: LIKE is not leakproof.
-- So the search alone runs with the owner's rights, and is bound to the transaction's shop by its own words.
CREATE EXTENSION IF NOT EXISTS "pg_trgm";--> statement-breakpoint
CREATE EXTENSION IF NOT EXISTS "btree_gin";--> statement-breakpoint
CREATE INDEX "wheels_search" ON "wheels" USING gin ("shop_id", "search_text" gin_trgm_ops);--> statement-breakpoint
CREATE FUNCTION "wheels_holding"("pattern" text, "most" integer) RETURNS SETOF uuid
  LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
  BEGIN ATOMIC
    SELECT "id" FROM "public"."wheels"
    WHERE "shop_id" = (SELECT nullif(current_setting('app.shop_id', true), '')::uuid) AND "search_text" LIKE "pattern"
    LIMIT "most";
  END;--> statement-breakpoint
REVOKE ALL ON FUNCTION "wheels_holding"(text, integer) FROM PUBLIC;--> statement-breakpoint
GRANT EXECUTE ON FUNCTION "wheels_holding"(text, integer) TO "ringtrue_app";--> statement-breakpoint

-- What each wheel's row says today becomes the entries of its life so far. On which spindle a mounted wheel
-- sits nobody wrote down: the entry says so, and nothing more is done on it until it is mounted anew.
UPDATE "wheels" SET "received_on" = ("wheels"."created_at" AT TIME ZONE "shops"."time_zone")::date
  FROM "shops" WHERE "shops"."id" = "wheels"."shop_id";--> statement-breakpoint
INSERT INTO "wheel_entries" ("shop_id", "id", "wheel_id", "number", "kind", "at", "happened_on", "person_id", "look",
    "ring", "diameter_mm", "reason", "creation_digest")
  SELECT w."shop_id", gen_random_uuid(), w."id", row_number() OVER (PARTITION BY w."shop_id", w."id" ORDER BY s."place"),
    s."kind", w."created_at", w."received_on",
    coalesce(
      (SELECT a."person_id" FROM "audit_entries" a JOIN "memberships" USING ("shop_id", "person_id")
        WHERE a."shop_id" = w."shop_id" AND a."subject" = 'wheel' AND a."subject_id" = w."id" AND a."action" = 'create'
        ORDER BY a."at" LIMIT 1),
      (SELECT m."person_id" FROM "memberships" m WHERE m."shop_id" = w."shop_id" AND m."role" = 'lead'
        ORDER BY m."created_at", m."person_id" LIMIT 1)),
    s."look", s."ring", s."diameter_mm", s."reason", 'as the row stood'
  FROM "wheels" w CROSS JOIN LATERAL (VALUES
    (1, 'received', NULL, NULL, w."diameter_now_mm", NULL, true),
    (2, 'inspected', w."looked", NULL, NULL, NULL, w."looked" IS NOT NULL),
    (3, 'ring test', NULL, w."rung", NULL, NULL, w."rung" IS NOT NULL),
    (4, 'mounted', NULL, NULL, NULL, NULL, w."state" = 'mounted'),
    (5, 'set aside', NULL, NULL, NULL, w."set_aside_reason", w."state" = 'set aside'),
    (6, 'scrapped', NULL, NULL, NULL, 'Scrapped before entries were kept.', w."state" = 'scrapped')
  ) s ("place", "kind", "look", "ring", "diameter_mm", "reason", "said")
  WHERE s."said";--> statement-breakpoint

-- Found sound before it was set aside counts no longer; what speaks against the wheel stays.
UPDATE "wheels" SET "looked" = nullif("looked", 'sound'), "rung" = CASE WHEN "rung" = 'dull' THEN "rung" END
  WHERE "state" = 'set aside';--> statement-breakpoint
UPDATE "wheels" SET "is_on_spindle" = true WHERE "state" = 'mounted';--> statement-breakpoint
UPDATE "wheels" SET
    "due_on" = least("expires_on", CASE WHEN "looked" IS NULL OR ("rung" IS NULL AND "mandrel_diameter_mm" IS NULL) THEN "received_on" END),
    "due_why" = CASE
      WHEN "expires_on" < "received_on" THEN 'expiry'
      WHEN "looked" IS NULL THEN 'close look'
      WHEN "rung" IS NULL AND "mandrel_diameter_mm" IS NULL THEN 'ring test'
      WHEN "expires_on" IS NOT NULL THEN 'expiry'
    END
  WHERE "state" IN ('on the rack', 'mounted');--> statement-breakpoint

-- The usual hundred steps are too coarse to see that few of 50 000 wheels are overdue, or that fast.
ALTER TABLE "wheels" ALTER COLUMN "due_key" SET STATISTICS 1000, ALTER COLUMN "limit_rpm" SET STATISTICS 1000,
  ALTER COLUMN "diameter_now_mm" SET STATISTICS 1000, ALTER COLUMN "usable_until" SET STATISTICS 1000;
