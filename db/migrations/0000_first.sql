CREATE TABLE "audit" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "audit_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"actor_id" uuid,
	"verb" text NOT NULL,
	"object_kind" text NOT NULL,
	"object_id" uuid,
	"fields" text[] DEFAULT '{}' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "changes" (
	"id" uuid PRIMARY KEY NOT NULL,
	"round_id" uuid NOT NULL,
	"author_id" uuid NOT NULL,
	"correction" text NOT NULL,
	"side" text NOT NULL,
	"basis" text,
	"planned_mm" numeric(10,6),
	"planned_typed" text,
	"made_mm" numeric(10,6),
	"made_typed" text,
	"made_at" timestamp with time zone,
	"reason" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "changes_once" UNIQUE("round_id","correction","side")
);
--> statement-breakpoint
CREATE TABLE "doomed_objects" (
	"key" text PRIMARY KEY NOT NULL,
	"erase_after" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "grants" (
	"id" uuid PRIMARY KEY NOT NULL,
	"subject_user_id" uuid,
	"invited_email" text,
	"token_hash" text,
	"journal_id" uuid,
	"round_id" uuid,
	"level" text NOT NULL,
	"granted_by" uuid NOT NULL,
	"expires_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	"revoked_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "grants_tokenHash_unique" UNIQUE("token_hash"),
	CONSTRAINT "grants_one_object" CHECK (num_nonnulls("grants"."journal_id", "grants"."round_id") = 1),
	CONSTRAINT "grants_subject" CHECK (num_nonnulls("grants"."subject_user_id", "grants"."invited_email") >= 1)
);
--> statement-breakpoint
CREATE TABLE "journals" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner_id" uuid NOT NULL,
	"wearer_id" uuid NOT NULL,
	"pattern_version_id" uuid NOT NULL,
	"name" text NOT NULL,
	"settled_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"deleted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "mails" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid,
	"kind" text NOT NULL,
	"message_id" text NOT NULL,
	"to_email" text NOT NULL,
	"subject" text NOT NULL,
	"text_body" text NOT NULL,
	"html_body" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp with time zone,
	"failed_at" timestamp with time zone,
	CONSTRAINT "mails_messageId_unique" UNIQUE("message_id")
);
--> statement-breakpoint
CREATE TABLE "marks" (
	"id" uuid PRIMARY KEY NOT NULL,
	"photo_id" uuid NOT NULL,
	"author_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"severity" integer NOT NULL,
	"side" text DEFAULT 'both' NOT NULL,
	"points" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"sign" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "measurement_sets" (
	"id" uuid PRIMARY KEY NOT NULL,
	"wearer_id" uuid NOT NULL,
	"measured_on" date NOT NULL,
	"taken_alone" boolean DEFAULT false NOT NULL,
	"waist_place" text DEFAULT 'narrowest' NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"deleted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "measurements" (
	"set_id" uuid NOT NULL,
	"measure" text NOT NULL,
	"take" integer DEFAULT 1 NOT NULL,
	"value_mm" numeric(10,6) NOT NULL,
	"typed" text NOT NULL,
	CONSTRAINT "measurements_set_id_measure_take_pk" PRIMARY KEY("set_id","measure","take")
);
--> statement-breakpoint
CREATE TABLE "muslins" (
	"id" uuid PRIMARY KEY NOT NULL,
	"journal_id" uuid NOT NULL,
	"ordinal" integer NOT NULL,
	"cut" text DEFAULT 'full' NOT NULL,
	"cloth" text DEFAULT '' NOT NULL,
	"cloth_kind" text DEFAULT 'woven' NOT NULL,
	"stretch_percent" double precision DEFAULT 0 NOT NULL,
	"is_on_grain" boolean DEFAULT true NOT NULL,
	"size" text DEFAULT '' NOT NULL,
	"is_straight_from_draft" boolean DEFAULT true NOT NULL,
	"sewn_on" date,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "muslins_ordinal" UNIQUE("journal_id","ordinal")
);
--> statement-breakpoint
CREATE TABLE "pattern_measures" (
	"pattern_version_id" uuid NOT NULL,
	"size_name" text NOT NULL,
	"size_ordinal" integer NOT NULL,
	"measure" text NOT NULL,
	"kind" text NOT NULL,
	"value_mm" numeric(10,6) NOT NULL,
	"until_mm" numeric(10,6),
	"typed" text NOT NULL,
	CONSTRAINT "pattern_measures_pattern_version_id_size_name_measure_kind_pk" PRIMARY KEY("pattern_version_id","size_name","measure","kind")
);
--> statement-breakpoint
CREATE TABLE "pattern_versions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"pattern_id" uuid NOT NULL,
	"ordinal" integer NOT NULL,
	"label" text DEFAULT '' NOT NULL,
	"cloth_kind" text DEFAULT 'woven' NOT NULL,
	"stretch_percent" double precision DEFAULT 0 NOT NULL,
	"allowance_mm" numeric(10,6),
	"allowance_typed" text,
	"notes" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "pattern_versions_ordinal" UNIQUE("pattern_id","ordinal")
);
--> statement-breakpoint
CREATE TABLE "patterns" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner_id" uuid NOT NULL,
	"name" text NOT NULL,
	"maker" text DEFAULT '' NOT NULL,
	"garment" text DEFAULT 'trousers' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"deleted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "photo_landmarks" (
	"photo_id" uuid NOT NULL,
	"landmark" text NOT NULL,
	"x" double precision NOT NULL,
	"y" double precision NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "photo_landmarks_photo_id_landmark_pk" PRIMARY KEY("photo_id","landmark")
);
--> statement-breakpoint
CREATE TABLE "photos" (
	"id" uuid PRIMARY KEY NOT NULL,
	"round_id" uuid NOT NULL,
	"upload_key" uuid NOT NULL,
	"view" text NOT NULL,
	"is_mirrored" boolean DEFAULT false NOT NULL,
	"revision" integer DEFAULT 1 NOT NULL,
	"width_px" integer NOT NULL,
	"height_px" integer NOT NULL,
	"master_sha256" text NOT NULL,
	"master_bytes" integer NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"deleted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "photos_upload_key" UNIQUE("round_id","upload_key")
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer NOT NULL,
	"expire" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "readings" (
	"id" uuid PRIMARY KEY NOT NULL,
	"round_id" uuid NOT NULL,
	"case" jsonb NOT NULL,
	"output" jsonb NOT NULL,
	"engine" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "round_causes" (
	"round_id" uuid NOT NULL,
	"author_id" uuid NOT NULL,
	"cause" text NOT NULL,
	"is_present" boolean NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "round_causes_round_id_author_id_cause_pk" PRIMARY KEY("round_id","author_id","cause")
);
--> statement-breakpoint
CREATE TABLE "round_checks" (
	"round_id" uuid NOT NULL,
	"author_id" uuid NOT NULL,
	"check" text NOT NULL,
	"side" text NOT NULL,
	"outcome" text NOT NULL,
	"amount_mm" numeric(10,6),
	"amount_typed" text,
	"basis" text,
	"places" integer,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "round_checks_round_id_author_id_check_side_pk" PRIMARY KEY("round_id","author_id","check","side")
);
--> statement-breakpoint
CREATE TABLE "round_measured" (
	"id" uuid PRIMARY KEY NOT NULL,
	"round_id" uuid NOT NULL,
	"label" text NOT NULL,
	"terms" jsonb NOT NULL,
	"need_mm" numeric(10,6) NOT NULL,
	"sd_mm" numeric(10,6) NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "round_signs" (
	"round_id" uuid NOT NULL,
	"author_id" uuid NOT NULL,
	"sign" text NOT NULL,
	"side" text NOT NULL,
	"severity" integer NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "round_signs_round_id_author_id_sign_side_pk" PRIMARY KEY("round_id","author_id","sign","side")
);
--> statement-breakpoint
CREATE TABLE "rounds" (
	"id" uuid PRIMARY KEY NOT NULL,
	"journal_id" uuid NOT NULL,
	"muslin_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"begun" text DEFAULT 'new-cloth' NOT NULL,
	"worn_on" date,
	"note" text DEFAULT '' NOT NULL,
	"hangs_clean_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"deleted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "rounds_number" UNIQUE("journal_id","number")
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"user_agent" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "tokens" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"token_hash" text NOT NULL,
	"email" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "tokens_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "tombstones" (
	"id" uuid PRIMARY KEY NOT NULL,
	"object_kind" text NOT NULL,
	"hash" text NOT NULL,
	"erased_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"email_verified_at" timestamp with time zone,
	"display_name" text NOT NULL,
	"password_hash" text NOT NULL,
	"is_admin" boolean DEFAULT false NOT NULL,
	"is_pattern_maker" boolean DEFAULT false NOT NULL,
	"is_fitter" boolean DEFAULT false NOT NULL,
	"unit" text DEFAULT 'cm' NOT NULL,
	"words" text DEFAULT 'uk' NOT NULL,
	"hides_measurements" boolean DEFAULT false NOT NULL,
	"suspended_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"deleted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "users_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "wearers" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner_id" uuid NOT NULL,
	"name" text NOT NULL,
	"is_self" boolean DEFAULT true NOT NULL,
	"is_under18" boolean DEFAULT false NOT NULL,
	"fitted_for" text DEFAULT 'standing' NOT NULL,
	"worn_beneath" text DEFAULT '' NOT NULL,
	"shape" text[] DEFAULT '{}' NOT NULL,
	"consents_measure" boolean DEFAULT false NOT NULL,
	"consents_photograph" boolean DEFAULT false NOT NULL,
	"consents_share" boolean DEFAULT false NOT NULL,
	"consent_on" date,
	"consent_until" date,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"deleted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
ALTER TABLE "changes" ADD CONSTRAINT "changes_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "changes" ADD CONSTRAINT "changes_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "grants" ADD CONSTRAINT "grants_subject_user_id_users_id_fk" FOREIGN KEY ("subject_user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "grants" ADD CONSTRAINT "grants_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "grants" ADD CONSTRAINT "grants_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "grants" ADD CONSTRAINT "grants_granted_by_users_id_fk" FOREIGN KEY ("granted_by") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "grants" ADD CONSTRAINT "grants_revoked_by_users_id_fk" FOREIGN KEY ("revoked_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journals" ADD CONSTRAINT "journals_owner_id_users_id_fk" FOREIGN KEY ("owner_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journals" ADD CONSTRAINT "journals_wearer_id_wearers_id_fk" FOREIGN KEY ("wearer_id") REFERENCES "public"."wearers"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journals" ADD CONSTRAINT "journals_pattern_version_id_pattern_versions_id_fk" FOREIGN KEY ("pattern_version_id") REFERENCES "public"."pattern_versions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mails" ADD CONSTRAINT "mails_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "marks" ADD CONSTRAINT "marks_photo_id_photos_id_fk" FOREIGN KEY ("photo_id") REFERENCES "public"."photos"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "marks" ADD CONSTRAINT "marks_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurement_sets" ADD CONSTRAINT "measurement_sets_wearer_id_wearers_id_fk" FOREIGN KEY ("wearer_id") REFERENCES "public"."wearers"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurements" ADD CONSTRAINT "measurements_set_id_measurement_sets_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."measurement_sets"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "muslins" ADD CONSTRAINT "muslins_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pattern_measures" ADD CONSTRAINT "pattern_measures_pattern_version_id_pattern_versions_id_fk" FOREIGN KEY ("pattern_version_id") REFERENCES "public"."pattern_versions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pattern_versions" ADD CONSTRAINT "pattern_versions_pattern_id_patterns_id_fk" FOREIGN KEY ("pattern_id") REFERENCES "public"."patterns"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "patterns" ADD CONSTRAINT "patterns_owner_id_users_id_fk" FOREIGN KEY ("owner_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photo_landmarks" ADD CONSTRAINT "photo_landmarks_photo_id_photos_id_fk" FOREIGN KEY ("photo_id") REFERENCES "public"."photos"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "round_causes" ADD CONSTRAINT "round_causes_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "round_causes" ADD CONSTRAINT "round_causes_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "round_checks" ADD CONSTRAINT "round_checks_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "round_checks" ADD CONSTRAINT "round_checks_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "round_measured" ADD CONSTRAINT "round_measured_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "round_signs" ADD CONSTRAINT "round_signs_round_id_rounds_id_fk" FOREIGN KEY ("round_id") REFERENCES "public"."rounds"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "round_signs" ADD CONSTRAINT "round_signs_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rounds" ADD CONSTRAINT "rounds_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rounds" ADD CONSTRAINT "rounds_muslin_id_muslins_id_fk" FOREIGN KEY ("muslin_id") REFERENCES "public"."muslins"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tokens" ADD CONSTRAINT "tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wearers" ADD CONSTRAINT "wearers_owner_id_users_id_fk" FOREIGN KEY ("owner_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_object" ON "audit" USING btree ("object_id");--> statement-breakpoint
CREATE INDEX "audit_actor" ON "audit" USING btree ("actor_id","id");--> statement-breakpoint
CREATE INDEX "changes_round" ON "changes" USING btree ("round_id","id");--> statement-breakpoint
CREATE INDEX "doomed_objects_due" ON "doomed_objects" USING btree ("erase_after");--> statement-breakpoint
CREATE INDEX "grants_subject_user" ON "grants" USING btree ("subject_user_id");--> statement-breakpoint
CREATE INDEX "grants_journal" ON "grants" USING btree ("journal_id");--> statement-breakpoint
CREATE INDEX "grants_round" ON "grants" USING btree ("round_id");--> statement-breakpoint
CREATE INDEX "journals_owner" ON "journals" USING btree ("owner_id","id");--> statement-breakpoint
CREATE INDEX "journals_wearer" ON "journals" USING btree ("wearer_id");--> statement-breakpoint
CREATE INDEX "mails_user" ON "mails" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "marks_photo" ON "marks" USING btree ("photo_id","id");--> statement-breakpoint
CREATE INDEX "measurement_sets_wearer" ON "measurement_sets" USING btree ("wearer_id","measured_on");--> statement-breakpoint
CREATE INDEX "patterns_owner" ON "patterns" USING btree ("owner_id","id");--> statement-breakpoint
CREATE INDEX "photos_round" ON "photos" USING btree ("round_id","id");--> statement-breakpoint
CREATE INDEX "readings_round" ON "readings" USING btree ("round_id","id");--> statement-breakpoint
CREATE INDEX "sessions_user" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "tokens_user" ON "tokens" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "wearers_owner" ON "wearers" USING btree ("owner_id","id");