-- What was said of a point, what happened in a run, and what a release stood on are never changed.
GRANT SELECT, INSERT ON "fitting", "install_answer", "break_in_run", "break_in_event", "release" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("finished_at", "finished_by") ON "fitting" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("ended_at", "ended_by", "outcome", "why_stopped", "hot_check") ON "break_in_run" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "fitting" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "install_answer" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "break_in_run" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "break_in_event" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "release" FORCE ROW LEVEL SECURITY;
