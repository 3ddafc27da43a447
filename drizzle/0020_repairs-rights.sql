-- What was said of a step is never changed: the last word on it holds.
GRANT SELECT, INSERT ON "repair", "repair_step" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("planned_on", "assigned_to", "ended_at", "ended_by", "outcome", "why_dropped") ON "repair" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "repair" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "repair_step" FORCE ROW LEVEL SECURITY;
