-- A set is hidden, never changed and never deleted: findings keep what they were compared with, and cite it.
GRANT SELECT, INSERT ON "baseline_set", "baseline_figure" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("hidden_at") ON "baseline_set" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "baseline_set" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "baseline_figure" FORCE ROW LEVEL SECURITY;
