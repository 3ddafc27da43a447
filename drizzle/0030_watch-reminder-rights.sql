GRANT UPDATE ("remind_at") ON "watch" TO carryover_app;
--> statement-breakpoint
-- It only writes, as other reminders do.
SELECT pgboss.create_queue('remind-watch', '{"policy": "standard", "retryLimit": 10, "retryDelay": 5, "retryBackoff": true, "expireInSeconds": 45}');
