CREATE TABLE "fitted_measures" (
	"journal_id" uuid NOT NULL,
	"measure" text NOT NULL,
	"value_mm" numeric(10,6) NOT NULL,
	"typed" text NOT NULL,
	CONSTRAINT "fitted_measures_journal_id_measure_pk" PRIMARY KEY("journal_id","measure")
);
--> statement-breakpoint
CREATE TABLE "journal_cuts" (
	"journal_id" uuid PRIMARY KEY NOT NULL,
	"sizes" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"pattern_waist" text,
	"ease" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"gauge" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"cut" text DEFAULT 'full' NOT NULL,
	"is_narrow_leg" boolean DEFAULT false NOT NULL,
	"altered" text[] DEFAULT '{}' NOT NULL,
	"left_out" text[] DEFAULT '{}' NOT NULL,
	"ticked" text[] DEFAULT '{}' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
ALTER TABLE "fitted_measures" ADD CONSTRAINT "fitted_measures_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journal_cuts" ADD CONSTRAINT "journal_cuts_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;