DROP INDEX "setups_latest";--> statement-breakpoint
DROP INDEX "wheels_tag";--> statement-breakpoint
ALTER TABLE "setups" ADD COLUMN "good_until" date;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "tag_key" text GENERATED ALWAYS AS (lower(tag)) STORED NOT NULL;--> statement-breakpoint
CREATE INDEX "setups_good_until" ON "setups" USING btree ("shop_id","good_until");--> statement-breakpoint
CREATE INDEX "setups_rules_version" ON "setups" USING btree ("shop_id","rules_version");--> statement-breakpoint
CREATE INDEX "setups_latest" ON "setups" USING btree ("shop_id","updated_at","id");--> statement-breakpoint
CREATE UNIQUE INDEX "wheels_tag" ON "wheels" USING btree ("shop_id","tag_key");--> statement-breakpoint
ALTER TABLE "setups" DROP COLUMN "planned_on";