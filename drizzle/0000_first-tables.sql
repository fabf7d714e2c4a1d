CREATE TABLE "companies" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"length_unit" text NOT NULL,
	"force_unit" text NOT NULL,
	"fraction" integer DEFAULT 16 NOT NULL,
	"keep_photo_place" boolean DEFAULT false NOT NULL,
	"last_job_number" integer DEFAULT 0 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "cables" (
	"company_id" uuid NOT NULL,
	"key" uuid DEFAULT gen_random_uuid() NOT NULL,
	"id" text NOT NULL,
	"document" jsonb NOT NULL,
	"retired" boolean DEFAULT false NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "cables_company_id_key_pk" PRIMARY KEY("company_id","key"),
	CONSTRAINT "cables_id_unique" UNIQUE("company_id","id")
);
--> statement-breakpoint
CREATE TABLE "fittings" (
	"company_id" uuid NOT NULL,
	"key" uuid DEFAULT gen_random_uuid() NOT NULL,
	"id" text NOT NULL,
	"document" jsonb NOT NULL,
	"retired" boolean DEFAULT false NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "fittings_company_id_key_pk" PRIMARY KEY("company_id","key"),
	CONSTRAINT "fittings_id_unique" UNIQUE("company_id","id")
);
--> statement-breakpoint
CREATE TABLE "house_rules" (
	"company_id" uuid PRIMARY KEY NOT NULL,
	"document" jsonb NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "invitations" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"company_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	CONSTRAINT "invitations_person_id_unique" UNIQUE("person_id")
);
--> statement-breakpoint
CREATE TABLE "jobs" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"number" integer NOT NULL,
	"title" text NOT NULL,
	"customer" text NOT NULL,
	"site" text NOT NULL,
	"stage" text DEFAULT 'measure' NOT NULL,
	"due" date,
	"person_id" uuid,
	"notes" text DEFAULT '' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"searched" text GENERATED ALWAYS AS (lower(number::text || ' ' || title || ' ' || customer || ' ' || site)) STORED NOT NULL,
	CONSTRAINT "jobs_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
CREATE TABLE "people" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"roles" text[] NOT NULL,
	"password_hash" text,
	"disabled_at" timestamp with time zone,
	"last_sign_in_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "people_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
CREATE TABLE "photos" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"survey_id" uuid NOT NULL,
	"survey_photo_id" text NOT NULL,
	"name" text NOT NULL,
	"width" integer NOT NULL,
	"height" integer NOT NULL,
	"bytes" integer NOT NULL,
	"taken_at" text,
	"focal_length_35" double precision,
	"latitude" double precision,
	"longitude" double precision,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "photos_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "photos_survey_photo_unique" UNIQUE("company_id","survey_id","survey_photo_id")
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id_hash" text PRIMARY KEY NOT NULL,
	"company_id" uuid,
	"person_id" uuid,
	"data" jsonb NOT NULL,
	"expires_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "survey_changes" (
	"company_id" uuid NOT NULL,
	"survey_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"change_id" uuid NOT NULL,
	"operation" jsonb NOT NULL,
	"person_id" uuid NOT NULL,
	"person_name" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "survey_changes_company_id_survey_id_revision_pk" PRIMARY KEY("company_id","survey_id","revision"),
	CONSTRAINT "survey_changes_change_unique" UNIQUE("company_id","survey_id","change_id")
);
--> statement-breakpoint
CREATE TABLE "surveys" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"job_id" uuid NOT NULL,
	"revision" integer DEFAULT 0 NOT NULL,
	"document" jsonb NOT NULL,
	"title" text NOT NULL,
	"posts" integer NOT NULL,
	"bays" integer NOT NULL,
	"gaps" integer NOT NULL,
	"first_photo" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "surveys_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "cables" ADD CONSTRAINT "cables_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fittings" ADD CONSTRAINT "fittings_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "house_rules" ADD CONSTRAINT "house_rules_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_company_id_person_id_people_company_id_id_fk" FOREIGN KEY ("company_id","person_id") REFERENCES "public"."people"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_company_id_person_id_people_company_id_id_fk" FOREIGN KEY ("company_id","person_id") REFERENCES "public"."people"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_company_id_survey_id_surveys_company_id_id_fk" FOREIGN KEY ("company_id","survey_id") REFERENCES "public"."surveys"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_company_id_person_id_people_company_id_id_fk" FOREIGN KEY ("company_id","person_id") REFERENCES "public"."people"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_changes" ADD CONSTRAINT "survey_changes_company_id_survey_id_surveys_company_id_id_fk" FOREIGN KEY ("company_id","survey_id") REFERENCES "public"."surveys"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_changes" ADD CONSTRAINT "survey_changes_company_id_person_id_people_company_id_id_fk" FOREIGN KEY ("company_id","person_id") REFERENCES "public"."people"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surveys" ADD CONSTRAINT "surveys_company_id_job_id_jobs_company_id_id_fk" FOREIGN KEY ("company_id","job_id") REFERENCES "public"."jobs"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "jobs_number" ON "jobs" USING btree ("company_id","number");--> statement-breakpoint
CREATE INDEX "jobs_updated" ON "jobs" USING btree ("company_id","updated_at","id");--> statement-breakpoint
CREATE INDEX "jobs_due" ON "jobs" USING btree ("company_id",coalesce("due", 'infinity'::date),"id");--> statement-breakpoint
CREATE INDEX "jobs_stage" ON "jobs" USING btree ("company_id","stage","updated_at","id");--> statement-breakpoint
CREATE INDEX "jobs_person" ON "jobs" USING btree ("company_id","person_id","updated_at","id");--> statement-breakpoint
CREATE UNIQUE INDEX "people_id" ON "people" USING btree ("id");--> statement-breakpoint
CREATE UNIQUE INDEX "people_email" ON "people" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "sessions_person" ON "sessions" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "sessions_expiry" ON "sessions" USING btree ("expires_at");--> statement-breakpoint
CREATE INDEX "surveys_job" ON "surveys" USING btree ("company_id","job_id");