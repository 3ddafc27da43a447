CREATE TABLE "adopted_limit" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"check_id" text NOT NULL,
	"model_id" uuid,
	"country" char(2),
	"vehicle_kind" text,
	"built_from" date,
	"built_before" date,
	"least_si" double precision,
	"most_si" double precision,
	"below" boolean DEFAULT false NOT NULL,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"source" text NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"withdrawn_at" timestamp with time zone,
	"withdrawn_by" uuid,
	"withdrawn_reason" text,
	CONSTRAINT "adopted_limit_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "adopted_limit" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "unit_hold" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"check_id" text NOT NULL,
	"finding_id" uuid,
	"placed_at" timestamp with time zone NOT NULL,
	"passed_by" uuid,
	"passed_at" timestamp with time zone,
	"ended_at" timestamp with time zone,
	"ended" text,
	"ended_by" uuid,
	"lift_found" text,
	"lift_value_si" double precision,
	"lift_judgement" jsonb,
	"lift_basis" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "unit_hold_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "unit_hold" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "finding" ADD COLUMN "judgement" jsonb;--> statement-breakpoint
ALTER TABLE "adopted_limit" ADD CONSTRAINT "adopted_limit_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "adopted_limit" ADD CONSTRAINT "adopted_limit_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "adopted_limit" ADD CONSTRAINT "adopted_limit_withdrawn_by_person_id_fk" FOREIGN KEY ("withdrawn_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "adopted_limit" ADD CONSTRAINT "adopted_limit_organisation_id_model_id_compressor_model_organisation_id_id_fk" FOREIGN KEY ("organisation_id","model_id") REFERENCES "public"."compressor_model"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "unit_hold" ADD CONSTRAINT "unit_hold_ended_by_person_id_fk" FOREIGN KEY ("ended_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "unit_hold" ADD CONSTRAINT "unit_hold_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "unit_hold" ADD CONSTRAINT "unit_hold_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "adopted_limit_check" ON "adopted_limit" USING btree ("organisation_id","check_id");--> statement-breakpoint
CREATE UNIQUE INDEX "unit_hold_standing" ON "unit_hold" USING btree ("organisation_id","unit_id","check_id") WHERE ended_at is null;--> statement-breakpoint
CREATE INDEX "unit_hold_unit" ON "unit_hold" USING btree ("organisation_id","unit_id","placed_at");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "adopted_limit" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "unit_hold" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);