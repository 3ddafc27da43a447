-- Tokens are revoked, never deleted: the audit cites them.
GRANT SELECT, INSERT ON "api_token" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("last_used_at", "revoked_at") ON "api_token" TO carryover_app;
--> statement-breakpoint
GRANT SELECT, INSERT ON "idempotent_answer" TO carryover_app;
--> statement-breakpoint
-- One's own bookmarks, which no case cites.
GRANT SELECT, INSERT, UPDATE, DELETE ON "saved_view" TO carryover_app;
--> statement-breakpoint
-- What an upload turned out to be, and what is drawn and written on it. The picture itself is never changed.
GRANT UPDATE ("state", "refusal", "media_type", "bytes", "width", "height", "thumbnail_key", "description", "strokes") ON "attachment" TO carryover_app;
--> statement-breakpoint
ALTER TABLE "saved_view" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
-- Whose token it is, asked before an organisation is set. Expired and revoked ones are told apart by the caller.
CREATE FUNCTION find_api_token(p_token_hash text)
RETURNS TABLE (organisation_id uuid, id uuid, person_id uuid, scopes text[], expires_at timestamptz, revoked_at timestamptz, last_used_at timestamptz)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT t.organisation_id, t.id, t.person_id, t.scopes, t.expires_at, t.revoked_at, t.last_used_at
  FROM public.api_token t
  WHERE t.token_hash = p_token_hash
$$;
--> statement-breakpoint
-- Answers kept for repeated requests are of no use after a day. How many went.
CREATE FUNCTION sweep_idempotent_answers(p_before timestamptz)
RETURNS bigint
LANGUAGE sql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  WITH gone AS (DELETE FROM public.idempotent_answer a WHERE a.at < p_before RETURNING 1)
  SELECT count(*) FROM gone
$$;
--> statement-breakpoint
REVOKE ALL ON FUNCTION find_api_token(text), sweep_idempotent_answers(timestamptz) FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION find_api_token(text), sweep_idempotent_answers(timestamptz) TO carryover_app;
--> statement-breakpoint
-- Whoever has a case open hears of each write to it when it commits. Ids only: what changed is read with one's own rights.
CREATE FUNCTION tell_case_changed()
RETURNS trigger
LANGUAGE plpgsql SET search_path = pg_catalog, pg_temp
AS $$
BEGIN
  PERFORM pg_notify('case_changed', NEW.organisation_id || '/' || NEW.id || '/' || NEW.version);
  RETURN NULL;
END
$$;
--> statement-breakpoint
CREATE TRIGGER case_changed AFTER UPDATE OF "version" ON "case" FOR EACH ROW EXECUTE FUNCTION tell_case_changed();
--> statement-breakpoint
SELECT pgboss.create_queue('make-thumbnail', '{"policy": "standard", "retryLimit": 10, "retryDelay": 5, "retryBackoff": true, "expireInSeconds": 120}');
