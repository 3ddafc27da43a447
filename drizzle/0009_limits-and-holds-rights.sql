-- A limit is withdrawn, never changed: what was judged by it cites it.
GRANT SELECT, INSERT ON "adopted_limit" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("withdrawn_at", "withdrawn_by", "withdrawn_reason") ON "adopted_limit" TO carryover_app;
--> statement-breakpoint
GRANT SELECT, INSERT ON "unit_hold" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("passed_by", "passed_at", "ended_at", "ended", "ended_by", "lift_found", "lift_value_si", "lift_judgement", "lift_basis") ON "unit_hold" TO carryover_app;
--> statement-breakpoint
-- What open cases hold against a unit until now becomes the unit's own; the owner of the tables is let past their policies for it.
ALTER TABLE "case" NO FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
INSERT INTO "unit_hold" ("organisation_id", "id", "unit_id", "case_id", "check_id", "placed_at")
SELECT DISTINCT ON (c.organisation_id, c.unit_id, held.check_id) c.organisation_id, gen_random_uuid(), c.unit_id, c.id, held.check_id, c.opened_at
FROM "case" c CROSS JOIN LATERAL unnest(c.release_holds) AS held(check_id)
WHERE c.status <> 'closed'
ORDER BY c.organisation_id, c.unit_id, held.check_id, c.opened_at DESC;
--> statement-breakpoint
ALTER TABLE "case" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "adopted_limit" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "unit_hold" FORCE ROW LEVEL SECURITY;
