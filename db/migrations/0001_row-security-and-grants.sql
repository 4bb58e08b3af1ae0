-- Policies bind the tables' owner too; only a role with BYPASSRLS (migrations, backup) stands above them.
ALTER TABLE "audit_entries" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "belt_steps" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "grinders" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "lathes" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "memberships" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "persons" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "quills" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "setups" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "shops" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "wheels" FORCE ROW LEVEL SECURITY;--> statement-breakpoint

-- Signing in must find a person before anyone is known: by the exact address, one at a time.
CREATE FUNCTION "credentials_of"("address" text) RETURNS TABLE ("person_id" uuid, "password_hash" text)
  LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
  BEGIN ATOMIC
    SELECT "persons"."id", "persons"."password_hash" FROM "public"."persons" WHERE "persons"."email" = "address";
  END;--> statement-breakpoint
REVOKE ALL ON FUNCTION "credentials_of"(text) FROM PUBLIC;--> statement-breakpoint
GRANT EXECUTE ON FUNCTION "credentials_of"(text) TO "ringtrue_app";--> statement-breakpoint

-- The application is granted table by table what it does, and nothing on tables yet to come.
GRANT USAGE ON SCHEMA "public" TO "ringtrue_app";--> statement-breakpoint
GRANT SELECT ("id", "name", "email", "created_at", "updated_at"), INSERT, UPDATE ("name", "email", "password_hash", "updated_at") ON "persons" TO "ringtrue_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ON "shops", "memberships", "lathes", "grinders", "quills", "wheels", "setups" TO "ringtrue_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "belt_steps", "sessions", "rate_limits" TO "ringtrue_app";--> statement-breakpoint
GRANT SELECT, INSERT ON "audit_entries" TO "ringtrue_app";--> statement-breakpoint

-- The backup reads everything, the record of migrations included, also what is made later.
GRANT USAGE ON SCHEMA "public", "drizzle" TO "ringtrue_backup";--> statement-breakpoint
GRANT SELECT ON ALL TABLES IN SCHEMA "public", "drizzle" TO "ringtrue_backup";--> statement-breakpoint
GRANT SELECT ON ALL SEQUENCES IN SCHEMA "public", "drizzle" TO "ringtrue_backup";--> statement-breakpoint
ALTER DEFAULT PRIVILEGES IN SCHEMA "public" GRANT SELECT ON TABLES TO "ringtrue_backup";--> statement-breakpoint
ALTER DEFAULT PRIVILEGES IN SCHEMA "public" GRANT SELECT ON SEQUENCES TO "ringtrue_backup";--> statement-breakpoint
ALTER DEFAULT PRIVILEGES REVOKE EXECUTE ON FUNCTIONS FROM PUBLIC;
