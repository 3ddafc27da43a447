-- Weighings are taken back, never changed: findings were made from them.
GRANT SELECT, INSERT ON "oil_catch", "oil_weighing" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("remind_every_days", "remind_at", "ended_at", "ended_by", "ended_why") ON "oil_catch" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("taken_back_at", "taken_back_by", "taken_back_why", "taken_back_finding_id") ON "oil_weighing" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "oil_catch" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "oil_weighing" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
-- It only writes: what is wrong for longer than these tries is no matter of waiting.
SELECT pgboss.create_queue('remind-weighing', '{"policy": "standard", "retryLimit": 10, "retryDelay": 5, "retryBackoff": true, "expireInSeconds": 45}');
