-- What was said is never changed: it is told by mail, and read.
GRANT SELECT, INSERT ON "notice", "notice_preference" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("mail_id", "read_at") ON "notice" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("by_mail") ON "notice_preference" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "notice" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "notice_preference" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
-- It only writes, as a reminder does.
SELECT pgboss.create_queue('mail-daily-notices', '{"policy": "standard", "retryLimit": 10, "retryDelay": 5, "retryBackoff": true, "expireInSeconds": 45}');
