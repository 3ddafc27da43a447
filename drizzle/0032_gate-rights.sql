-- What was asked and answered at a gate is never changed: a passage ends once, a gate is only revoked.
GRANT SELECT, INSERT ON "gate", "gate_passage", "gate_answer" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("revoked_at", "revoked_by") ON "gate" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("ended_at", "verdict", "reasons", "of_the_compressor", "edition_id", "case_id") ON "gate_passage" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "gate" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "gate_passage" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "gate_answer" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
-- Somebody has a sign-in, or said his name at a gate.
ALTER TABLE "finding" ADD CONSTRAINT "finding_by_somebody" CHECK (person_id IS NOT NULL OR by_name IS NOT NULL);
--> statement-breakpoint
ALTER TABLE "case" ADD CONSTRAINT "case_opened_by_somebody" CHECK (opened_by IS NOT NULL OR opened_by_name IS NOT NULL);
--> statement-breakpoint
ALTER TABLE "case_event" ADD CONSTRAINT "case_event_by_somebody" CHECK (person_id IS NOT NULL OR by_name IS NOT NULL);
