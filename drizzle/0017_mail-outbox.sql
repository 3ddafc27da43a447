CREATE TABLE "mail" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"kind" text NOT NULL,
	"to_address" text,
	"subject" text NOT NULL,
	"body" text,
	"entity" text NOT NULL,
	"entity_id" text NOT NULL,
	"attachment_key" text,
	"attachment_name" text,
	"state" text DEFAULT 'waiting' NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"last_error" text,
	"last_tried_at" timestamp with time zone,
	"sent_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "mail_organisation_id_id_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
ALTER TABLE "mail" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "mail" ADD CONSTRAINT "mail_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "mail_entity" ON "mail" USING btree ("organisation_id","entity","entity_id");--> statement-breakpoint
CREATE INDEX "mail_state" ON "mail" USING btree ("organisation_id","state","created_at");--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "mail" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);