CREATE TABLE "search_entry" (
	"organisation_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"id" uuid NOT NULL,
	"words" "tsvector" NOT NULL,
	"fleet_key" text,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "search_entry_organisation_id_kind_id_pk" PRIMARY KEY("organisation_id","kind","id")
);
--> statement-breakpoint
ALTER TABLE "search_entry" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "search_entry" ADD CONSTRAINT "search_entry_organisation_id_organisation_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "search_entry_words" ON "search_entry" USING gin ("organisation_id","words") WITH (fastupdate=false);--> statement-breakpoint
CREATE INDEX "search_entry_fleet_key" ON "search_entry" USING gin ("organisation_id","fleet_key" gin_trgm_ops) WITH (fastupdate=false);--> statement-breakpoint
CREATE POLICY "of_this_organisation" ON "search_entry" AS PERMISSIVE FOR ALL TO public USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);