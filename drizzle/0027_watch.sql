CREATE TABLE "watch" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"cause_id" text NOT NULL,
	"plan" jsonb NOT NULL,
	"begin" jsonb NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"started_by" uuid NOT NULL,
	"odometer_m" double precision,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"ended_at" timestamp with time zone,
	"ended_by" uuid,
	"outcome" text,
	"why" text,
	"proof" text,
	"comeback_case_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "watch_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "watch" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "watch_link" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"watch_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"check_id" text NOT NULL,
	"for_whom" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	"revoked_by" uuid,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "watch_link_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "watch_link" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "watch_reading" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"watch_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"check_id" text NOT NULL,
	"kind" text NOT NULL,
	"shares" jsonb NOT NULL,
	"value_typed" text,
	"unit" text,
	"value_si" double precision,
	"judgement" jsonb,
	"verdict" text NOT NULL,
	"note" text,
	"odometer_m" double precision,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"person_id" uuid,
	"by_name" text,
	"link_id" uuid,
	"at" timestamp with time zone NOT NULL,
	"taken_back_at" timestamp with time zone,
	"taken_back_by" uuid,
	"taken_back_why" text,
	CONSTRAINT "watch_reading_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "watch_reading" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case" ADD COLUMN "comeback_of" uuid;--> statement-breakpoint
ALTER TABLE "watch" ADD CONSTRAINT "watch_started_by_person_id_fk" FOREIGN KEY ("started_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch" ADD CONSTRAINT "watch_ended_by_person_id_fk" FOREIGN KEY ("ended_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch" ADD CONSTRAINT "watch_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch" ADD CONSTRAINT "watch_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch" ADD CONSTRAINT "watch_comeback_case" FOREIGN KEY ("organisation_id","comeback_case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch_link" ADD CONSTRAINT "watch_link_revoked_by_person_id_fk" FOREIGN KEY ("revoked_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch_link" ADD CONSTRAINT "watch_link_created_by_person_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch_link" ADD CONSTRAINT "watch_link_organisation_id_watch_id_watch_organisation_id_id_fk" FOREIGN KEY ("organisation_id","watch_id") REFERENCES "public"."watch"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch_reading" ADD CONSTRAINT "watch_reading_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch_reading" ADD CONSTRAINT "watch_reading_taken_back_by_person_id_fk" FOREIGN KEY ("taken_back_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch_reading" ADD CONSTRAINT "watch_reading_organisation_id_watch_id_watch_organisation_id_id_fk" FOREIGN KEY ("organisation_id","watch_id") REFERENCES "public"."watch"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watch_reading" ADD CONSTRAINT "watch_reading_organisation_id_link_id_watch_link_organisation_id_id_fk" FOREIGN KEY ("organisation_id","link_id") REFERENCES "public"."watch_link"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "watch_under_way" ON "watch" USING btree ("organisation_id","case_id") WHERE ended_at is null;--> statement-breakpoint
CREATE INDEX "watch_case" ON "watch" USING btree ("organisation_id","case_id","started_at");--> statement-breakpoint
CREATE INDEX "watch_link_watch" ON "watch_link" USING btree ("organisation_id","watch_id","created_at");--> statement-breakpoint
CREATE INDEX "watch_reading_watch" ON "watch_reading" USING btree ("organisation_id","watch_id","at");--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_comeback_of" FOREIGN KEY ("organisation_id","comeback_of") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "watch" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "watch_link" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "watch_reading" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);