CREATE TABLE "fitting" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"fit_id" uuid NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"started_by" uuid NOT NULL,
	"finished_at" timestamp with time zone,
	"finished_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "fitting_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "fitting" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "install_answer" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"fitting_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"point_id" text NOT NULL,
	"answer" text NOT NULL,
	"value" text,
	"note" text,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "install_answer_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "install_answer" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "break_in_event" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"run_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"reason" text,
	"pressure_typed" text,
	"pressure_pa" double precision,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	CONSTRAINT "break_in_event_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "break_in_event" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "break_in_run" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"fit_id" uuid NOT NULL,
	"figures" jsonb NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"started_by" uuid NOT NULL,
	"ended_at" timestamp with time zone,
	"ended_by" uuid,
	"outcome" text,
	"why_stopped" text,
	"hot_check" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "break_in_run_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "break_in_run" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "release" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"released_at" timestamp with time zone NOT NULL,
	"released_by" uuid NOT NULL,
	"basis" text,
	"on" jsonb NOT NULL,
	"note" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "release_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "release" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "compressor_model" ADD COLUMN "break_in_engine_rpm" integer;--> statement-breakpoint
ALTER TABLE "compressor_model" ADD COLUMN "break_in_pressure_pa" double precision;--> statement-breakpoint
ALTER TABLE "compressor_model" ADD COLUMN "break_in_least_s" double precision;--> statement-breakpoint
ALTER TABLE "compressor_model" ADD COLUMN "break_in_most_s" double precision;--> statement-breakpoint
ALTER TABLE "compressor_model" ADD COLUMN "break_in_source" text;--> statement-breakpoint
ALTER TABLE "attachment" ADD COLUMN "place" text;--> statement-breakpoint
ALTER TABLE "fitting" ADD CONSTRAINT "fitting_started_by_person_id_fk" FOREIGN KEY ("started_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fitting" ADD CONSTRAINT "fitting_finished_by_person_id_fk" FOREIGN KEY ("finished_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fitting" ADD CONSTRAINT "fitting_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fitting" ADD CONSTRAINT "fitting_organisation_id_fit_id_fit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","fit_id") REFERENCES "public"."fit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "install_answer" ADD CONSTRAINT "install_answer_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "install_answer" ADD CONSTRAINT "install_answer_organisation_id_fitting_id_fitting_organisation_id_id_fk" FOREIGN KEY ("organisation_id","fitting_id") REFERENCES "public"."fitting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "break_in_event" ADD CONSTRAINT "break_in_event_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "break_in_event" ADD CONSTRAINT "break_in_event_organisation_id_run_id_break_in_run_organisation_id_id_fk" FOREIGN KEY ("organisation_id","run_id") REFERENCES "public"."break_in_run"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "break_in_run" ADD CONSTRAINT "break_in_run_started_by_person_id_fk" FOREIGN KEY ("started_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "break_in_run" ADD CONSTRAINT "break_in_run_ended_by_person_id_fk" FOREIGN KEY ("ended_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "break_in_run" ADD CONSTRAINT "break_in_run_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "break_in_run" ADD CONSTRAINT "break_in_run_organisation_id_fit_id_fit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","fit_id") REFERENCES "public"."fit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "release" ADD CONSTRAINT "release_released_by_person_id_fk" FOREIGN KEY ("released_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "release" ADD CONSTRAINT "release_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "release" ADD CONSTRAINT "release_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "fitting_under_way" ON "fitting" USING btree ("organisation_id","case_id") WHERE finished_at is null;--> statement-breakpoint
CREATE INDEX "fitting_case" ON "fitting" USING btree ("organisation_id","case_id","started_at");--> statement-breakpoint
CREATE INDEX "install_answer_fitting" ON "install_answer" USING btree ("organisation_id","fitting_id","at");--> statement-breakpoint
CREATE INDEX "break_in_event_run" ON "break_in_event" USING btree ("organisation_id","run_id","at");--> statement-breakpoint
CREATE UNIQUE INDEX "break_in_run_under_way" ON "break_in_run" USING btree ("organisation_id","case_id") WHERE ended_at is null;--> statement-breakpoint
CREATE INDEX "break_in_run_case" ON "break_in_run" USING btree ("organisation_id","case_id","started_at");--> statement-breakpoint
CREATE INDEX "release_case" ON "release" USING btree ("organisation_id","case_id","released_at");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "fitting" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "install_answer" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "break_in_event" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "break_in_run" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "release" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);