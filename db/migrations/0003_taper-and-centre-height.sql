ALTER TABLE "setups" DROP CONSTRAINT "setups_operation";--> statement-breakpoint
ALTER TABLE "grinders" ADD COLUMN "shims_mm" double precision[] DEFAULT '{}' NOT NULL;--> statement-breakpoint
ALTER TABLE "lathes" ADD COLUMN "compound_mm_per_turn" double precision;--> statement-breakpoint
ALTER TABLE "grinders" ADD CONSTRAINT "grinders_shims_count" CHECK (cardinality("grinders"."shims_mm") <= 60);--> statement-breakpoint
ALTER TABLE "grinders" ADD CONSTRAINT "grinders_shims_mm" CHECK (0.005 <= all("grinders"."shims_mm") and 50 >= all("grinders"."shims_mm"));--> statement-breakpoint
ALTER TABLE "lathes" ADD CONSTRAINT "lathes_compound_mm_per_turn" CHECK ("lathes"."compound_mm_per_turn" between 0.1 and 20);--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_operation" CHECK ("setups"."operation" in ('jaws', 'bore', 'outside', 'taper'));