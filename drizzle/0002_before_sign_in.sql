-- What has to be looked up or written before anybody is signed in, and so before an organisation is set. Each function
-- runs as the owner, does one thing, is given the hash of a token and never the token, and has its search path pinned.

-- The hash to compare a password with. No row: no such sign-in, which the caller must not let show.
CREATE FUNCTION find_sign_in(p_email text)
RETURNS TABLE (person_id uuid, password_hash text, session_version integer)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT p.id, p.password_hash, p.session_version
  FROM public.person p
  WHERE p.email = p_email AND p.password_hash IS NOT NULL AND p.erased_at IS NULL
$$;
--> statement-breakpoint
-- Everything that a request needs to know of a person in an organisation. No row: not a member (any more).
CREATE FUNCTION standing(p_person uuid, p_organisation uuid)
RETURNS TABLE (
  email text, name text, session_version integer, unit_preferences jsonb,
  organisation_name text, country text, currency text,
  roles text[], may_release boolean, site_id uuid
)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT p.email, p.name, p.session_version, p.unit_preferences, o.name, o.country::text, o.currency::text,
         m.roles, m.may_release, m.site_id
  FROM public.person p
  JOIN public.membership m ON m.person_id = p.id
  JOIN public.organisation o ON o.id = m.organisation_id
  WHERE p.id = p_person AND m.organisation_id = p_organisation AND m.ended_at IS NULL AND p.erased_at IS NULL
$$;
--> statement-breakpoint
-- Where a person works now, the longest first.
CREATE FUNCTION organisations_of(p_person uuid)
RETURNS TABLE (id uuid, name text)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT o.id, o.name
  FROM public.membership m
  JOIN public.organisation o ON o.id = m.organisation_id
  JOIN public.person p ON p.id = m.person_id
  WHERE m.person_id = p_person AND m.ended_at IS NULL AND p.erased_at IS NULL
  ORDER BY m.created_at, o.id
$$;
--> statement-breakpoint
-- Signs a person out everywhere: oneself, or a member of the organisation that the transaction has set.
CREATE FUNCTION raise_session_version(p_person uuid)
RETURNS boolean
LANGUAGE sql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  WITH raised AS (
    UPDATE public.person p SET session_version = p.session_version + 1
    WHERE p.id = p_person AND (
      p.id = nullif(current_setting('app.person_id', true), '')::uuid
      OR EXISTS (
        SELECT 1 FROM public.membership m
        WHERE m.person_id = p.id AND m.organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid
      )
    )
    RETURNING 1
  )
  SELECT EXISTS (SELECT 1 FROM raised)
$$;
--> statement-breakpoint
-- What the page of an invitation shows to whoever holds the link.
CREATE FUNCTION open_invitation(p_token_hash text, p_now timestamptz)
RETURNS TABLE (organisation_name text, email text, roles text[], has_sign_in boolean)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT o.name, i.email, i.roles,
         EXISTS (SELECT 1 FROM public.person p WHERE p.email = i.email AND p.password_hash IS NOT NULL AND p.erased_at IS NULL)
  FROM public.invitation i
  JOIN public.organisation o ON o.id = i.organisation_id
  WHERE i.token_hash = p_token_hash AND i.accepted_at IS NULL AND i.withdrawn_at IS NULL AND i.expires_at > p_now
$$;
--> statement-breakpoint
-- Uses an invitation up: makes the person unless the address has a sign-in, and the membership. Name and password hash
-- count only for a new sign-in; that an existing one was proved is the caller's to see to. No row: the link is no good.
CREATE FUNCTION accept_invitation(p_token_hash text, p_now timestamptz, p_new_person uuid, p_name text, p_password_hash text)
RETURNS TABLE (organisation_id uuid, invitation_id uuid, person_id uuid, roles text[])
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
DECLARE
  used public.invitation%ROWTYPE;
  invited uuid;
BEGIN
  -- The row lock lets one of two simultaneous uses through.
  SELECT i.* INTO used FROM public.invitation i
  WHERE i.token_hash = p_token_hash AND i.accepted_at IS NULL AND i.withdrawn_at IS NULL AND i.expires_at > p_now
  FOR UPDATE;
  IF NOT FOUND THEN RETURN; END IF;

  SELECT p.id INTO invited FROM public.person p WHERE p.email = used.email AND p.erased_at IS NULL;
  IF invited IS NULL THEN
    INSERT INTO public.person (id, email, name, password_hash) VALUES (p_new_person, used.email, p_name, p_password_hash)
    RETURNING id INTO invited;
  ELSE
    UPDATE public.person p SET name = p_name, password_hash = p_password_hash
    WHERE p.id = invited AND p.password_hash IS NULL;
  END IF;

  UPDATE public.invitation i SET accepted_at = p_now, accepted_by = invited, email = NULL, token_hash = NULL
  WHERE i.organisation_id = used.organisation_id AND i.id = used.id;

  INSERT INTO public.membership AS m (organisation_id, person_id, roles, site_id)
  VALUES (used.organisation_id, invited, used.roles, used.site_id)
  ON CONFLICT ON CONSTRAINT membership_organisation_id_person_id_pk
  DO UPDATE SET roles = excluded.roles, site_id = excluded.site_id, ended_at = NULL, may_release = false, release_basis = NULL;

  RETURN QUERY SELECT used.organisation_id, used.id, invited, used.roles;
END
$$;
--> statement-breakpoint
-- Begins a password reset; earlier links of the same person stop working. No row: no such sign-in.
CREATE FUNCTION start_password_reset(p_id uuid, p_email text, p_token_hash text, p_now timestamptz, p_expires timestamptz)
RETURNS TABLE (name text)
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
DECLARE
  found_person public.person%ROWTYPE;
BEGIN
  SELECT p.* INTO found_person FROM public.person p
  WHERE p.email = p_email AND p.password_hash IS NOT NULL AND p.erased_at IS NULL;
  IF NOT FOUND THEN RETURN; END IF;

  UPDATE public.password_reset r SET used_at = p_now WHERE r.person_id = found_person.id AND r.used_at IS NULL;
  INSERT INTO public.password_reset (id, person_id, token_hash, expires_at)
  VALUES (p_id, found_person.id, p_token_hash, p_expires);
  RETURN QUERY SELECT found_person.name;
END
$$;
--> statement-breakpoint
CREATE FUNCTION password_reset_is_open(p_token_hash text, p_now timestamptz)
RETURNS boolean
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT EXISTS (
    SELECT 1 FROM public.password_reset r
    WHERE r.token_hash = p_token_hash AND r.used_at IS NULL AND r.expires_at > p_now
  )
$$;
--> statement-breakpoint
-- Uses a reset up: sets the password and signs the person out everywhere. No row: the link is no good.
CREATE FUNCTION use_password_reset(p_token_hash text, p_now timestamptz, p_password_hash text)
RETURNS TABLE (person_id uuid)
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
DECLARE
  whose uuid;
BEGIN
  UPDATE public.password_reset r SET used_at = p_now
  WHERE r.token_hash = p_token_hash AND r.used_at IS NULL AND r.expires_at > p_now
  RETURNING r.person_id INTO whose;
  IF whose IS NULL THEN RETURN; END IF;

  UPDATE public.person p SET password_hash = p_password_hash, session_version = p.session_version + 1
  WHERE p.id = whose AND p.erased_at IS NULL;
  RETURN QUERY SELECT whose;
END
$$;
--> statement-breakpoint
-- Resets that can't be used any more are of no use to anybody. How many went.
CREATE FUNCTION sweep_password_resets(p_before timestamptz)
RETURNS bigint
LANGUAGE sql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  WITH gone AS (DELETE FROM public.password_reset r WHERE r.expires_at < p_before RETURNING 1)
  SELECT count(*) FROM gone
$$;
--> statement-breakpoint
-- PostgreSQL lets everybody call a new function; only the application's role may.
REVOKE ALL ON FUNCTION
  find_sign_in(text), standing(uuid, uuid), organisations_of(uuid), raise_session_version(uuid),
  open_invitation(text, timestamptz), accept_invitation(text, timestamptz, uuid, text, text),
  start_password_reset(uuid, text, text, timestamptz, timestamptz), password_reset_is_open(text, timestamptz),
  use_password_reset(text, timestamptz, text), sweep_password_resets(timestamptz)
FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION
  find_sign_in(text), standing(uuid, uuid), organisations_of(uuid), raise_session_version(uuid),
  open_invitation(text, timestamptz), accept_invitation(text, timestamptz, uuid, text, text),
  start_password_reset(uuid, text, text, timestamptz, timestamptz), password_reset_is_open(text, timestamptz),
  use_password_reset(text, timestamptz, text), sweep_password_resets(timestamptz)
TO carryover_app;
