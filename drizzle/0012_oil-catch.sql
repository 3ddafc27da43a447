CREATE TABLE "oil_catch" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"check_id" text NOT NULL,
	"stage" jsonb NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"started_by" uuid NOT NULL,
	"engine_s" double precision,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"place" text,
	"remind_every_days" integer,
	"remind_at" timestamp with time zone,
	"ended_at" timestamp with time zone,
	"ended_by" uuid,
	"ended_why" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "oil_catch_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "oil_catch" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "oil_weighing" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"catch_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"mass_kg" double precision NOT NULL,
	"mass_error_kg" double precision NOT NULL,
	"engine_s" double precision,
	"ran_s" double precision NOT NULL,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"note" text,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"finding_id" uuid NOT NULL,
	"taken_back_at" timestamp with time zone,
	"taken_back_by" uuid,
	"taken_back_why" text,
	"taken_back_finding_id" uuid,
	CONSTRAINT "oil_weighing_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "oil_weighing" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "oil_catch" ADD CONSTRAINT "oil_catch_started_by_person_id_fk" FOREIGN KEY ("started_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "oil_catch" ADD CONSTRAINT "oil_catch_ended_by_person_id_fk" FOREIGN KEY ("ended_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "oil_catch" ADD CONSTRAINT "oil_catch_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "oil_weighing" ADD CONSTRAINT "oil_weighing_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "oil_weighing" ADD CONSTRAINT "oil_weighing_taken_back_by_person_id_fk" FOREIGN KEY ("taken_back_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "oil_weighing" ADD CONSTRAINT "oil_weighing_organisation_id_catch_id_oil_catch_organisation_id_id_fk" FOREIGN KEY ("organisation_id","catch_id") REFERENCES "public"."oil_catch"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "oil_catch_under_way" ON "oil_catch" USING btree ("organisation_id","case_id","check_id") WHERE ended_at is null;--> statement-breakpoint
CREATE INDEX "oil_catch_case" ON "oil_catch" USING btree ("organisation_id","case_id","started_at");--> statement-breakpoint
CREATE INDEX "oil_weighing_catch" ON "oil_weighing" USING btree ("organisation_id","catch_id","at");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "oil_catch" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "oil_weighing" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);