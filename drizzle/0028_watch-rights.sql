-- What was read is never changed, only taken back; a watch only ends; a link is only used up or revoked.
GRANT SELECT, INSERT ON "watch", "watch_link", "watch_reading" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("ended_at", "ended_by", "outcome", "why", "proof", "comeback_case_id") ON "watch" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("used_at", "revoked_at", "revoked_by") ON "watch_link" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("taken_back_at", "taken_back_by", "taken_back_why") ON "watch_reading" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "watch" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "watch_link" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "watch_reading" FORCE ROW LEVEL SECURITY;
