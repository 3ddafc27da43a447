-- What a dossier says is never changed; of its PDF it is noted what came of it.
GRANT SELECT, INSERT ON "dossier", "dossier_seal", "dossier_sending", "claim", "core_credit" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("state", "object_key", "bytes", "pdf_hash", "error") ON "dossier" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("to_whom", "their_reference", "sent_on", "amount", "state", "settled_on", "settled_amount", "why", "updated_at") ON "claim" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("fit_id", "to_whom", "sent_on", "expected_amount", "state", "settled_on", "credited_amount", "why", "updated_at") ON "core_credit" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("next_dossier_number") ON "organisation" TO carryover_app;
--> statement-breakpoint
-- Whoever holds a dossier may ask whether it was made here, signed in or not. Who doesn't hold its hash learns nothing.
CREATE FUNCTION find_dossier(p_reference text, p_hash text)
RETURNS TABLE (kind text, made_at timestamptz)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT s.kind, s.made_at FROM public.dossier_seal s WHERE s.hash = p_hash AND s.reference = p_reference LIMIT 1
$$;
--> statement-breakpoint
REVOKE ALL ON FUNCTION find_dossier(text, text) FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION find_dossier(text, text) TO carryover_app;
--> statement-breakpoint
-- Its photos are made smaller and set within its time; a killed one is back within a minute.
SELECT pgboss.create_queue('make-dossier', '{"policy": "standard", "retryLimit": 5, "retryDelay": 5, "retryBackoff": true, "expireInSeconds": 45}');
--> statement-breakpoint
-- Not so the seals: the function above reads those of every organisation.
ALTER TABLE "dossier" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "dossier_sending" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "claim" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "core_credit" FORCE ROW LEVEL SECURITY;
