CREATE TABLE "appointments" (
	"shop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"person_id" uuid NOT NULL,
	"tasks" text[] NOT NULL,
	"wheel_class" text NOT NULL,
	"appointed_by" uuid NOT NULL,
	"from_on" date NOT NULL,
	"until_on" date,
	"ended_at" timestamp (3) with time zone,
	"creation_digest" text NOT NULL,
	CONSTRAINT "appointments_pkey" PRIMARY KEY("shop_id","id"),
	CONSTRAINT "appointments_tasks" CHECK ("appointments"."tasks" <@ array['mount', 'dress', 'trial run'] and cardinality("appointments"."tasks") between 1 and 3),
	CONSTRAINT "appointments_wheel_class_length" CHECK (char_length("appointments"."wheel_class") between 1 and 120),
	CONSTRAINT "appointments_until" CHECK ("appointments"."until_on" >= "appointments"."from_on")
);
--> statement-breakpoint
ALTER TABLE "appointments" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "wheel_entries" (
	"shop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"wheel_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"kind" text NOT NULL,
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"happened_on" date NOT NULL,
	"person_id" uuid NOT NULL,
	"needs" text,
	"look" text,
	"ring" text,
	"diameter_mm" double precision,
	"grinder_id" uuid,
	"quill_id" uuid,
	"minutes" double precision,
	"spindle_rpm" double precision,
	"depth_mm" double precision,
	"passes" smallint,
	"reason" text,
	"signs_id" uuid,
	"corrects_id" uuid,
	"note" text,
	"creation_digest" text NOT NULL,
	CONSTRAINT "wheel_entries_pkey" PRIMARY KEY("shop_id","id"),
	CONSTRAINT "wheel_entries_of_wheel" UNIQUE("shop_id","wheel_id","id"),
	CONSTRAINT "wheel_entries_kind" CHECK ("wheel_entries"."kind" in ('received', 'inspected', 'ring test', 'mounted', 'trial run', 'dressed', 'used', 'taken off', 'set aside', 'returned', 'scrapped', 'countersigned', 'correction')),
	CONSTRAINT "wheel_entries_counted" CHECK ("wheel_entries"."number" >= 1),
	CONSTRAINT "wheel_entries_first" CHECK (("wheel_entries"."number" = 1) = ("wheel_entries"."kind" = 'received')),
	CONSTRAINT "wheel_entries_needs" CHECK ("wheel_entries"."needs" in ('skilled', 'appointed')),
	CONSTRAINT "wheel_entries_needs_of_kind" CHECK ("wheel_entries"."needs" is null or case "wheel_entries"."needs" when 'skilled' then kind in ('inspected', 'ring test') else kind in ('mounted', 'trial run', 'dressed') end),
	CONSTRAINT "wheel_entries_look" CHECK (("wheel_entries"."look" is not null) = ("wheel_entries"."kind" = 'inspected')),
	CONSTRAINT "wheel_entries_look_result" CHECK ("wheel_entries"."look" in ('sound', 'damaged')),
	CONSTRAINT "wheel_entries_ring" CHECK (("wheel_entries"."ring" is not null) = ("wheel_entries"."kind" = 'ring test')),
	CONSTRAINT "wheel_entries_ring_result" CHECK ("wheel_entries"."ring" in ('clear', 'dull', 'silent')),
	CONSTRAINT "wheel_entries_diameter_mm" CHECK ("wheel_entries"."diameter_mm" between 2 and 1000),
	CONSTRAINT "wheel_entries_diameter_of_kind" CHECK (case when "wheel_entries"."diameter_mm" is null then kind <> 'received' else kind in ('received', 'inspected', 'used') end),
	CONSTRAINT "wheel_entries_spindle" CHECK (num_nulls("wheel_entries"."grinder_id", "wheel_entries"."quill_id") = 2 or (num_nulls("wheel_entries"."grinder_id", "wheel_entries"."quill_id") = 0 and "wheel_entries"."kind" = 'mounted')),
	CONSTRAINT "wheel_entries_minutes" CHECK ("wheel_entries"."minutes" between 0.5 and 1440),
	CONSTRAINT "wheel_entries_minutes_of_kind" CHECK (case when "wheel_entries"."minutes" is null then kind <> 'trial run' else kind in ('trial run', 'used') end),
	CONSTRAINT "wheel_entries_spindle_rpm" CHECK ("wheel_entries"."spindle_rpm" between 1 and 200000),
	CONSTRAINT "wheel_entries_rpm" CHECK (("wheel_entries"."spindle_rpm" is not null) = ("wheel_entries"."kind" = 'trial run')),
	CONSTRAINT "wheel_entries_depth_mm" CHECK ("wheel_entries"."depth_mm" between 0.001 and 0.2),
	CONSTRAINT "wheel_entries_passes" CHECK ("wheel_entries"."passes" between 1 and 50),
	CONSTRAINT "wheel_entries_dressing" CHECK (num_nonnulls("wheel_entries"."depth_mm", "wheel_entries"."passes") = case when "wheel_entries"."kind" = 'dressed' then 2 else 0 end),
	CONSTRAINT "wheel_entries_reason_length" CHECK (char_length("wheel_entries"."reason") between 1 and 2000),
	CONSTRAINT "wheel_entries_reason" CHECK (("wheel_entries"."reason" is not null) = (kind in ('set aside', 'scrapped', 'correction'))),
	CONSTRAINT "wheel_entries_signs_one" CHECK (("wheel_entries"."signs_id" is not null) = ("wheel_entries"."kind" = 'countersigned')),
	CONSTRAINT "wheel_entries_corrects_one" CHECK (("wheel_entries"."corrects_id" is not null) = ("wheel_entries"."kind" = 'correction')),
	CONSTRAINT "wheel_entries_note_length" CHECK (char_length("wheel_entries"."note") between 1 and 2000)
);
--> statement-breakpoint
ALTER TABLE "wheel_entries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "search_text" text GENERATED ALWAYS AS (lower(tag) || E'\n' || lower(coalesce(marking, ''))) STORED NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "shape" text;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "smallest_usable_mm" double precision;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "made_on" date;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "place" text;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "place_key" text GENERATED ALWAYS AS (lower(place)) STORED;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "notes" text;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "unsigned" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "received_on" date DEFAULT now() NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "is_on_spindle" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "on_grinder_id" uuid;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "on_quill_id" uuid;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "due_on" date;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "due_why" text;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "due_key" date GENERATED ALWAYS AS (coalesce(due_on, 'infinity'::date)) STORED NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "facts_version" integer DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "abrasive" text;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "grain" smallint;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "grade" text;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "bond" text;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "limit_rpm" double precision DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "usable" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "wheels" ADD COLUMN "usable_until" date GENERATED ALWAYS AS (case when usable then coalesce(expires_on, 'infinity'::date) else '-infinity'::date end) STORED NOT NULL;--> statement-breakpoint
ALTER TABLE "appointments" ADD CONSTRAINT "appointments_person" FOREIGN KEY ("shop_id","person_id") REFERENCES "public"."memberships"("shop_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "appointments" ADD CONSTRAINT "appointments_appointed_by" FOREIGN KEY ("shop_id","appointed_by") REFERENCES "public"."memberships"("shop_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wheel_entries" ADD CONSTRAINT "wheel_entries_wheel" FOREIGN KEY ("shop_id","wheel_id") REFERENCES "public"."wheels"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wheel_entries" ADD CONSTRAINT "wheel_entries_person" FOREIGN KEY ("shop_id","person_id") REFERENCES "public"."memberships"("shop_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wheel_entries" ADD CONSTRAINT "wheel_entries_quill" FOREIGN KEY ("shop_id","grinder_id","quill_id") REFERENCES "public"."quills"("shop_id","grinder_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wheel_entries" ADD CONSTRAINT "wheel_entries_signed" FOREIGN KEY ("shop_id","wheel_id","signs_id") REFERENCES "public"."wheel_entries"("shop_id","wheel_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wheel_entries" ADD CONSTRAINT "wheel_entries_corrected" FOREIGN KEY ("shop_id","wheel_id","corrects_id") REFERENCES "public"."wheel_entries"("shop_id","wheel_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "appointments_person" ON "appointments" USING btree ("shop_id","person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "wheel_entries_number" ON "wheel_entries" USING btree ("shop_id","wheel_id","number");--> statement-breakpoint
CREATE UNIQUE INDEX "wheel_entries_corrects" ON "wheel_entries" USING btree ("shop_id","corrects_id") WHERE "wheel_entries"."corrects_id" is not null;--> statement-breakpoint
CREATE INDEX "wheel_entries_signs" ON "wheel_entries" USING btree ("shop_id","signs_id") WHERE "wheel_entries"."signs_id" is not null;--> statement-breakpoint
CREATE INDEX "wheels_diameter" ON "wheels" USING btree ("shop_id","diameter_now_mm","id");--> statement-breakpoint
CREATE INDEX "wheels_due" ON "wheels" USING btree ("shop_id","due_key","id");--> statement-breakpoint
CREATE INDEX "wheels_latest" ON "wheels" USING btree ("shop_id","updated_at","id");--> statement-breakpoint
CREATE INDEX "wheels_state" ON "wheels" USING btree ("shop_id","state","tag_key");--> statement-breakpoint
CREATE INDEX "wheels_abrasive" ON "wheels" USING btree ("shop_id","abrasive","grain");--> statement-breakpoint
CREATE INDEX "wheels_grain" ON "wheels" USING btree ("shop_id","grain");--> statement-breakpoint
CREATE INDEX "wheels_limit" ON "wheels" USING btree ("shop_id","limit_rpm");--> statement-breakpoint
CREATE INDEX "wheels_usable" ON "wheels" USING btree ("shop_id","usable_until");--> statement-breakpoint
CREATE INDEX "wheels_place" ON "wheels" USING btree ("shop_id","place_key");--> statement-breakpoint
CREATE INDEX "wheels_facts_version" ON "wheels" USING btree ("shop_id","facts_version");--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_shape" CHECK ("wheels"."shape" in ('1', '2', '3', '4', '5', '6', '7', '11', '12', '13', '35', '36', '38', '52'));--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_smallest_usable_mm" CHECK ("wheels"."smallest_usable_mm" > "wheels"."hole_mm" and "wheels"."smallest_usable_mm" <= "wheels"."diameter_new_mm");--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_place_length" CHECK (char_length("wheels"."place") between 1 and 40);--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_notes_length" CHECK (char_length("wheels"."notes") between 1 and 2000);--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_due" CHECK (("wheels"."due_on" is null) = ("wheels"."due_why" is null));--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_due_why" CHECK ("wheels"."due_why" in ('close look', 'ring test', 'expiry'));--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_on_spindle" CHECK ("wheels"."is_on_spindle" or "wheels"."on_grinder_id" is null);--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_on_quill_of_grinder" CHECK (("wheels"."on_grinder_id" is null) = ("wheels"."on_quill_id" is null));--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_abrasive" CHECK ("wheels"."abrasive" in ('aluminium oxide', 'silicon carbide', 'cBN', 'diamond'));--> statement-breakpoint
CREATE POLICY "appointments_of_the_shop" ON "appointments" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "wheel_entries_of_the_shop" ON "wheel_entries" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));