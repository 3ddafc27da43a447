CREATE TABLE "gate" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"name" text NOT NULL,
	"ask_whom" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone,
	"revoked_by" uuid,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "gate_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "gate" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "gate_answer" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"passage_id" uuid NOT NULL,
	"check_id" text NOT NULL,
	"place" integer NOT NULL,
	"answer" jsonb NOT NULL,
	"cautions" text[] NOT NULL,
	"minutes" double precision NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "gate_answer_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "gate_answer_check" UNIQUE("organisation_id","passage_id","check_id"),
	CONSTRAINT "gate_answer_place" UNIQUE("organisation_id","passage_id","place")
);
--> statement-breakpoint
ALTER TABLE "gate_answer" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "gate_passage" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"gate_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"edition_id" uuid NOT NULL,
	"complaints" text[] NOT NULL,
	"by_name" text NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"ended_at" timestamp with time zone,
	"verdict" text,
	"reasons" jsonb,
	"of_the_compressor" double precision,
	"case_id" uuid,
	CONSTRAINT "gate_passage_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "gate_passage" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case_event" ALTER COLUMN "person_id" DROP NOT NULL;--> statement-breakpoint
ALTER TABLE "case" ALTER COLUMN "opened_by" DROP NOT NULL;--> statement-breakpoint
ALTER TABLE "finding" ALTER COLUMN "person_id" DROP NOT NULL;--> statement-breakpoint
ALTER TABLE "case_event" ADD COLUMN "by_name" text;--> statement-breakpoint
ALTER TABLE "case" ADD COLUMN "opened_by_name" text;--> statement-breakpoint
ALTER TABLE "finding" ADD COLUMN "by_name" text;--> statement-breakpoint
ALTER TABLE "gate" ADD CONSTRAINT "gate_revoked_by_person_id_fk" FOREIGN KEY ("revoked_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate" ADD CONSTRAINT "gate_created_by_person_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate" ADD CONSTRAINT "gate_organisation_id_site_id_site_organisation_id_id_fk" FOREIGN KEY ("organisation_id","site_id") REFERENCES "public"."site"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_answer" ADD CONSTRAINT "gate_answer_organisation_id_passage_id_gate_passage_organisation_id_id_fk" FOREIGN KEY ("organisation_id","passage_id") REFERENCES "public"."gate_passage"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_passage" ADD CONSTRAINT "gate_passage_organisation_id_gate_id_gate_organisation_id_id_fk" FOREIGN KEY ("organisation_id","gate_id") REFERENCES "public"."gate"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_passage" ADD CONSTRAINT "gate_passage_organisation_id_site_id_site_organisation_id_id_fk" FOREIGN KEY ("organisation_id","site_id") REFERENCES "public"."site"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_passage" ADD CONSTRAINT "gate_passage_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_passage" ADD CONSTRAINT "gate_passage_organisation_id_edition_id_edition_organisation_id_id_fk" FOREIGN KEY ("organisation_id","edition_id") REFERENCES "public"."edition"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_passage" ADD CONSTRAINT "gate_passage_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "gate_site" ON "gate" USING btree ("organisation_id","site_id","created_at");--> statement-breakpoint
CREATE INDEX "gate_passage_unit" ON "gate_passage" USING btree ("organisation_id","unit_id","ended_at");--> statement-breakpoint
CREATE INDEX "gate_passage_gate" ON "gate_passage" USING btree ("organisation_id","gate_id","started_at");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "gate" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "gate_answer" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "gate_passage" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);