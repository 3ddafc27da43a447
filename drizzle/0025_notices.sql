CREATE TABLE "notice" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"key" text NOT NULL,
	"case_id" uuid,
	"about" jsonb NOT NULL,
	"by_mail" text NOT NULL,
	"mail_id" uuid,
	"read_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "notice_organisation_id_id_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "notice_once" UNIQUE("organisation_id","person_id","kind","key")
);
--> statement-breakpoint
ALTER TABLE "notice" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "notice_preference" (
	"organisation_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"by_mail" jsonb NOT NULL,
	CONSTRAINT "notice_preference_organisation_id_person_id_pk" PRIMARY KEY("organisation_id","person_id")
);
--> statement-breakpoint
ALTER TABLE "notice_preference" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "mail" ADD COLUMN "posted_by" uuid;--> statement-breakpoint
ALTER TABLE "notice" ADD CONSTRAINT "notice_organisation_id_person_id_membership_organisation_id_person_id_fk" FOREIGN KEY ("organisation_id","person_id") REFERENCES "public"."membership"("organisation_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notice" ADD CONSTRAINT "notice_organisation_id_case_id_case_organisation_id_id_fk" FOREIGN KEY ("organisation_id","case_id") REFERENCES "public"."case"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notice" ADD CONSTRAINT "notice_organisation_id_mail_id_mail_organisation_id_id_fk" FOREIGN KEY ("organisation_id","mail_id") REFERENCES "public"."mail"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notice_preference" ADD CONSTRAINT "notice_preference_organisation_id_person_id_membership_organisation_id_person_id_fk" FOREIGN KEY ("organisation_id","person_id") REFERENCES "public"."membership"("organisation_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "notice_person" ON "notice" USING btree ("organisation_id","person_id","created_at","id");--> statement-breakpoint
CREATE INDEX "notice_unread" ON "notice" USING btree ("organisation_id","person_id") WHERE read_at is null;--> statement-breakpoint
CREATE INDEX "notice_mail" ON "notice" USING btree ("organisation_id","mail_id");--> statement-breakpoint
ALTER TABLE "mail" ADD CONSTRAINT "mail_posted_by_person_id_fk" FOREIGN KEY ("posted_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "notice" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "notice_preference" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);