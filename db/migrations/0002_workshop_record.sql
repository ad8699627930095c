CREATE TABLE "api_token" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"user_id" text NOT NULL,
	"name" text NOT NULL,
	"token_hash" text NOT NULL,
	"scopes" text[] NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone,
	"last_used_at" timestamp with time zone,
	"revoked_by" text,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "api_token_token_hash_unique" UNIQUE("token_hash"),
	CONSTRAINT "api_token_name" CHECK (length(btrim("api_token"."name")) > 0),
	CONSTRAINT "api_token_hash" CHECK ("api_token"."token_hash" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "api_token_scopes" CHECK (cardinality("api_token"."scopes") > 0),
	CONSTRAINT "api_token_expires" CHECK ("api_token"."expires_at" > "api_token"."created_at"),
	CONSTRAINT "api_token_revoked" CHECK (num_nonnulls("api_token"."revoked_by", "api_token"."revoked_at") in (0, 2))
);
--> statement-breakpoint
CREATE TABLE "bench_reading" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"bench_test_id" text NOT NULL,
	"number" integer NOT NULL,
	"throttle_pct" double precision,
	"voltage_v" double precision,
	"current_a" double precision,
	"power_w" double precision,
	"speed_rpm" double precision,
	"thrust_n" double precision,
	"motor_c" double precision,
	"controller_c" double precision,
	"pack_c" double precision,
	"left_out" boolean NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "bench_reading_number" UNIQUE("bench_test_id","number"),
	CONSTRAINT "bench_reading_throttle" CHECK ("bench_reading"."throttle_pct" between 0 and 100),
	CONSTRAINT "bench_reading_sizes" CHECK ("bench_reading"."voltage_v" >= 0 and "bench_reading"."current_a" >= 0 and "bench_reading"."power_w" >= 0 and "bench_reading"."speed_rpm" >= 0 and "bench_reading"."thrust_n" >= 0),
	CONSTRAINT "bench_reading_measured" CHECK (num_nonnulls("bench_reading"."voltage_v", "bench_reading"."current_a", "bench_reading"."power_w", "bench_reading"."speed_rpm", "bench_reading"."thrust_n") > 0),
	CONSTRAINT "bench_reading_left_out" CHECK (not "bench_reading"."left_out" or length("bench_reading"."note") > 0)
);
--> statement-breakpoint
CREATE TABLE "bench_test" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"design_id" text,
	"build_id" text,
	"motor_id" text,
	"pack_id" text,
	"controller_id" text,
	"propeller_id" text,
	"fan_id" text,
	"air_temperature_c" double precision,
	"air_pressure_hpa" double precision,
	"photo_id" text,
	"note" text NOT NULL,
	"fit" jsonb,
	"tested_by" text NOT NULL,
	"tested_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "bench_test_in_workshop" UNIQUE("id","workshop_id"),
	CONSTRAINT "bench_test_build_has_design" CHECK ("bench_test"."build_id" is null or "bench_test"."design_id" is not null),
	CONSTRAINT "bench_test_one_thruster" CHECK (num_nonnulls("bench_test"."propeller_id", "bench_test"."fan_id") <= 1),
	CONSTRAINT "bench_test_pressure" CHECK ("bench_test"."air_pressure_hpa" > 0)
);
--> statement-breakpoint
CREATE TABLE "build" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"design_id" text NOT NULL,
	"revision_id" text NOT NULL,
	"number" integer NOT NULL,
	"state" text NOT NULL,
	"builder_id" text NOT NULL,
	"differences" text NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"finished_at" timestamp with time zone,
	"updated_at" timestamp with time zone NOT NULL,
	CONSTRAINT "build_number" UNIQUE("design_id","number"),
	CONSTRAINT "build_in_workshop" UNIQUE("id","workshop_id"),
	CONSTRAINT "build_in_design" UNIQUE("id","design_id"),
	CONSTRAINT "build_number_positive" CHECK ("build"."number" > 0),
	CONSTRAINT "build_state" CHECK ("build"."state" in ('building', 'flying', 'lost', 'retired'))
);
--> statement-breakpoint
CREATE TABLE "build_part" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"build_id" text NOT NULL,
	"part_key" text NOT NULL,
	"step" text NOT NULL,
	"ticked_by" text,
	"ticked_at" timestamp with time zone,
	CONSTRAINT "build_part_step" UNIQUE("build_id","part_key","step"),
	CONSTRAINT "build_part_ticked" CHECK (num_nonnulls("build_part"."ticked_by", "build_part"."ticked_at") in (0, 2))
);
--> statement-breakpoint
CREATE TABLE "weighing" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"build_id" text NOT NULL,
	"what" text NOT NULL,
	"key" text,
	"mass_g" double precision NOT NULL,
	"cg_x_mm" double precision,
	"cg_y_mm" double precision,
	"weighed_by" text NOT NULL,
	"weighed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "weighing_what" CHECK ("weighing"."what" in ('part', 'item', 'assembly', 'allUp')),
	CONSTRAINT "weighing_key" CHECK (("weighing"."what" = 'allUp') = ("weighing"."key" is null)),
	CONSTRAINT "weighing_mass" CHECK ("weighing"."mass_g" >= 0),
	CONSTRAINT "weighing_cg" CHECK ("weighing"."what" = 'allUp' or ("weighing"."cg_x_mm" is null and "weighing"."cg_y_mm" is null))
);
--> statement-breakpoint
CREATE TABLE "component" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"kind" text NOT NULL,
	"name" text NOT NULL,
	"figures" jsonb NOT NULL,
	"mass_g" double precision,
	"source" text NOT NULL,
	"price_minor" bigint,
	"currency" text,
	"price_source" text,
	"count" integer,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"updated_at" timestamp with time zone NOT NULL,
	"archived_at" timestamp with time zone,
	CONSTRAINT "component_in_workshop" UNIQUE("id","workshop_id"),
	CONSTRAINT "component_kind" CHECK ("component"."kind" in ('motor', 'pack', 'controller', 'propeller', 'fan', 'servo', 'receiver', 'other')),
	CONSTRAINT "component_name_filled" CHECK (length(btrim("component"."name")) > 0),
	CONSTRAINT "component_figures" CHECK (jsonb_typeof("component"."figures") = 'object'),
	CONSTRAINT "component_sizes" CHECK ("component"."mass_g" >= 0 and "component"."count" >= 0),
	CONSTRAINT "component_price" CHECK (("component"."price_minor" is null) = ("component"."currency" is null) and "component"."price_minor" >= 0 and "component"."currency" ~ '^[A-Z]{3}$')
);
--> statement-breakpoint
CREATE TABLE "flight" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"design_id" text NOT NULL,
	"build_id" text NOT NULL,
	"number" integer NOT NULL,
	"pilot_id" text NOT NULL,
	"flown_at" timestamp with time zone NOT NULL,
	"duration_s" double precision,
	"wind_ms" double precision,
	"temperature_c" double precision,
	"conditions" text NOT NULL,
	"mass_g" double precision,
	"cg_x_mm" double precision,
	"used_mah" double precision,
	"trim_pitch_deg" double precision,
	"trim_roll_deg" double precision,
	"trim_yaw_deg" double precision,
	"behaviours" text[] NOT NULL,
	"expected" text NOT NULL,
	"observed" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "flight_number" UNIQUE("build_id","number"),
	CONSTRAINT "flight_in_design" UNIQUE("id","design_id"),
	CONSTRAINT "flight_number_positive" CHECK ("flight"."number" > 0),
	CONSTRAINT "flight_sizes" CHECK ("flight"."duration_s" >= 0 and "flight"."wind_ms" >= 0 and "flight"."used_mah" >= 0),
	CONSTRAINT "flight_mass" CHECK ("flight"."mass_g" > 0),
	CONSTRAINT "flight_temperature" CHECK ("flight"."temperature_c" between -60 and 60),
	CONSTRAINT "flight_behaviours" CHECK ("flight"."behaviours" <@ array['porpoises', 'wags', 'climbsWithPower', 'divesWithPower', 'rollsWithPower', 'needsUpInTurns', 'floats', 'buzzes', 'wanders', 'dropsAWing', 'tucks', 'glitched']::text[])
);
--> statement-breakpoint
CREATE TABLE "job" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"design_id" text,
	"kind" text NOT NULL,
	"state" text NOT NULL,
	"input" jsonb NOT NULL,
	"input_hash" text NOT NULL,
	"progress" double precision NOT NULL,
	"progress_note" text NOT NULL,
	"requested_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"cancel_requested_at" timestamp with time zone,
	"attempts" integer NOT NULL,
	"worker_id" text,
	"alive_at" timestamp with time zone,
	"started_at" timestamp with time zone,
	"finished_at" timestamp with time zone,
	"result" jsonb,
	"result_key" text,
	"failure" text,
	CONSTRAINT "job_state" CHECK ("job"."state" in ('queued', 'running', 'done', 'failed', 'stopped')),
	CONSTRAINT "job_input_hash" CHECK ("job"."input_hash" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "job_progress" CHECK ("job"."progress" between 0 and 1),
	CONSTRAINT "job_attempts" CHECK ("job"."attempts" >= 0),
	CONSTRAINT "job_worker" CHECK (num_nonnulls("job"."worker_id", "job"."alive_at") in (0, 2)),
	CONSTRAINT "job_running" CHECK ("job"."state" <> 'running' or ("job"."started_at" is not null and "job"."worker_id" is not null)),
	CONSTRAINT "job_finished" CHECK (("job"."state" in ('done', 'failed', 'stopped')) = ("job"."finished_at" is not null)),
	CONSTRAINT "job_failure" CHECK (("job"."state" = 'failed') = ("job"."failure" is not null))
);
--> statement-breakpoint
CREATE TABLE "layout" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"design_id" text NOT NULL,
	"revision_id" text,
	"draft_version" integer,
	"stock_hash" text NOT NULL,
	"engine" text NOT NULL,
	"seed" bigint NOT NULL,
	"steps" integer NOT NULL,
	"spacing_mm" double precision NOT NULL,
	"margin_mm" double precision NOT NULL,
	"placements" jsonb NOT NULL,
	"locks" text[] NOT NULL,
	"chosen" boolean NOT NULL,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "layout_in_workshop" UNIQUE("id","workshop_id"),
	CONSTRAINT "layout_source" CHECK (num_nonnulls("layout"."revision_id", "layout"."draft_version") = 1),
	CONSTRAINT "layout_stock_hash" CHECK ("layout"."stock_hash" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "layout_sizes" CHECK ("layout"."seed" >= 0 and "layout"."steps" >= 0 and "layout"."spacing_mm" >= 0 and "layout"."margin_mm" >= 0)
);
--> statement-breakpoint
CREATE TABLE "notification" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"user_id" text NOT NULL,
	"kind" text NOT NULL,
	"subject_id" text NOT NULL,
	"detail" jsonb NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"read_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "open_point" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"design_id" text NOT NULL,
	"number" integer NOT NULL,
	"finding" text NOT NULL,
	"flight_id" text,
	"build_id" text,
	"bench_test_id" text,
	"comment_id" text,
	"raised_by" text NOT NULL,
	"raised_at" timestamp with time zone NOT NULL,
	"answered_by_revision_id" text,
	"answer" text,
	"answered_by" text,
	"answered_at" timestamp with time zone,
	CONSTRAINT "open_point_number" UNIQUE("design_id","number"),
	CONSTRAINT "open_point_source" CHECK (num_nonnulls("open_point"."flight_id", "open_point"."build_id", "open_point"."bench_test_id", "open_point"."comment_id") = 1),
	CONSTRAINT "open_point_number_positive" CHECK ("open_point"."number" > 0),
	CONSTRAINT "open_point_finding" CHECK (length(btrim("open_point"."finding")) > 0),
	CONSTRAINT "open_point_answered" CHECK (num_nonnulls("open_point"."answered_by_revision_id", "open_point"."answer", "open_point"."answered_by", "open_point"."answered_at") in (0, 4))
);
--> statement-breakpoint
CREATE TABLE "printer_profile" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"name" text NOT NULL,
	"drawn_x_mm" double precision NOT NULL,
	"drawn_y_mm" double precision NOT NULL,
	"measured_x_mm" double precision NOT NULL,
	"measured_y_mm" double precision NOT NULL,
	"measured_by" text NOT NULL,
	"measured_at" timestamp with time zone NOT NULL,
	"confirmed_x_mm" double precision,
	"confirmed_y_mm" double precision,
	"confirmed_by" text,
	"confirmed_at" timestamp with time zone,
	CONSTRAINT "printer_profile_name" UNIQUE("workshop_id","name"),
	CONSTRAINT "printer_profile_name_filled" CHECK (length(btrim("printer_profile"."name")) > 0),
	CONSTRAINT "printer_profile_sizes" CHECK ("printer_profile"."drawn_x_mm" > 0 and "printer_profile"."drawn_y_mm" > 0 and "printer_profile"."measured_x_mm" > 0 and "printer_profile"."measured_y_mm" > 0 and "printer_profile"."confirmed_x_mm" > 0 and "printer_profile"."confirmed_y_mm" > 0),
	CONSTRAINT "printer_profile_confirmed" CHECK (num_nonnulls("printer_profile"."confirmed_x_mm", "printer_profile"."confirmed_y_mm", "printer_profile"."confirmed_by", "printer_profile"."confirmed_at") in (0, 4))
);
--> statement-breakpoint
CREATE TABLE "share_link" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"token_hash" text NOT NULL,
	"scope" text NOT NULL,
	"design_id" text NOT NULL,
	"revision_id" text,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"last_used_at" timestamp with time zone,
	"revoked_by" text,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "share_link_token_hash_unique" UNIQUE("token_hash"),
	CONSTRAINT "share_link_token_hash" CHECK ("share_link"."token_hash" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "share_link_scope" CHECK ("share_link"."scope" in ('read', 'print', 'comment')),
	CONSTRAINT "share_link_expires" CHECK ("share_link"."expires_at" > "share_link"."created_at"),
	CONSTRAINT "share_link_revoked" CHECK (num_nonnulls("share_link"."revoked_by", "share_link"."revoked_at") in (0, 2))
);
--> statement-breakpoint
CREATE TABLE "stock" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"kind" text NOT NULL,
	"material" text NOT NULL,
	"name" text NOT NULL,
	"count" integer,
	"thickness_mm" double precision,
	"width_mm" double precision,
	"height_mm" double precision,
	"areal_mass_g_m2" double precision,
	"grain" text,
	"outline_mm" jsonb,
	"coupon_id" text,
	"left_by_layout_id" text,
	"outer_width_mm" double precision,
	"outer_height_mm" double precision,
	"wall_mm" double precision,
	"length_mm" double precision,
	"mass_per_metre_g" double precision,
	"e_gpa" double precision,
	"price_minor" bigint,
	"currency" text,
	"price_source" text,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"updated_at" timestamp with time zone NOT NULL,
	CONSTRAINT "stock_kind" CHECK (case "stock"."kind" when 'tube' then "stock"."material" in ('tube', 'rod', 'strip', 'foamBox') when 'sheet' then "stock"."material" in ('paperFacedBoard', 'xps', 'epp', 'balsa', 'ply') when 'remnant' then "stock"."material" in ('paperFacedBoard', 'xps', 'epp', 'balsa', 'ply') else false end),
	CONSTRAINT "stock_is_flat_or_long" CHECK (case when "stock"."kind" = 'tube' then num_nonnulls("stock"."outer_width_mm", "stock"."outer_height_mm", "stock"."length_mm", "stock"."mass_per_metre_g") = 4 and num_nonnulls("stock"."thickness_mm", "stock"."width_mm", "stock"."height_mm", "stock"."areal_mass_g_m2", "stock"."grain", "stock"."coupon_id") = 0 else num_nonnulls("stock"."thickness_mm", "stock"."width_mm", "stock"."height_mm", "stock"."grain") = 4 and num_nonnulls("stock"."outer_width_mm", "stock"."outer_height_mm", "stock"."wall_mm", "stock"."length_mm", "stock"."mass_per_metre_g") = 0 end),
	CONSTRAINT "stock_outline" CHECK (("stock"."kind" = 'remnant') = ("stock"."outline_mm" is not null)),
	CONSTRAINT "stock_grain" CHECK ("stock"."grain" in ('alongWidth', 'alongHeight', 'none')),
	CONSTRAINT "stock_count" CHECK ("stock"."count" >= 0),
	CONSTRAINT "stock_sizes" CHECK ("stock"."thickness_mm" > 0 and "stock"."width_mm" > 0 and "stock"."height_mm" > 0 and "stock"."areal_mass_g_m2" > 0 and "stock"."outer_width_mm" > 0 and "stock"."outer_height_mm" > 0 and "stock"."wall_mm" > 0 and "stock"."length_mm" > 0 and "stock"."mass_per_metre_g" > 0 and "stock"."e_gpa" > 0),
	CONSTRAINT "stock_price" CHECK (("stock"."price_minor" is null) = ("stock"."currency" is null) and "stock"."price_minor" >= 0 and "stock"."currency" ~ '^[A-Z]{3}$')
);
--> statement-breakpoint
CREATE TABLE "stock_coupon" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"material" text NOT NULL,
	"name" text NOT NULL,
	"mass_g" double precision NOT NULL,
	"thickness_mm" double precision NOT NULL,
	"deflection_mm" double precision,
	"load_g" double precision,
	"free_length_mm" double precision,
	"slot_mm" double precision,
	"measured_by" text NOT NULL,
	"measured_at" timestamp with time zone NOT NULL,
	CONSTRAINT "stock_coupon_in_workshop" UNIQUE("id","workshop_id"),
	CONSTRAINT "stock_coupon_material" CHECK ("stock_coupon"."material" in ('paperFacedBoard', 'xps', 'epp', 'balsa', 'ply')),
	CONSTRAINT "stock_coupon_name" CHECK (length(btrim("stock_coupon"."name")) > 0),
	CONSTRAINT "stock_coupon_sizes" CHECK ("stock_coupon"."mass_g" > 0 and "stock_coupon"."thickness_mm" > 0 and "stock_coupon"."deflection_mm" > 0 and "stock_coupon"."load_g" > 0 and "stock_coupon"."free_length_mm" > 0 and "stock_coupon"."slot_mm" > 0),
	CONSTRAINT "stock_coupon_bending" CHECK (num_nonnulls("stock_coupon"."deflection_mm", "stock_coupon"."load_g", "stock_coupon"."free_length_mm") in (0, 3))
);
--> statement-breakpoint
CREATE TABLE "upload" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"sha256" text NOT NULL,
	"media_type" text NOT NULL,
	"size_bytes" bigint NOT NULL,
	"width_px" integer,
	"height_px" integer,
	"file_name" text NOT NULL,
	"is_private" boolean DEFAULT true NOT NULL,
	"uploaded_by" text NOT NULL,
	"uploaded_at" timestamp with time zone NOT NULL,
	CONSTRAINT "upload_in_workshop" UNIQUE("id","workshop_id"),
	CONSTRAINT "upload_content" UNIQUE("workshop_id","sha256"),
	CONSTRAINT "upload_sha256" CHECK ("upload"."sha256" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "upload_sizes" CHECK ("upload"."size_bytes" > 0 and "upload"."width_px" > 0 and "upload"."height_px" > 0),
	CONSTRAINT "upload_pixels" CHECK (num_nonnulls("upload"."width_px", "upload"."height_px") in (0, 2))
);
--> statement-breakpoint
CREATE TABLE "waiver" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"design_id" text NOT NULL,
	"revision_id" text,
	"draft_version" integer,
	"rule_id" text NOT NULL,
	"place_key" text NOT NULL,
	"reason" text NOT NULL,
	"waived_by" text NOT NULL,
	"waived_at" timestamp with time zone NOT NULL,
	"withdrawn_by" text,
	"withdrawn_at" timestamp with time zone,
	CONSTRAINT "waiver_source" CHECK (num_nonnulls("waiver"."revision_id", "waiver"."draft_version") = 1),
	CONSTRAINT "waiver_reason" CHECK (length(btrim("waiver"."reason")) > 0),
	CONSTRAINT "waiver_withdrawn" CHECK (num_nonnulls("waiver"."withdrawn_by", "waiver"."withdrawn_at") in (0, 2))
);
--> statement-breakpoint
CREATE TABLE "webhook" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"url" text NOT NULL,
	"secret" text NOT NULL,
	"events" text[] NOT NULL,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"disabled_at" timestamp with time zone,
	"delivered_at" timestamp with time zone,
	"failures" integer NOT NULL,
	"failure" text,
	CONSTRAINT "webhook_url" UNIQUE("workshop_id","url"),
	CONSTRAINT "webhook_address" CHECK ("webhook"."url" ~ '^https?://'),
	CONSTRAINT "webhook_secret" CHECK (length(btrim("webhook"."secret")) > 0),
	CONSTRAINT "webhook_events" CHECK (cardinality("webhook"."events") > 0),
	CONSTRAINT "webhook_failures" CHECK ("webhook"."failures" >= 0)
);
--> statement-breakpoint
ALTER TABLE "api_token" ADD CONSTRAINT "api_token_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_token" ADD CONSTRAINT "api_token_revoked_by_user_id_fk" FOREIGN KEY ("revoked_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_token" ADD CONSTRAINT "api_token_member" FOREIGN KEY ("workshop_id","user_id") REFERENCES "public"."membership"("workshop_id","user_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_reading" ADD CONSTRAINT "bench_reading_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_reading" ADD CONSTRAINT "bench_reading_test" FOREIGN KEY ("bench_test_id","workshop_id") REFERENCES "public"."bench_test"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_tested_by_user_id_fk" FOREIGN KEY ("tested_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_design" FOREIGN KEY ("design_id","workshop_id") REFERENCES "public"."design"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_build" FOREIGN KEY ("build_id","design_id") REFERENCES "public"."build"("id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_motor" FOREIGN KEY ("motor_id","workshop_id") REFERENCES "public"."component"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_pack" FOREIGN KEY ("pack_id","workshop_id") REFERENCES "public"."component"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_controller" FOREIGN KEY ("controller_id","workshop_id") REFERENCES "public"."component"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_propeller" FOREIGN KEY ("propeller_id","workshop_id") REFERENCES "public"."component"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_fan" FOREIGN KEY ("fan_id","workshop_id") REFERENCES "public"."component"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_test" ADD CONSTRAINT "bench_test_photo" FOREIGN KEY ("photo_id","workshop_id") REFERENCES "public"."upload"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "build" ADD CONSTRAINT "build_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "build" ADD CONSTRAINT "build_builder_id_user_id_fk" FOREIGN KEY ("builder_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "build" ADD CONSTRAINT "build_design" FOREIGN KEY ("design_id","workshop_id") REFERENCES "public"."design"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "build" ADD CONSTRAINT "build_revision" FOREIGN KEY ("revision_id","design_id") REFERENCES "public"."revision"("id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "build_part" ADD CONSTRAINT "build_part_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "build_part" ADD CONSTRAINT "build_part_ticked_by_user_id_fk" FOREIGN KEY ("ticked_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "build_part" ADD CONSTRAINT "build_part_build" FOREIGN KEY ("build_id","workshop_id") REFERENCES "public"."build"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "weighing" ADD CONSTRAINT "weighing_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "weighing" ADD CONSTRAINT "weighing_weighed_by_user_id_fk" FOREIGN KEY ("weighed_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "weighing" ADD CONSTRAINT "weighing_build" FOREIGN KEY ("build_id","workshop_id") REFERENCES "public"."build"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "component" ADD CONSTRAINT "component_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "component" ADD CONSTRAINT "component_created_by_user_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flight" ADD CONSTRAINT "flight_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flight" ADD CONSTRAINT "flight_pilot_id_user_id_fk" FOREIGN KEY ("pilot_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flight" ADD CONSTRAINT "flight_build" FOREIGN KEY ("build_id","workshop_id") REFERENCES "public"."build"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flight" ADD CONSTRAINT "flight_build_design" FOREIGN KEY ("build_id","design_id") REFERENCES "public"."build"("id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job" ADD CONSTRAINT "job_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job" ADD CONSTRAINT "job_requested_by_user_id_fk" FOREIGN KEY ("requested_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job" ADD CONSTRAINT "job_design" FOREIGN KEY ("design_id","workshop_id") REFERENCES "public"."design"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layout" ADD CONSTRAINT "layout_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layout" ADD CONSTRAINT "layout_created_by_user_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layout" ADD CONSTRAINT "layout_design" FOREIGN KEY ("design_id","workshop_id") REFERENCES "public"."design"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layout" ADD CONSTRAINT "layout_revision" FOREIGN KEY ("revision_id","design_id") REFERENCES "public"."revision"("id","design_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layout" ADD CONSTRAINT "layout_draft" FOREIGN KEY ("design_id","draft_version") REFERENCES "public"."draft_save"("design_id","version") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notification" ADD CONSTRAINT "notification_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notification" ADD CONSTRAINT "notification_member" FOREIGN KEY ("workshop_id","user_id") REFERENCES "public"."membership"("workshop_id","user_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_comment_id_comment_id_fk" FOREIGN KEY ("comment_id") REFERENCES "public"."comment"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_raised_by_user_id_fk" FOREIGN KEY ("raised_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_answered_by_user_id_fk" FOREIGN KEY ("answered_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_design" FOREIGN KEY ("design_id","workshop_id") REFERENCES "public"."design"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_flight" FOREIGN KEY ("flight_id","design_id") REFERENCES "public"."flight"("id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_build" FOREIGN KEY ("build_id","design_id") REFERENCES "public"."build"("id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_bench_test" FOREIGN KEY ("bench_test_id","workshop_id") REFERENCES "public"."bench_test"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "open_point" ADD CONSTRAINT "open_point_answer" FOREIGN KEY ("answered_by_revision_id","design_id") REFERENCES "public"."revision"("id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "printer_profile" ADD CONSTRAINT "printer_profile_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "printer_profile" ADD CONSTRAINT "printer_profile_measured_by_user_id_fk" FOREIGN KEY ("measured_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "printer_profile" ADD CONSTRAINT "printer_profile_confirmed_by_user_id_fk" FOREIGN KEY ("confirmed_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_created_by_user_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_revoked_by_user_id_fk" FOREIGN KEY ("revoked_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_design" FOREIGN KEY ("design_id","workshop_id") REFERENCES "public"."design"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_revision" FOREIGN KEY ("revision_id","design_id") REFERENCES "public"."revision"("id","design_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock" ADD CONSTRAINT "stock_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock" ADD CONSTRAINT "stock_left_by_layout_id_layout_id_fk" FOREIGN KEY ("left_by_layout_id") REFERENCES "public"."layout"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock" ADD CONSTRAINT "stock_created_by_user_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock" ADD CONSTRAINT "stock_measured_by_coupon" FOREIGN KEY ("coupon_id","workshop_id") REFERENCES "public"."stock_coupon"("id","workshop_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock_coupon" ADD CONSTRAINT "stock_coupon_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock_coupon" ADD CONSTRAINT "stock_coupon_measured_by_user_id_fk" FOREIGN KEY ("measured_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "upload" ADD CONSTRAINT "upload_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "upload" ADD CONSTRAINT "upload_uploaded_by_user_id_fk" FOREIGN KEY ("uploaded_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "waiver" ADD CONSTRAINT "waiver_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "waiver" ADD CONSTRAINT "waiver_waived_by_user_id_fk" FOREIGN KEY ("waived_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "waiver" ADD CONSTRAINT "waiver_withdrawn_by_user_id_fk" FOREIGN KEY ("withdrawn_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "waiver" ADD CONSTRAINT "waiver_design" FOREIGN KEY ("design_id","workshop_id") REFERENCES "public"."design"("id","workshop_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "waiver" ADD CONSTRAINT "waiver_revision" FOREIGN KEY ("revision_id","design_id") REFERENCES "public"."revision"("id","design_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "waiver" ADD CONSTRAINT "waiver_draft" FOREIGN KEY ("design_id","draft_version") REFERENCES "public"."draft_save"("design_id","version") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "webhook" ADD CONSTRAINT "webhook_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "webhook" ADD CONSTRAINT "webhook_created_by_user_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "api_token_member_idx" ON "api_token" USING btree ("workshop_id","user_id");--> statement-breakpoint
CREATE INDEX "bench_reading_workshop_idx" ON "bench_reading" USING btree ("workshop_id");--> statement-breakpoint
CREATE INDEX "bench_test_workshop_idx" ON "bench_test" USING btree ("workshop_id","tested_at");--> statement-breakpoint
CREATE INDEX "bench_test_design_idx" ON "bench_test" USING btree ("design_id");--> statement-breakpoint
CREATE INDEX "bench_test_motor_idx" ON "bench_test" USING btree ("motor_id");--> statement-breakpoint
CREATE INDEX "build_workshop_idx" ON "build" USING btree ("workshop_id","started_at");--> statement-breakpoint
CREATE INDEX "build_revision_idx" ON "build" USING btree ("revision_id");--> statement-breakpoint
CREATE INDEX "build_part_workshop_idx" ON "build_part" USING btree ("workshop_id");--> statement-breakpoint
CREATE INDEX "weighing_build_idx" ON "weighing" USING btree ("build_id","weighed_at");--> statement-breakpoint
CREATE INDEX "weighing_workshop_idx" ON "weighing" USING btree ("workshop_id");--> statement-breakpoint
CREATE UNIQUE INDEX "component_name" ON "component" USING btree ("workshop_id","kind","name") WHERE "component"."archived_at" is null;--> statement-breakpoint
CREATE INDEX "component_workshop_idx" ON "component" USING btree ("workshop_id","kind");--> statement-breakpoint
CREATE INDEX "flight_design_idx" ON "flight" USING btree ("design_id","flown_at");--> statement-breakpoint
CREATE INDEX "flight_workshop_idx" ON "flight" USING btree ("workshop_id","flown_at");--> statement-breakpoint
CREATE INDEX "job_waiting_idx" ON "job" USING btree ("created_at") WHERE "job"."state" in ('queued', 'running');--> statement-breakpoint
CREATE INDEX "job_same_work_idx" ON "job" USING btree ("workshop_id","input_hash");--> statement-breakpoint
CREATE INDEX "job_workshop_idx" ON "job" USING btree ("workshop_id","created_at");--> statement-breakpoint
CREATE INDEX "job_design_idx" ON "job" USING btree ("design_id");--> statement-breakpoint
CREATE UNIQUE INDEX "layout_chosen_revision" ON "layout" USING btree ("revision_id") WHERE "layout"."chosen";--> statement-breakpoint
CREATE UNIQUE INDEX "layout_chosen_draft" ON "layout" USING btree ("design_id","draft_version") WHERE "layout"."chosen";--> statement-breakpoint
CREATE INDEX "layout_workshop_idx" ON "layout" USING btree ("workshop_id","created_at");--> statement-breakpoint
CREATE INDEX "layout_design_idx" ON "layout" USING btree ("design_id","created_at");--> statement-breakpoint
CREATE INDEX "layout_revision_idx" ON "layout" USING btree ("revision_id");--> statement-breakpoint
CREATE INDEX "notification_member_idx" ON "notification" USING btree ("workshop_id","user_id","created_at");--> statement-breakpoint
CREATE INDEX "notification_unread_idx" ON "notification" USING btree ("user_id","created_at") WHERE "notification"."read_at" is null;--> statement-breakpoint
CREATE INDEX "open_point_unanswered_idx" ON "open_point" USING btree ("design_id") WHERE "open_point"."answered_by_revision_id" is null;--> statement-breakpoint
CREATE INDEX "open_point_answer_idx" ON "open_point" USING btree ("answered_by_revision_id");--> statement-breakpoint
CREATE INDEX "open_point_workshop_idx" ON "open_point" USING btree ("workshop_id");--> statement-breakpoint
CREATE INDEX "share_link_design_idx" ON "share_link" USING btree ("design_id");--> statement-breakpoint
CREATE INDEX "share_link_workshop_idx" ON "share_link" USING btree ("workshop_id");--> statement-breakpoint
CREATE INDEX "stock_workshop_idx" ON "stock" USING btree ("workshop_id","kind","material");--> statement-breakpoint
CREATE INDEX "stock_coupon_workshop_idx" ON "stock_coupon" USING btree ("workshop_id","measured_at");--> statement-breakpoint
CREATE INDEX "upload_workshop_idx" ON "upload" USING btree ("workshop_id","uploaded_at");--> statement-breakpoint
CREATE UNIQUE INDEX "waiver_revision_rule" ON "waiver" USING btree ("revision_id","rule_id","place_key") WHERE "waiver"."withdrawn_at" is null;--> statement-breakpoint
CREATE UNIQUE INDEX "waiver_draft_rule" ON "waiver" USING btree ("design_id","rule_id","place_key") WHERE "waiver"."withdrawn_at" is null and "waiver"."revision_id" is null;--> statement-breakpoint
CREATE INDEX "waiver_workshop_idx" ON "waiver" USING btree ("workshop_id");--> statement-breakpoint
CREATE INDEX "waiver_design_idx" ON "waiver" USING btree ("design_id");