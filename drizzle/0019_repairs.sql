CREATE TABLE "repair" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"remedy_id" text NOT NULL,
	"chosen_at" timestamp with time zone NOT NULL,
	"chosen_by" uuid NOT NULL,
	"why_before" text,
	"planned_on" date,
	"assigned_to" uuid,
	"ended_at" timestamp with time zone,
	"ended_by" uuid,
	"outcome" text,
	"why_dropped" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "repair_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "repair" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "repair_step" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"repair_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"step" integer NOT NULL,
	"mark" text NOT NULL,
	"value" text,
	"note" text,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "repair_step_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "repair_step" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "repair" ADD CONSTRAINT "repair_chosen_by_person_id_fk" FOREIGN KEY ("chosen_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "repair" ADD CONSTRAINT "repair_assigned_to_person_id_fk" FOREIGN KEY ("assigned_to") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "repair" ADD CONSTRAINT "repair_ended_by_person_id_fk" FOREIGN KEY ("ended_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "repair" ADD CONSTRAINT "repair_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "repair_step" ADD CONSTRAINT "repair_step_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "repair_step" ADD CONSTRAINT "repair_step_organisation_id_repair_id_repair_organisation_id_id_fk" FOREIGN KEY ("organisation_id","repair_id") REFERENCES "public"."repair"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "repair_at_hand" ON "repair" USING btree ("organisation_id","case_id","remedy_id") WHERE ended_at is null;--> statement-breakpoint
CREATE INDEX "repair_case" ON "repair" USING btree ("organisation_id","case_id","chosen_at");--> statement-breakpoint
CREATE INDEX "repair_step_repair" ON "repair_step" USING btree ("organisation_id","repair_id","at");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "repair" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "repair_step" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);