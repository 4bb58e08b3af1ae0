CREATE TABLE "audit_entries" (
	"shop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"action" text NOT NULL,
	"subject" text NOT NULL,
	"subject_id" uuid NOT NULL,
	"before" jsonb,
	"after" jsonb,
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "audit_entries_pkey" PRIMARY KEY("shop_id","id")
);
--> statement-breakpoint
ALTER TABLE "audit_entries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "belt_steps" (
	"shop_id" uuid NOT NULL,
	"grinder_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"position" smallint NOT NULL,
	"name" text NOT NULL,
	"driving_pulley_mm" double precision NOT NULL,
	"driven_pulley_mm" double precision NOT NULL,
	"belt_thickness_mm" double precision NOT NULL,
	"measured_rpm" double precision,
	"measured_on" date,
	"measured_instrument" text,
	CONSTRAINT "belt_steps_pkey" PRIMARY KEY("shop_id","grinder_id","id"),
	CONSTRAINT "belt_steps_name_length" CHECK (char_length("belt_steps"."name") between 1 and 10),
	CONSTRAINT "belt_steps_driving_pulley_mm" CHECK ("belt_steps"."driving_pulley_mm" between 3 and 1000),
	CONSTRAINT "belt_steps_driven_pulley_mm" CHECK ("belt_steps"."driven_pulley_mm" between 3 and 1000),
	CONSTRAINT "belt_steps_belt_thickness_mm" CHECK ("belt_steps"."belt_thickness_mm" between 0 and 30),
	CONSTRAINT "belt_steps_measured_rpm" CHECK ("belt_steps"."measured_rpm" between 1 and 200000),
	CONSTRAINT "belt_steps_measured_whole" CHECK (num_nulls("belt_steps"."measured_rpm", "belt_steps"."measured_on", "belt_steps"."measured_instrument") in (0, 3))
);
--> statement-breakpoint
ALTER TABLE "belt_steps" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "grinders" (
	"shop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"motor_no_load_rpm" double precision NOT NULL,
	"motor_power_w" double precision NOT NULL,
	"spindle_maximum_rpm" double precision,
	"guard" text NOT NULL,
	"post_stiffness_n_per_mm" double precision,
	"wheel_rotation" text,
	"typed" jsonb NOT NULL,
	"creation_digest" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "grinders_pkey" PRIMARY KEY("shop_id","id"),
	CONSTRAINT "grinders_name_length" CHECK (char_length("grinders"."name") between 1 and 80),
	CONSTRAINT "grinders_motor_no_load_rpm" CHECK ("grinders"."motor_no_load_rpm" between 100 and 100000),
	CONSTRAINT "grinders_motor_power_w" CHECK ("grinders"."motor_power_w" between 10 and 50000),
	CONSTRAINT "grinders_spindle_maximum_rpm" CHECK ("grinders"."spindle_maximum_rpm" between 1 and 200000),
	CONSTRAINT "grinders_guard" CHECK ("grinders"."guard" in ('none', 'fixed')),
	CONSTRAINT "grinders_post_stiffness" CHECK ("grinders"."post_stiffness_n_per_mm" between 1 and 1000000),
	CONSTRAINT "grinders_wheel_rotation" CHECK ("grinders"."wheel_rotation" in ('clockwise', 'anticlockwise'))
);
--> statement-breakpoint
ALTER TABLE "grinders" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "lathes" (
	"shop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"spindle_speeds_rpm" double precision[] NOT NULL,
	"feeds_mm_per_rev" double precision[] NOT NULL,
	"cross_slide_division_mm" double precision NOT NULL,
	"cross_slide_reads" text NOT NULL,
	"cross_slide_divisions_per_turn" integer,
	"compound_zero" text,
	"compound_division_mm" double precision,
	"compound_travel_mm" double precision,
	"spindle_nose" text,
	"typed" jsonb NOT NULL,
	"creation_digest" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "lathes_pkey" PRIMARY KEY("shop_id","id"),
	CONSTRAINT "lathes_name_length" CHECK (char_length("lathes"."name") between 1 and 80),
	CONSTRAINT "lathes_spindle_speeds_count" CHECK (cardinality("lathes"."spindle_speeds_rpm") between 1 and 60),
	CONSTRAINT "lathes_spindle_speeds_rpm" CHECK (1 <= all("lathes"."spindle_speeds_rpm") and 10000 >= all("lathes"."spindle_speeds_rpm")),
	CONSTRAINT "lathes_feeds_count" CHECK (cardinality("lathes"."feeds_mm_per_rev") between 1 and 60),
	CONSTRAINT "lathes_feeds_mm_per_rev" CHECK (0.001 <= all("lathes"."feeds_mm_per_rev") and 20 >= all("lathes"."feeds_mm_per_rev")),
	CONSTRAINT "lathes_cross_slide_division_mm" CHECK ("lathes"."cross_slide_division_mm" between 0.0005 and 1),
	CONSTRAINT "lathes_cross_slide_reads" CHECK ("lathes"."cross_slide_reads" in ('radius', 'diameter')),
	CONSTRAINT "lathes_cross_slide_divisions_per_turn" CHECK ("lathes"."cross_slide_divisions_per_turn" between 10 and 1000),
	CONSTRAINT "lathes_compound_zero" CHECK ("lathes"."compound_zero" in ('cross-slide', 'spindle-axis')),
	CONSTRAINT "lathes_compound_division_mm" CHECK ("lathes"."compound_division_mm" between 0.0005 and 1),
	CONSTRAINT "lathes_compound_travel_mm" CHECK ("lathes"."compound_travel_mm" between 5 and 2000),
	CONSTRAINT "lathes_spindle_nose" CHECK ("lathes"."spindle_nose" in ('threaded', 'locked'))
);
--> statement-breakpoint
ALTER TABLE "lathes" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "memberships" (
	"shop_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "memberships_pkey" PRIMARY KEY("shop_id","person_id"),
	CONSTRAINT "memberships_role" CHECK ("memberships"."role" in ('lead', 'machinist', 'apprentice'))
);
--> statement-breakpoint
ALTER TABLE "memberships" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "persons" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"password_hash" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "persons_name_length" CHECK (char_length("persons"."name") between 1 and 80),
	CONSTRAINT "persons_email_lower" CHECK ("persons"."email" = lower("persons"."email")),
	CONSTRAINT "persons_email_length" CHECK (char_length("persons"."email") between 1 and 254)
);
--> statement-breakpoint
ALTER TABLE "persons" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "quills" (
	"shop_id" uuid NOT NULL,
	"grinder_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"position" smallint NOT NULL,
	"name" text NOT NULL,
	"segment_lengths_mm" double precision[] NOT NULL,
	"segment_diameters_mm" double precision[] NOT NULL,
	"material" text NOT NULL,
	"marked_maximum_rpm" double precision,
	"seat_diameter_mm" double precision NOT NULL,
	"thread_hand" text,
	"measured_stiffness_n_per_mm" double precision,
	"measured_frequency_hz" double precision,
	"retired_at" timestamp (3) with time zone,
	CONSTRAINT "quills_pkey" PRIMARY KEY("shop_id","grinder_id","id"),
	CONSTRAINT "quills_name_length" CHECK (char_length("quills"."name") between 1 and 80),
	CONSTRAINT "quills_segments_count" CHECK (cardinality("quills"."segment_lengths_mm") between 1 and 8 and cardinality("quills"."segment_lengths_mm") = cardinality("quills"."segment_diameters_mm")),
	CONSTRAINT "quills_segment_lengths_mm" CHECK (1 <= all("quills"."segment_lengths_mm") and 1000 >= all("quills"."segment_lengths_mm")),
	CONSTRAINT "quills_segment_diameters_mm" CHECK (0.5 <= all("quills"."segment_diameters_mm") and 200 >= all("quills"."segment_diameters_mm")),
	CONSTRAINT "quills_material" CHECK ("quills"."material" in ('steel', 'carbide')),
	CONSTRAINT "quills_marked_maximum_rpm" CHECK ("quills"."marked_maximum_rpm" between 1 and 200000),
	CONSTRAINT "quills_seat_diameter_mm" CHECK ("quills"."seat_diameter_mm" between 0.5 and 200),
	CONSTRAINT "quills_thread_hand" CHECK ("quills"."thread_hand" in ('right', 'left', 'none')),
	CONSTRAINT "quills_measured_stiffness" CHECK ("quills"."measured_stiffness_n_per_mm" between 1 and 1000000),
	CONSTRAINT "quills_measured_frequency_hz" CHECK ("quills"."measured_frequency_hz" between 1 and 20000)
);
--> statement-breakpoint
ALTER TABLE "quills" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" varchar(255) PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"sid" varchar PRIMARY KEY NOT NULL,
	"sess" json NOT NULL,
	"expire" timestamp (6) NOT NULL
);
--> statement-breakpoint
CREATE TABLE "setups" (
	"shop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"operation" text NOT NULL,
	"state" text DEFAULT 'draft' NOT NULL,
	"inputs" jsonb NOT NULL,
	"typed" jsonb NOT NULL,
	"lathe_id" uuid,
	"grinder_id" uuid,
	"quill_id" uuid,
	"wheel_id" uuid,
	"plan" jsonb NOT NULL,
	"verdict" text NOT NULL,
	"verdict_count" integer NOT NULL,
	"rules_version" text NOT NULL,
	"planned_on" date NOT NULL,
	"updated_by" uuid NOT NULL,
	"creation_digest" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "setups_pkey" PRIMARY KEY("shop_id","id"),
	CONSTRAINT "setups_name_length" CHECK (char_length("setups"."name") between 1 and 80),
	CONSTRAINT "setups_operation" CHECK ("setups"."operation" in ('jaws', 'bore', 'outside')),
	CONSTRAINT "setups_state" CHECK ("setups"."state" in ('draft', 'for review', 'cleared', 'retired')),
	CONSTRAINT "setups_verdict" CHECK ("setups"."verdict" in ('incomplete', 'clear', 'check', 'stop')),
	CONSTRAINT "setups_verdict_count" CHECK ("setups"."verdict_count" >= 0),
	CONSTRAINT "setups_quill_of_grinder" CHECK ("setups"."quill_id" is null or "setups"."grinder_id" is not null),
	CONSTRAINT "setups_inputs_operation" CHECK ("setups"."inputs" ->> 'operation' = "setups"."operation")
);
--> statement-breakpoint
ALTER TABLE "setups" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "shops" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"units" text NOT NULL,
	"time_zone" text NOT NULL,
	"rules" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "shops_name_length" CHECK (char_length("shops"."name") between 1 and 80),
	CONSTRAINT "shops_units" CHECK ("shops"."units" in ('mm', 'inch'))
);
--> statement-breakpoint
ALTER TABLE "shops" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "wheels" (
	"shop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"tag" text NOT NULL,
	"marking" text,
	"diameter_new_mm" double precision NOT NULL,
	"diameter_now_mm" double precision NOT NULL,
	"width_mm" double precision NOT NULL,
	"hole_mm" double precision NOT NULL,
	"marked_rpm" double precision,
	"marked_speed_m_per_s" double precision,
	"marking_read_on" text,
	"mandrel_diameter_mm" double precision,
	"mandrel_overhang_mm" double precision,
	"mandrel_threaded" boolean,
	"maker_maximum_rpm" double precision,
	"looked" text,
	"rung" text,
	"expires_on" date,
	"state" text NOT NULL,
	"set_aside_reason" text,
	"typed" jsonb NOT NULL,
	"creation_digest" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "wheels_pkey" PRIMARY KEY("shop_id","id"),
	CONSTRAINT "wheels_tag_length" CHECK (char_length("wheels"."tag") between 1 and 20),
	CONSTRAINT "wheels_marking_length" CHECK (char_length("wheels"."marking") between 1 and 40),
	CONSTRAINT "wheels_diameter_new_mm" CHECK ("wheels"."diameter_new_mm" between 2 and 1000),
	CONSTRAINT "wheels_diameter_now_mm" CHECK ("wheels"."diameter_now_mm" between 2 and 1000),
	CONSTRAINT "wheels_only_wear" CHECK ("wheels"."diameter_now_mm" <= "wheels"."diameter_new_mm"),
	CONSTRAINT "wheels_width_mm" CHECK ("wheels"."width_mm" between 0.5 and 300),
	CONSTRAINT "wheels_hole_mm" CHECK ("wheels"."hole_mm" between 0 and 500),
	CONSTRAINT "wheels_hole_inside" CHECK ("wheels"."hole_mm" < "wheels"."diameter_now_mm"),
	CONSTRAINT "wheels_marked_rpm" CHECK ("wheels"."marked_rpm" between 1 and 300000),
	CONSTRAINT "wheels_marked_speed_m_per_s" CHECK ("wheels"."marked_speed_m_per_s" between 1 and 200),
	CONSTRAINT "wheels_marking_read_on" CHECK ("wheels"."marking_read_on" in ('wheel', 'blotter', 'box', 'tag')),
	CONSTRAINT "wheels_mandrel_diameter_mm" CHECK ("wheels"."mandrel_diameter_mm" between 0.5 and 200),
	CONSTRAINT "wheels_mandrel_overhang_mm" CHECK ("wheels"."mandrel_overhang_mm" between 1 and 1000),
	CONSTRAINT "wheels_maker_maximum_rpm" CHECK ("wheels"."maker_maximum_rpm" between 1 and 300000),
	CONSTRAINT "wheels_mandrel_whole" CHECK (num_nulls("wheels"."mandrel_diameter_mm", "wheels"."mandrel_overhang_mm", "wheels"."mandrel_threaded") in (0, 3) and ("wheels"."maker_maximum_rpm" is null or "wheels"."mandrel_diameter_mm" is not null)),
	CONSTRAINT "wheels_looked" CHECK ("wheels"."looked" in ('sound', 'damaged')),
	CONSTRAINT "wheels_rung" CHECK ("wheels"."rung" in ('clear', 'dull', 'silent')),
	CONSTRAINT "wheels_state" CHECK ("wheels"."state" in ('on the rack', 'mounted', 'set aside', 'scrapped')),
	CONSTRAINT "wheels_reason_length" CHECK (char_length("wheels"."set_aside_reason") between 1 and 2000),
	CONSTRAINT "wheels_set_aside_reason" CHECK (("wheels"."state" = 'set aside') = ("wheels"."set_aside_reason" is not null))
);
--> statement-breakpoint
ALTER TABLE "wheels" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "audit_entries" ADD CONSTRAINT "audit_entries_shop" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "belt_steps" ADD CONSTRAINT "belt_steps_grinder" FOREIGN KEY ("shop_id","grinder_id") REFERENCES "public"."grinders"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "grinders" ADD CONSTRAINT "grinders_shop" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "lathes" ADD CONSTRAINT "lathes_shop" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_shop" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_person" FOREIGN KEY ("person_id") REFERENCES "public"."persons"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "quills" ADD CONSTRAINT "quills_grinder" FOREIGN KEY ("shop_id","grinder_id") REFERENCES "public"."grinders"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_shop" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_lathe" FOREIGN KEY ("shop_id","lathe_id") REFERENCES "public"."lathes"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_grinder" FOREIGN KEY ("shop_id","grinder_id") REFERENCES "public"."grinders"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_quill" FOREIGN KEY ("shop_id","grinder_id","quill_id") REFERENCES "public"."quills"("shop_id","grinder_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_wheel" FOREIGN KEY ("shop_id","wheel_id") REFERENCES "public"."wheels"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_updated_by" FOREIGN KEY ("shop_id","updated_by") REFERENCES "public"."memberships"("shop_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wheels" ADD CONSTRAINT "wheels_shop" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_entries_subject" ON "audit_entries" USING btree ("shop_id","subject","subject_id","at");--> statement-breakpoint
CREATE UNIQUE INDEX "belt_steps_name" ON "belt_steps" USING btree ("shop_id","grinder_id",lower("name"));--> statement-breakpoint
CREATE UNIQUE INDEX "grinders_name" ON "grinders" USING btree ("shop_id",lower("name"));--> statement-breakpoint
CREATE UNIQUE INDEX "lathes_name" ON "lathes" USING btree ("shop_id",lower("name"));--> statement-breakpoint
CREATE INDEX "memberships_person" ON "memberships" USING btree ("person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "persons_email" ON "persons" USING btree ("email");--> statement-breakpoint
CREATE UNIQUE INDEX "quills_name" ON "quills" USING btree ("shop_id","grinder_id",lower("name")) WHERE "quills"."retired_at" is null;--> statement-breakpoint
CREATE INDEX "sessions_expire" ON "sessions" USING btree ("expire");--> statement-breakpoint
CREATE INDEX "setups_latest" ON "setups" USING btree ("shop_id","updated_at" DESC NULLS LAST,"id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "setups_lathe" ON "setups" USING btree ("shop_id","lathe_id");--> statement-breakpoint
CREATE INDEX "setups_grinder" ON "setups" USING btree ("shop_id","grinder_id");--> statement-breakpoint
CREATE INDEX "setups_wheel" ON "setups" USING btree ("shop_id","wheel_id");--> statement-breakpoint
CREATE UNIQUE INDEX "wheels_tag" ON "wheels" USING btree ("shop_id",lower("tag"));--> statement-breakpoint
CREATE POLICY "audit_entries_of_the_shop" ON "audit_entries" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "belt_steps_of_the_shop" ON "belt_steps" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "grinders_of_the_shop" ON "grinders" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "lathes_of_the_shop" ON "lathes" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "memberships_of_the_shop" ON "memberships" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "memberships_of_the_person" ON "memberships" AS PERMISSIVE FOR SELECT TO public USING (person_id = (select nullif(current_setting('app.person_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "persons_self" ON "persons" AS PERMISSIVE FOR ALL TO public USING (id = (select nullif(current_setting('app.person_id', true), '')::uuid)) WITH CHECK (id = (select nullif(current_setting('app.person_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "persons_colleagues" ON "persons" AS PERMISSIVE FOR SELECT TO public USING (id in (select person_id from memberships where shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)));--> statement-breakpoint
CREATE POLICY "quills_of_the_shop" ON "quills" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "setups_of_the_shop" ON "setups" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "shops_current" ON "shops" AS PERMISSIVE FOR ALL TO public USING (id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (id = (select nullif(current_setting('app.shop_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "shops_of_the_person" ON "shops" AS PERMISSIVE FOR SELECT TO public USING (id in (select shop_id from memberships where person_id = (select nullif(current_setting('app.person_id', true), '')::uuid)));--> statement-breakpoint
CREATE POLICY "wheels_of_the_shop" ON "wheels" AS PERMISSIVE FOR ALL TO public USING (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid)) WITH CHECK (shop_id = (select nullif(current_setting('app.shop_id', true), '')::uuid));