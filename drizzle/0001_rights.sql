-- What the application's role may do. It owns nothing and bypasses nothing; scripts create it before migrations run.
-- Nothing is deletable where history matters, and what is a record (findings, runs, calls, audit and the like) can be
-- added and read but not changed. A new table needs its own line here, in a new migration.

GRANT USAGE ON SCHEMA public TO carryover_app;
--> statement-breakpoint
-- Records: added and read, never changed.
GRANT SELECT, INSERT ON
  "unit_reading", "edition", "case_event", "call", "finding", "finding_note", "caution_acknowledgement", "run",
  "attachment", "removal", "audit"
TO carryover_app;
--> statement-breakpoint
-- Things with a present state: hidden instead of deleted.
GRANT SELECT, INSERT, UPDATE ON "compressor_model", "unit", "fit", "case", "site", "invitation" TO carryover_app;
--> statement-breakpoint
GRANT SELECT ON "upstream_edition" TO carryover_app;
--> statement-breakpoint
GRANT SELECT, UPDATE ("name", "country", "currency", "labour_rate_per_hour", "next_case_number") ON "organisation" TO carryover_app;
--> statement-breakpoint
-- Memberships begin by an invitation that is accepted (0002) and end by a date.
GRANT SELECT, UPDATE ("roles", "site_id", "may_release", "release_basis", "ended_at") ON "membership" TO carryover_app;
--> statement-breakpoint
-- No query can read a password hash; the policy narrows changes to the person signed in.
GRANT SELECT ("id", "email", "name", "session_version", "unit_preferences", "created_at", "erased_at"),
      UPDATE ("name", "password_hash", "session_version", "unit_preferences")
ON "person" TO carryover_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "attempt" TO carryover_app;
--> statement-breakpoint
-- The owner is held to the policies as well where none of its functions needs to look across organisations, so that a
-- seed or a data migration has to say whose rows it means. Not so for organisation, person, membership, invitation and
-- password_reset: the functions of 0002 read those before anybody is signed in.
ALTER TABLE "site" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "compressor_model" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "unit" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "unit_reading" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "fit" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "edition" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case_event" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "call" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "finding" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "finding_note" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "caution_acknowledgement" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "run" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "attachment" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "removal" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "audit" FORCE ROW LEVEL SECURITY;
