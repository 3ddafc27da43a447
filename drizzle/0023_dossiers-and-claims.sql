CREATE TABLE "dossier" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"reference" text NOT NULL,
	"made_at" timestamp with time zone NOT NULL,
	"made_by" uuid NOT NULL,
	"paper" text NOT NULL,
	"left_out" jsonb NOT NULL,
	"content" jsonb NOT NULL,
	"content_hash" text NOT NULL,
	"state" text DEFAULT 'waiting' NOT NULL,
	"object_key" text,
	"bytes" integer,
	"pdf_hash" text,
	"error" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "dossier_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "dossier_number" UNIQUE("organisation_id","number")
);
--> statement-breakpoint
ALTER TABLE "dossier" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "dossier_seal" (
	"organisation_id" uuid NOT NULL,
	"dossier_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"reference" text NOT NULL,
	"hash" text NOT NULL,
	"made_at" timestamp with time zone NOT NULL,
	CONSTRAINT "dossier_seal_organisation_id_dossier_id_kind_pk" PRIMARY KEY("organisation_id","dossier_id","kind")
);
--> statement-breakpoint
ALTER TABLE "dossier_seal" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "dossier_sending" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"dossier_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"to_address" text NOT NULL,
	"words" text,
	"mail_id" uuid NOT NULL,
	"sent_by" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "dossier_sending_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "dossier_sending" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "claim" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"to_whom" text NOT NULL,
	"their_reference" text,
	"sent_on" date NOT NULL,
	"amount" double precision,
	"state" text DEFAULT 'sent' NOT NULL,
	"settled_on" date,
	"settled_amount" double precision,
	"why" text,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone,
	CONSTRAINT "claim_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "claim" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "core_credit" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"fit_id" uuid,
	"to_whom" text NOT NULL,
	"sent_on" date NOT NULL,
	"expected_amount" double precision,
	"state" text DEFAULT 'sent' NOT NULL,
	"settled_on" date,
	"credited_amount" double precision,
	"why" text,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone,
	CONSTRAINT "core_credit_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "core_credit" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "organisation" ADD COLUMN "next_dossier_number" integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE "dossier" ADD CONSTRAINT "dossier_made_by_person_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossier" ADD CONSTRAINT "dossier_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossier_seal" ADD CONSTRAINT "dossier_seal_organisation_id_dossier_id_dossier_organisation_id_id_fk" FOREIGN KEY ("organisation_id","dossier_id") REFERENCES "public"."dossier"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossier_sending" ADD CONSTRAINT "dossier_sending_sent_by_person_id_fk" FOREIGN KEY ("sent_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossier_sending" ADD CONSTRAINT "dossier_sending_organisation_id_dossier_id_dossier_organisation_id_id_fk" FOREIGN KEY ("organisation_id","dossier_id") REFERENCES "public"."dossier"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossier_sending" ADD CONSTRAINT "dossier_sending_organisation_id_mail_id_mail_organisation_id_id_fk" FOREIGN KEY ("organisation_id","mail_id") REFERENCES "public"."mail"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "claim" ADD CONSTRAINT "claim_created_by_person_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "claim" ADD CONSTRAINT "claim_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "core_credit" ADD CONSTRAINT "core_credit_created_by_person_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "core_credit" ADD CONSTRAINT "core_credit_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "core_credit" ADD CONSTRAINT "core_credit_organisation_id_fit_id_fit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","fit_id") REFERENCES "public"."fit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "dossier_case" ON "dossier" USING btree ("organisation_id","case_id","made_at");--> statement-breakpoint
CREATE INDEX "dossier_seal_hash" ON "dossier_seal" USING btree ("hash");--> statement-breakpoint
CREATE INDEX "dossier_sending_case" ON "dossier_sending" USING btree ("organisation_id","case_id","at");--> statement-breakpoint
CREATE INDEX "claim_case" ON "claim" USING btree ("organisation_id","case_id","sent_on");--> statement-breakpoint
CREATE INDEX "core_credit_case" ON "core_credit" USING btree ("organisation_id","case_id","sent_on");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "dossier" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "dossier_seal" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "dossier_sending" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "claim" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "core_credit" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);