CREATE TABLE "baseline_figure" (
	"organisation_id" uuid NOT NULL,
	"set_id" uuid NOT NULL,
	"figure" text NOT NULL,
	"value_si" double precision NOT NULL,
	"error_si" double precision NOT NULL,
	"value_typed" text NOT NULL,
	"error_typed" text,
	"unit" text NOT NULL,
	CONSTRAINT "baseline_figure_organisation_id_set_id_figure_pk" PRIMARY KEY("organisation_id","set_id","figure")
);
--> statement-breakpoint
ALTER TABLE "baseline_figure" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "baseline_set" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"fit_id" uuid,
	"model_id" uuid,
	"occasion" text NOT NULL,
	"measured_on" date NOT NULL,
	"conditions" jsonb NOT NULL,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"note" text,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"hidden_at" timestamp with time zone,
	CONSTRAINT "baseline_set_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "baseline_set" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "finding" ADD COLUMN "baseline" jsonb;--> statement-breakpoint
ALTER TABLE "baseline_figure" ADD CONSTRAINT "baseline_figure_organisation_id_set_id_baseline_set_organisation_id_id_fk" FOREIGN KEY ("organisation_id","set_id") REFERENCES "public"."baseline_set"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "baseline_set" ADD CONSTRAINT "baseline_set_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "baseline_set" ADD CONSTRAINT "baseline_set_organisation_id_fit_id_fit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","fit_id") REFERENCES "public"."fit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "baseline_set" ADD CONSTRAINT "baseline_set_organisation_id_model_id_compressor_model_organisation_id_id_fk" FOREIGN KEY ("organisation_id","model_id") REFERENCES "public"."compressor_model"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "baseline_set_unit" ON "baseline_set" USING btree ("organisation_id","unit_id","measured_on");--> statement-breakpoint
CREATE INDEX "baseline_set_model" ON "baseline_set" USING btree ("organisation_id","model_id");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "baseline_figure" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "baseline_set" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);