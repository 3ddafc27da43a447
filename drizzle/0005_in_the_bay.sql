CREATE TABLE "api_token" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"name" text NOT NULL,
	"token_hash" text NOT NULL,
	"ending" text NOT NULL,
	"scopes" text[] NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"last_used_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "api_token_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "api_token_hash" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "api_token" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "idempotent_answer" (
	"organisation_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"key" text NOT NULL,
	"request_hash" text NOT NULL,
	"status" integer NOT NULL,
	"result" jsonb,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "idempotent_answer_organisation_id_person_id_key_pk" PRIMARY KEY("organisation_id","person_id","key")
);
--> statement-breakpoint
ALTER TABLE "idempotent_answer" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "saved_view" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"list" text NOT NULL,
	"name" text NOT NULL,
	"query" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "saved_view_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "saved_view_name" UNIQUE("organisation_id","person_id","list","name")
);
--> statement-breakpoint
ALTER TABLE "saved_view" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case" ADD COLUMN "release_holds" text[] DEFAULT '{}' NOT NULL;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "case_id" uuid;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "check_id" text;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "state" text DEFAULT 'awaited' NOT NULL;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "refusal" text;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "width" integer;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "height" integer;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "thumbnail_key" text;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "strokes" jsonb DEFAULT '[]'::jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "taken_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "api_token" ADD CONSTRAINT "api_token_organisation_id_person_id_membership_organisation_id_person_id_fk" FOREIGN KEY ("organisation_id","person_id") REFERENCES "public"."membership"("organisation_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotent_answer" ADD CONSTRAINT "idempotent_answer_organisation_id_person_id_membership_organisation_id_person_id_fk" FOREIGN KEY ("organisation_id","person_id") REFERENCES "public"."membership"("organisation_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "saved_view" ADD CONSTRAINT "saved_view_organisation_id_person_id_membership_organisation_id_person_id_fk" FOREIGN KEY ("organisation_id","person_id") REFERENCES "public"."membership"("organisation_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "api_token_person" ON "api_token" USING btree ("organisation_id","person_id");--> statement-breakpoint
CREATE INDEX "idempotent_answer_at" ON "idempotent_answer" USING btree ("at");--> statement-breakpoint
CREATE INDEX "attachment_case" ON "attachment" USING btree ("organisation_id","case_id");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "api_token" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "idempotent_answer" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "saved_view" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);