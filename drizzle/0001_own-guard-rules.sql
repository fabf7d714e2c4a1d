CREATE TABLE "guard_rules" (
	"company_id" uuid NOT NULL,
	"key" uuid DEFAULT gen_random_uuid() NOT NULL,
	"id" text NOT NULL,
	"document" jsonb NOT NULL,
	"retired" boolean DEFAULT false NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "guard_rules_company_id_key_pk" PRIMARY KEY("company_id","key"),
	CONSTRAINT "guard_rules_id_unique" UNIQUE("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "guard_rules" ADD CONSTRAINT "guard_rules_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE no action ON UPDATE no action;