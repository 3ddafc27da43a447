CREATE TABLE "organisation" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"country" char(2) NOT NULL,
	"currency" char(3) NOT NULL,
	"labour_rate_per_hour" double precision,
	"next_case_number" integer DEFAULT 1 NOT NULL,
	"is_demo" boolean DEFAULT false NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "organisation" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "site_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "site_name" UNIQUE("organisation_id","name")
);
--> statement-breakpoint
ALTER TABLE "site" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "attempt" (
	"key" text NOT NULL,
	"window_start" timestamp with time zone NOT NULL,
	"count" integer NOT NULL,
	CONSTRAINT "attempt_key_window_start_pk" PRIMARY KEY("key","window_start")
);
--> statement-breakpoint
CREATE TABLE "invitation" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"email" text,
	"roles" text[] NOT NULL,
	"site_id" uuid,
	"token_hash" text,
	"expires_at" timestamp with time zone NOT NULL,
	"accepted_at" timestamp with time zone,
	"accepted_by" uuid,
	"withdrawn_at" timestamp with time zone,
	"invited_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "invitation_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "invitation_token" UNIQUE("token_hash"),
	CONSTRAINT "invitation_email" UNIQUE("organisation_id","email"),
	CONSTRAINT "invitation_roles" CHECK (cardinality(roles) > 0 and roles <@ array['technician', 'engineer', 'manager', 'trainer', 'administrator'])
);
--> statement-breakpoint
ALTER TABLE "invitation" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "membership" (
	"organisation_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"roles" text[] NOT NULL,
	"site_id" uuid,
	"may_release" boolean DEFAULT false NOT NULL,
	"release_basis" text,
	"ended_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "membership_organisation_id_person_id_pk" PRIMARY KEY("organisation_id","person_id"),
	CONSTRAINT "membership_roles" CHECK (cardinality(roles) > 0 and roles <@ array['technician', 'engineer', 'manager', 'trainer', 'administrator']),
	CONSTRAINT "membership_release_has_basis" CHECK (not may_release or release_basis is not null)
);
--> statement-breakpoint
ALTER TABLE "membership" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "password_reset" (
	"id" uuid PRIMARY KEY NOT NULL,
	"person_id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "password_reset_token" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "password_reset" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "person" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text,
	"session_version" integer DEFAULT 1 NOT NULL,
	"unit_preferences" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"erased_at" timestamp with time zone,
	CONSTRAINT "person_email" UNIQUE("email")
);
--> statement-breakpoint
ALTER TABLE "person" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "compressor_model" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"displacement_m_3" double precision,
	"bore_m" double precision,
	"stroke_m" double precision,
	"cylinders" integer,
	"drive_ratio" double precision,
	"cooling" text,
	"unloading" text,
	"intake_type" text,
	"drain_opening" text,
	"oil_feed_place" text,
	"drive_gear" text,
	"port_bore_m" double precision,
	"line_size_m" double precision,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"note" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone,
	"hidden_at" timestamp with time zone,
	"created_by" uuid,
	CONSTRAINT "compressor_model_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "compressor_model_name" UNIQUE("organisation_id","name")
);
--> statement-breakpoint
ALTER TABLE "compressor_model" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "unit" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"fleet_number" text NOT NULL,
	"vocation" text,
	"country" char(2) NOT NULL,
	"vehicle_kind" text NOT NULL,
	"built_on" date,
	"engine_family" text,
	"reservoir_m_3" double precision,
	"required_reservoir_m_3" double precision,
	"reservoir_count" integer,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"note" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone,
	"hidden_at" timestamp with time zone,
	"created_by" uuid,
	CONSTRAINT "unit_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "unit_fleet_number" UNIQUE("organisation_id","fleet_number")
);
--> statement-breakpoint
ALTER TABLE "unit" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "unit_reading" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"read_on" date NOT NULL,
	"odometer_m" double precision,
	"engine_s" double precision,
	"odometer_replaced" boolean DEFAULT false NOT NULL,
	"engine_hours_replaced" boolean DEFAULT false NOT NULL,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"source" text NOT NULL,
	"note" text,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "unit_reading_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "unit_reading" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "fit" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"model_id" uuid NOT NULL,
	"condition" text NOT NULL,
	"installed_on" date NOT NULL,
	"installed_odometer_m" double precision,
	"installed_engine_s" double precision,
	"removed_on" date,
	"removed_odometer_m" double precision,
	"removed_engine_s" double precision,
	"why_out" text,
	"sealant" text,
	"discharge_line" text,
	"governor" text,
	"feed_line" text,
	"intake_hose" text,
	"dryer_cartridge" text,
	"system_cleaned" text,
	"break_in_run" text,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"note" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone,
	"hidden_at" timestamp with time zone,
	"created_by" uuid,
	CONSTRAINT "fit_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "fit" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "edition" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"number" integer NOT NULL,
	"rulebook" jsonb NOT NULL,
	"upstream_number" integer,
	"parent_id" uuid,
	"reason" text NOT NULL,
	"published_by" uuid,
	"published_at" timestamp with time zone NOT NULL,
	CONSTRAINT "edition_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "edition_number" UNIQUE("organisation_id","number")
);
--> statement-breakpoint
ALTER TABLE "edition" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "upstream_edition" (
	"number" integer PRIMARY KEY NOT NULL,
	"rulebook" jsonb NOT NULL,
	"digest" text NOT NULL,
	"published_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "call" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"main_cause" text NOT NULL,
	"contributing_causes" text[] NOT NULL,
	"sureness" text NOT NULL,
	"proof" text DEFAULT 'none' NOT NULL,
	"why_not_leading" text,
	"unlisted_cause" text,
	"run_id" uuid,
	"supersedes" uuid,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "call_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "call" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "case_event" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"reason" text,
	"call_id" uuid,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "case_event_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "case_event" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "case" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"number" integer NOT NULL,
	"unit_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"fit_id" uuid,
	"edition_id" uuid NOT NULL,
	"status" text DEFAULT 'open' NOT NULL,
	"complaints" text[] NOT NULL,
	"complaint_words" text,
	"odometer_m" double precision,
	"engine_s" double precision,
	"as_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"vehicle_state" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"assigned_to" uuid,
	"opened_by" uuid NOT NULL,
	"opened_at" timestamp with time zone NOT NULL,
	"closed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "case_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "case_number" UNIQUE("organisation_id","number")
);
--> statement-breakpoint
ALTER TABLE "case" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "caution_acknowledgement" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"caution_id" text NOT NULL,
	"person_id" uuid NOT NULL,
	"on_day" date NOT NULL,
	"dangers" text[] NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "caution_acknowledgement_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "caution_acknowledgement" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "finding" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"check_id" text NOT NULL,
	"stage" jsonb NOT NULL,
	"source" text NOT NULL,
	"asked_because" text NOT NULL,
	"kind" text NOT NULL,
	"shares" jsonb NOT NULL,
	"reliability" double precision NOT NULL,
	"value_typed" text,
	"error_typed" text,
	"unit" text,
	"value_si" double precision,
	"error_si" double precision,
	"person_id" uuid NOT NULL,
	"device_at" timestamp with time zone NOT NULL,
	"clock_offset_ms" double precision NOT NULL,
	"corrected_at" timestamp with time zone NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	"supersedes" uuid,
	"late" boolean DEFAULT false NOT NULL,
	CONSTRAINT "finding_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "finding" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "finding_note" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"finding_id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"text" text NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "finding_note_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "finding_note" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "run" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"case_id" uuid NOT NULL,
	"edition_id" uuid NOT NULL,
	"ranker_version" text NOT NULL,
	"inputs" jsonb NOT NULL,
	"result" jsonb NOT NULL,
	"because_of" uuid,
	"agreed" boolean NOT NULL,
	"difference" jsonb,
	"duration_ms" double precision NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "run_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "run" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "attachment" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"owner_kind" text NOT NULL,
	"owner_id" uuid NOT NULL,
	"object_key" text NOT NULL,
	"media_type" text NOT NULL,
	"bytes" integer NOT NULL,
	"description" text,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "attachment_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "attachment" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "audit" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"person_id" uuid,
	"action" text NOT NULL,
	"entity" text NOT NULL,
	"entity_id" text NOT NULL,
	"changed" jsonb NOT NULL,
	CONSTRAINT "audit_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "audit" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "removal" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"reason" text NOT NULL,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "removal_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "removal" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "site" ADD CONSTRAINT "site_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitation" ADD CONSTRAINT "invitation_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitation" ADD CONSTRAINT "invitation_accepted_by_person_id_fk" FOREIGN KEY ("accepted_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitation" ADD CONSTRAINT "invitation_invited_by_person_id_fk" FOREIGN KEY ("invited_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitation" ADD CONSTRAINT "invitation_organisation_id_site_id_site_organisation_id_id_fk" FOREIGN KEY ("organisation_id","site_id") REFERENCES "public"."site"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_organisation_id_site_id_site_organisation_id_id_fk" FOREIGN KEY ("organisation_id","site_id") REFERENCES "public"."site"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "password_reset" ADD CONSTRAINT "password_reset_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "compressor_model" ADD CONSTRAINT "compressor_model_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "unit" ADD CONSTRAINT "unit_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "unit" ADD CONSTRAINT "unit_organisation_id_site_id_site_organisation_id_id_fk" FOREIGN KEY ("organisation_id","site_id") REFERENCES "public"."site"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "unit_reading" ADD CONSTRAINT "unit_reading_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fit" ADD CONSTRAINT "fit_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fit" ADD CONSTRAINT "fit_organisation_id_model_id_compressor_model_organisation_id_id_fk" FOREIGN KEY ("organisation_id","model_id") REFERENCES "public"."compressor_model"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition" ADD CONSTRAINT "edition_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition" ADD CONSTRAINT "edition_upstream_number_upstream_edition_number_fk" FOREIGN KEY ("upstream_number") REFERENCES "public"."upstream_edition"("number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "call" ADD CONSTRAINT "call_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "call" ADD CONSTRAINT "call_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_event" ADD CONSTRAINT "case_event_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_event" ADD CONSTRAINT "case_event_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_assigned_to_person_id_fk" FOREIGN KEY ("assigned_to") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_opened_by_person_id_fk" FOREIGN KEY ("opened_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_organisation_id_unit_id_unit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","unit_id") REFERENCES "public"."unit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_organisation_id_site_id_site_organisation_id_id_fk" FOREIGN KEY ("organisation_id","site_id") REFERENCES "public"."site"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_organisation_id_fit_id_fit_organisation_id_id_fk" FOREIGN KEY ("organisation_id","fit_id") REFERENCES "public"."fit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_organisation_id_edition_id_edition_organisation_id_id_fk" FOREIGN KEY ("organisation_id","edition_id") REFERENCES "public"."edition"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "caution_acknowledgement" ADD CONSTRAINT "caution_acknowledgement_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "caution_acknowledgement" ADD CONSTRAINT "caution_acknowledgement_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "finding" ADD CONSTRAINT "finding_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "finding" ADD CONSTRAINT "finding_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "finding_note" ADD CONSTRAINT "finding_note_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "finding_note" ADD CONSTRAINT "finding_note_organisation_id_finding_id_finding_organisation_id_id_fk" FOREIGN KEY ("organisation_id","finding_id") REFERENCES "public"."finding"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "run" ADD CONSTRAINT "run_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "run" ADD CONSTRAINT "run_organisation_id_edition_id_edition_organisation_id_id_fk" FOREIGN KEY ("organisation_id","edition_id") REFERENCES "public"."edition"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "attachment" ADD CONSTRAINT "attachment_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "audit" ADD CONSTRAINT "audit_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "removal" ADD CONSTRAINT "removal_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "membership_person" ON "membership" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "unit_site" ON "unit" USING btree ("organisation_id","site_id");--> statement-breakpoint
CREATE INDEX "unit_reading_unit" ON "unit_reading" USING btree ("organisation_id","unit_id","read_on");--> statement-breakpoint
CREATE INDEX "fit_unit" ON "fit" USING btree ("organisation_id","unit_id","installed_on");--> statement-breakpoint
CREATE INDEX "fit_model" ON "fit" USING btree ("organisation_id","model_id");--> statement-breakpoint
CREATE INDEX "call_case" ON "call" USING btree ("organisation_id","case_id","at");--> statement-breakpoint
CREATE INDEX "case_event_case" ON "case_event" USING btree ("organisation_id","case_id","at");--> statement-breakpoint
CREATE INDEX "case_unit" ON "case" USING btree ("organisation_id","unit_id","opened_at");--> statement-breakpoint
CREATE INDEX "case_status" ON "case" USING btree ("organisation_id","status","opened_at");--> statement-breakpoint
CREATE INDEX "caution_acknowledgement_case" ON "caution_acknowledgement" USING btree ("organisation_id","case_id","person_id","on_day");--> statement-breakpoint
CREATE INDEX "finding_case" ON "finding" USING btree ("organisation_id","case_id","check_id","corrected_at");--> statement-breakpoint
CREATE INDEX "finding_note_case" ON "finding_note" USING btree ("organisation_id","case_id");--> statement-breakpoint
CREATE INDEX "run_case" ON "run" USING btree ("organisation_id","case_id","at");--> statement-breakpoint
CREATE INDEX "attachment_owner" ON "attachment" USING btree ("organisation_id","owner_kind","owner_id");--> statement-breakpoint
CREATE INDEX "audit_entity" ON "audit" USING btree ("organisation_id","entity","entity_id","at");--> statement-breakpoint
CREATE INDEX "audit_at" ON "audit" USING btree ("organisation_id","at");--> statement-breakpoint
CREATE INDEX "removal_entity" ON "removal" USING btree ("organisation_id","entity","entity_id");--> statement-breakpoint
CREATE POLICY "itself" ON "organisation" AS PERMISSIVE FOR ALL TO public USING (id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "site" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "invitation" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation_or_ones_own" ON "membership" AS PERMISSIVE FOR SELECT TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid or person_id = nullif(current_setting('app.person_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "changed_in_this_organisation" ON "membership" AS PERMISSIVE FOR UPDATE TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "oneself_or_colleague" ON "person" AS PERMISSIVE FOR SELECT TO public USING (id = nullif(current_setting('app.person_id', true), '')::uuid or exists (select 1 from membership m where m.person_id = person.id and m.organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "changed_by_oneself" ON "person" AS PERMISSIVE FOR UPDATE TO public USING (id = nullif(current_setting('app.person_id', true), '')::uuid) WITH CHECK (id = nullif(current_setting('app.person_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "compressor_model" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "unit" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "unit_reading" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "fit" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "edition" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "call" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "case_event" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "case" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "caution_acknowledgement" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "finding" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "finding_note" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "run" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "attachment" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "audit" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "removal" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);