CREATE TABLE "account" (
	"id" text PRIMARY KEY NOT NULL,
	"account_id" text NOT NULL,
	"provider_id" text NOT NULL,
	"user_id" text NOT NULL,
	"access_token" text,
	"refresh_token" text,
	"id_token" text,
	"access_token_expires_at" timestamp with time zone,
	"refresh_token_expires_at" timestamp with time zone,
	"scope" text,
	"password" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "rate_limit" (
	"id" text PRIMARY KEY NOT NULL,
	"key" text NOT NULL,
	"count" integer NOT NULL,
	"last_request" bigint NOT NULL,
	CONSTRAINT "rate_limit_key_unique" UNIQUE("key")
);
--> statement-breakpoint
CREATE TABLE "session" (
	"id" text PRIMARY KEY NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"token" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ip_address" text,
	"user_agent" text,
	"user_id" text NOT NULL,
	CONSTRAINT "session_token_unique" UNIQUE("token")
);
--> statement-breakpoint
CREATE TABLE "user" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"email_verified" boolean DEFAULT false NOT NULL,
	"image" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "user_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "verification" (
	"id" text PRIMARY KEY NOT NULL,
	"identifier" text NOT NULL,
	"value" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "design" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"name" text NOT NULL,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"updated_at" timestamp with time zone NOT NULL,
	"archived_at" timestamp with time zone,
	"draft_version" integer NOT NULL,
	"span_mm" double precision NOT NULL,
	"mass_g" double precision,
	"thumbnail" jsonb NOT NULL
);
--> statement-breakpoint
CREATE TABLE "draft_save" (
	"id" text PRIMARY KEY NOT NULL,
	"design_id" text NOT NULL,
	"version" integer NOT NULL,
	"base" integer,
	"body" text NOT NULL,
	"sha256" text NOT NULL,
	"author_id" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "draft_save_version" UNIQUE("design_id","version"),
	CONSTRAINT "draft_save_base" CHECK ("draft_save"."base" is null or "draft_save"."base" < "draft_save"."version")
);
--> statement-breakpoint
CREATE TABLE "audit_event" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text,
	"actor_id" text NOT NULL,
	"act" text NOT NULL,
	"subject_id" text NOT NULL,
	"detail" jsonb NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "idempotency_key" (
	"user_id" text NOT NULL,
	"key" text NOT NULL,
	"request_hash" text NOT NULL,
	"answer" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "idempotency_key_user_id_key_pk" PRIMARY KEY("user_id","key")
);
--> statement-breakpoint
CREATE TABLE "mail_outbox" (
	"id" text PRIMARY KEY NOT NULL,
	"recipient" text NOT NULL,
	"kind" text NOT NULL,
	"subject" text NOT NULL,
	"text" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"sent_at" timestamp with time zone,
	"tried_at" timestamp with time zone,
	"attempts" integer DEFAULT 0 NOT NULL,
	"failure" text
);
--> statement-breakpoint
CREATE TABLE "print_log" (
	"id" text PRIMARY KEY NOT NULL,
	"design_id" text NOT NULL,
	"revision_id" text,
	"draft_version" integer,
	"paper" text NOT NULL,
	"pages" integer NOT NULL,
	"pdf_sha256" text NOT NULL,
	"printed_by" text NOT NULL,
	"printed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "print_log_source" CHECK (("print_log"."revision_id" is null) <> ("print_log"."draft_version" is null))
);
--> statement-breakpoint
CREATE TABLE "seed_run" (
	"name" text PRIMARY KEY NOT NULL,
	"ran_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "throttle" (
	"key" text PRIMARY KEY NOT NULL,
	"count" integer NOT NULL,
	"ends_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "comment" (
	"id" text PRIMARY KEY NOT NULL,
	"thread_id" text NOT NULL,
	"number" integer NOT NULL,
	"author_id" text NOT NULL,
	"text" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "comment_number" UNIQUE("thread_id","number")
);
--> statement-breakpoint
CREATE TABLE "comment_thread" (
	"id" text PRIMARY KEY NOT NULL,
	"revision_id" text NOT NULL,
	"number" integer NOT NULL,
	"anchor" jsonb NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"closed_by" text,
	"closed_at" timestamp with time zone,
	CONSTRAINT "comment_thread_number" UNIQUE("revision_id","number"),
	CONSTRAINT "comment_thread_state" CHECK ("comment_thread"."state" in ('open', 'closed')),
	CONSTRAINT "comment_thread_closed" CHECK (("comment_thread"."state" = 'closed') = ("comment_thread"."closed_by" is not null))
);
--> statement-breakpoint
CREATE TABLE "verdict" (
	"id" text PRIMARY KEY NOT NULL,
	"revision_id" text NOT NULL,
	"user_id" text NOT NULL,
	"number" integer NOT NULL,
	"verdict" text NOT NULL,
	"note" text NOT NULL,
	"counts" boolean NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "verdict_number" UNIQUE("revision_id","number"),
	CONSTRAINT "verdict_kind" CHECK ("verdict"."verdict" in ('goodToCut', 'hold', 'seen')),
	CONSTRAINT "verdict_hold_has_note" CHECK ("verdict"."verdict" <> 'hold' or length("verdict"."note") > 0)
);
--> statement-breakpoint
CREATE TABLE "artefact" (
	"id" text PRIMARY KEY NOT NULL,
	"revision_id" text NOT NULL,
	"kind" text NOT NULL,
	"engine" text NOT NULL,
	"body" "bytea" NOT NULL,
	"sha256" text NOT NULL,
	CONSTRAINT "artefact_revision_kind" UNIQUE("revision_id","kind"),
	CONSTRAINT "artefact_kind" CHECK ("artefact"."kind" in ('figures', 'parts', 'layout'))
);
--> statement-breakpoint
CREATE TABLE "revision" (
	"id" text PRIMARY KEY NOT NULL,
	"design_id" text NOT NULL,
	"number" integer NOT NULL,
	"parent_revision_id" text,
	"draft_version" integer NOT NULL,
	"body" text NOT NULL,
	"sha256" text NOT NULL,
	"engine" text NOT NULL,
	"state" text DEFAULT 'released' NOT NULL,
	"reason" text NOT NULL,
	"expected_effect" text NOT NULL,
	"released_by" text NOT NULL,
	"released_at" timestamp with time zone NOT NULL,
	"span_mm" double precision,
	"wing_area_dm2" double precision,
	"all_up_mass_g" double precision,
	"static_margin_pct" double precision,
	CONSTRAINT "revision_number" UNIQUE("design_id","number"),
	CONSTRAINT "revision_state" CHECK ("revision"."state" in ('released', 'goodToCut', 'held'))
);
--> statement-breakpoint
CREATE TABLE "invitation" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"token_hash" text NOT NULL,
	"email" text NOT NULL,
	"roles" text[] NOT NULL,
	"invited_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"accepted_at" timestamp with time zone,
	"accepted_by" text,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "invitation_token_hash_unique" UNIQUE("token_hash"),
	CONSTRAINT "invitation_roles" CHECK (cardinality("roles") > 0 and "roles" <@ array['owner','designer','builder','reviewer']::text[])
);
--> statement-breakpoint
CREATE TABLE "membership" (
	"id" text PRIMARY KEY NOT NULL,
	"workshop_id" text NOT NULL,
	"user_id" text NOT NULL,
	"roles" text[] NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "membership_workshop_user" UNIQUE("workshop_id","user_id"),
	CONSTRAINT "membership_roles" CHECK (cardinality("roles") > 0 and "roles" <@ array['owner','designer','builder','reviewer']::text[])
);
--> statement-breakpoint
CREATE TABLE "workshop" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "account" ADD CONSTRAINT "account_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "session" ADD CONSTRAINT "session_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "design" ADD CONSTRAINT "design_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "design" ADD CONSTRAINT "design_created_by_user_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "draft_save" ADD CONSTRAINT "draft_save_design_id_design_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."design"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "draft_save" ADD CONSTRAINT "draft_save_author_id_user_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotency_key" ADD CONSTRAINT "idempotency_key_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "print_log" ADD CONSTRAINT "print_log_design_id_design_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."design"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "print_log" ADD CONSTRAINT "print_log_revision_id_revision_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revision"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "print_log" ADD CONSTRAINT "print_log_printed_by_user_id_fk" FOREIGN KEY ("printed_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment" ADD CONSTRAINT "comment_thread_id_comment_thread_id_fk" FOREIGN KEY ("thread_id") REFERENCES "public"."comment_thread"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment" ADD CONSTRAINT "comment_author_id_user_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment_thread" ADD CONSTRAINT "comment_thread_revision_id_revision_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revision"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment_thread" ADD CONSTRAINT "comment_thread_created_by_user_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment_thread" ADD CONSTRAINT "comment_thread_closed_by_user_id_fk" FOREIGN KEY ("closed_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "verdict" ADD CONSTRAINT "verdict_revision_id_revision_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revision"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "verdict" ADD CONSTRAINT "verdict_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "artefact" ADD CONSTRAINT "artefact_revision_id_revision_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revision"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revision" ADD CONSTRAINT "revision_design_id_design_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."design"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revision" ADD CONSTRAINT "revision_parent_revision_id_revision_id_fk" FOREIGN KEY ("parent_revision_id") REFERENCES "public"."revision"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revision" ADD CONSTRAINT "revision_released_by_user_id_fk" FOREIGN KEY ("released_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitation" ADD CONSTRAINT "invitation_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitation" ADD CONSTRAINT "invitation_invited_by_user_id_fk" FOREIGN KEY ("invited_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitation" ADD CONSTRAINT "invitation_accepted_by_user_id_fk" FOREIGN KEY ("accepted_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_workshop_id_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshop"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "account_user_idx" ON "account" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "session_user_idx" ON "session" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "verification_identifier_idx" ON "verification" USING btree ("identifier");--> statement-breakpoint
CREATE INDEX "design_workshop_idx" ON "design" USING btree ("workshop_id","updated_at");--> statement-breakpoint
CREATE INDEX "audit_event_workshop_idx" ON "audit_event" USING btree ("workshop_id","at");--> statement-breakpoint
CREATE INDEX "idempotency_key_created_idx" ON "idempotency_key" USING btree ("created_at");--> statement-breakpoint
CREATE INDEX "mail_outbox_created_idx" ON "mail_outbox" USING btree ("created_at");--> statement-breakpoint
CREATE INDEX "print_log_design_idx" ON "print_log" USING btree ("design_id","printed_at");--> statement-breakpoint
CREATE INDEX "throttle_ends_idx" ON "throttle" USING btree ("ends_at");--> statement-breakpoint
CREATE INDEX "invitation_workshop_idx" ON "invitation" USING btree ("workshop_id");--> statement-breakpoint
CREATE INDEX "membership_user_idx" ON "membership" USING btree ("user_id");