-- What came of a mail is noted at it; what was posted is never changed, only forgotten.
GRANT SELECT, INSERT ON "mail" TO carryover_app;
--> statement-breakpoint
GRANT UPDATE ("to_address", "state", "attempts", "last_error", "last_tried_at", "sent_at") ON "mail" TO carryover_app;
--> statement-breakpoint
-- Between the server's word that it has a mail and ours that it is sent lies one statement, in a transaction of its own.
CREATE FUNCTION note_mail_sent(p_organisation_id uuid, p_id uuid, p_at timestamptz)
RETURNS void
LANGUAGE plpgsql SET search_path = pg_catalog, pg_temp
AS $$
BEGIN
  PERFORM set_config('app.organisation_id', p_organisation_id::text, true);
  UPDATE public.mail m SET state = 'sent', sent_at = p_at, last_error = NULL
  WHERE m.organisation_id = p_organisation_id AND m.id = p_id;
END
$$;
--> statement-breakpoint
REVOKE ALL ON FUNCTION note_mail_sent(uuid, uuid, timestamptz) FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION note_mail_sent(uuid, uuid, timestamptz) TO carryover_app;
--> statement-breakpoint
-- Begins a password reset; earlier links of the same person stop working. No row: no such sign-in. A link that is made
-- again, because its mail is tried again, stays as it stands: no row once it was used, or has run out.
CREATE OR REPLACE FUNCTION start_password_reset(p_id uuid, p_email text, p_token_hash text, p_now timestamptz, p_expires timestamptz)
RETURNS TABLE (name text)
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
DECLARE
  found_person public.person%ROWTYPE;
BEGIN
  SELECT p.* INTO found_person FROM public.person p
  WHERE p.email = p_email AND p.password_hash IS NOT NULL AND p.erased_at IS NULL;
  IF NOT FOUND THEN RETURN; END IF;

  IF EXISTS (SELECT 1 FROM public.password_reset r WHERE r.token_hash = p_token_hash) THEN
    RETURN QUERY SELECT found_person.name WHERE EXISTS (
      SELECT 1 FROM public.password_reset r
      WHERE r.token_hash = p_token_hash AND r.person_id = found_person.id AND r.used_at IS NULL AND r.expires_at > p_now
    );
    RETURN;
  END IF;

  UPDATE public.password_reset r SET used_at = p_now WHERE r.person_id = found_person.id AND r.used_at IS NULL;
  INSERT INTO public.password_reset (id, person_id, token_hash, expires_at)
  VALUES (p_id, found_person.id, p_token_hash, p_expires);
  RETURN QUERY SELECT found_person.name;
END
$$;
--> statement-breakpoint
-- A job whose worker was killed comes back when its time is up: at the latest after expireInSeconds, the few seconds
-- between two looks of a worker (worker/index.ts) and the first retryDelay, which is a minute in all. Whatever a job
-- does must be done, or given up, within its time: for a mail see TIMEOUTS of lib/mail. The first retries come within
-- seconds, because most of what fails is mended by then; mail is tried for a day or more, slower and slower.
SELECT pgboss.create_queue('send-mail', '{"policy": "standard", "retryLimit": 14, "retryDelay": 5, "retryBackoff": true, "expireInSeconds": 45}');
--> statement-breakpoint
UPDATE pgboss.queue SET expire_seconds = 45, retry_delay = 5, retry_limit = 7 WHERE name = 'mail-password-reset';
--> statement-breakpoint
UPDATE pgboss.queue SET expire_seconds = 45 WHERE name = 'make-thumbnail';
--> statement-breakpoint
-- A night's work that was killed is done the same night.
UPDATE pgboss.queue SET expire_seconds = 45, retry_delay = 5, retry_backoff = true, retry_limit = 5 WHERE name = 'sweep';
--> statement-breakpoint
-- An organisation's jobs are looked up by it; job tables know nothing of organisations but what a job was given.
CREATE INDEX job_of_organisation ON pgboss.job ((data->>'organisationId'), created_on);
--> statement-breakpoint
CREATE INDEX archive_of_organisation ON pgboss.archive ((data->>'organisationId'), created_on);
--> statement-breakpoint
-- Invitations that wait to be mailed are posted instead.
WITH waiting AS (
  SELECT DISTINCT i.organisation_id, i.id, i.email, o.name
  FROM pgboss.job j
  JOIN "invitation" i ON i.organisation_id = (j.data->>'organisationId')::uuid AND i.id = (j.data->>'invitationId')::uuid
  JOIN "organisation" o ON o.id = i.organisation_id
  WHERE j.name = 'mail-invitation' AND j.state < 'completed' AND i.email IS NOT NULL
), posted AS (
  INSERT INTO "mail" (organisation_id, id, kind, to_address, subject, entity, entity_id)
  SELECT organisation_id, gen_random_uuid(), 'invitation', email, name || ' invites you to Carryover', 'invitation', id FROM waiting
  RETURNING organisation_id, id
)
INSERT INTO pgboss.job (name, data, retry_limit, retry_delay, retry_backoff, expire_in, policy)
SELECT 'send-mail', jsonb_build_object('organisationId', organisation_id, 'mailId', id), 14, 5, true, interval '45 seconds', 'standard' FROM posted;
--> statement-breakpoint
DELETE FROM pgboss.job WHERE name = 'mail-invitation';
--> statement-breakpoint
SELECT pgboss.delete_queue('mail-invitation');
--> statement-breakpoint
ALTER TABLE "mail" FORCE ROW LEVEL SECURITY;
