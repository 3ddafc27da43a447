-- What is searched for: how a text becomes words, who keeps them, and the two functions that use the indexes.

-- Lower case, without accents, only letters and digits. lib/search/fold.ts does the same to what somebody types and has
-- the same list of what parts words: written out by their numbers, so that no server's locale changes it.
CREATE FUNCTION search_fold(p_text text)
RETURNS text
LANGUAGE sql IMMUTABLE PARALLEL SAFE
AS $$
  SELECT trim(regexp_replace(
    lower(regexp_replace(normalize(p_text, NFD), '[\u0300-\u036f]', '', 'g')),
    '[\u0001-\u002f\u003a-\u0060\u007b-\u00b4\u00b6-\u00b9\u00bb-\u00bf\u00d7\u00f7\u2000-\u206f\u20a0-\u20cf\u2100-\u2bff\u3000-\u3004\u3007-\u3020\ufe00-\ufe0f\ufeff\U0001f000-\U0001faff]+', ' ', 'g'))
$$;
--> statement-breakpoint
-- The words with their places, as the configuration 'simple' would have them: none cut to its stem, none left out. Notes
-- are short and in whatever language a workshop speaks; "no oil" means something else than "oil", and part numbers are
-- words like any other. What a stem would find, "drain" in "drains", is found because words match from their beginning.
-- PostgreSQL's parser is passed over: it reads "1/8" as the path of a file and "10e5a" as a number with a rest.
CREATE FUNCTION search_vector(p_text text)
RETURNS tsvector
LANGUAGE sql IMMUTABLE PARALLEL SAFE
AS $$
  SELECT coalesce(string_agg(left(word, 60) || ':' || least(place, 16383), ' '), '')::tsvector
  FROM regexp_split_to_table(public.search_fold(p_text), ' ') WITH ORDINALITY AS parts (word, place)
  WHERE word <> ''
$$;
--> statement-breakpoint
-- "T-104", "t 104" and "T0104" are one number to whoever stands in the yard.
CREATE FUNCTION search_fleet_key(p_text text)
RETURNS text
LANGUAGE sql IMMUTABLE PARALLEL SAFE
AS $$
  SELECT regexp_replace(replace(public.search_fold(p_text), ' ', ''), '(^|[^0-9])0+(?=[0-9])', '\1', 'g')
$$;
--> statement-breakpoint
-- Keeps the entry of a row: its kind, then the columns that hold its words, of which the first weighs most.
CREATE FUNCTION keep_search_entry()
RETURNS trigger
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
DECLARE
  v_row jsonb;
  v_words tsvector := '';
BEGIN
  IF TG_OP <> 'INSERT' THEN
    DELETE FROM public.search_entry e WHERE e.organisation_id = OLD.organisation_id AND e.kind = TG_ARGV[0] AND e.id = OLD.id;
  END IF;
  IF TG_OP = 'DELETE' THEN
    RETURN NULL;
  END IF;
  v_row := to_jsonb(NEW);
  FOR i IN 1 .. TG_NARGS - 1 LOOP
    v_words := v_words || setweight(public.search_vector(coalesce(v_row ->> TG_ARGV[i], '')), (CASE i WHEN 1 THEN 'A' ELSE 'D' END)::"char");
  END LOOP;
  IF v_row ->> 'hidden_at' IS NULL AND v_words <> ''::tsvector THEN
    INSERT INTO public.search_entry (organisation_id, kind, id, words, fleet_key, at)
    VALUES (
      NEW.organisation_id, TG_ARGV[0], NEW.id, v_words,
      CASE TG_ARGV[0] WHEN 'unit' THEN public.search_fleet_key(v_row ->> 'fleet_number') END,
      coalesce(v_row ->> 'at', v_row ->> 'opened_at', v_row ->> 'created_at')::timestamptz
    );
  END IF;
  RETURN NULL;
END
$$;
--> statement-breakpoint
CREATE TRIGGER keep_search_entry AFTER INSERT OR DELETE OR UPDATE OF "fleet_number", "engine_family", "note", "hidden_at" ON "unit"
FOR EACH ROW EXECUTE FUNCTION keep_search_entry('unit', 'fleet_number', 'engine_family', 'note');
--> statement-breakpoint
CREATE TRIGGER keep_search_entry AFTER INSERT OR DELETE OR UPDATE OF "note", "hidden_at" ON "fit"
FOR EACH ROW EXECUTE FUNCTION keep_search_entry('fit', 'note');
--> statement-breakpoint
CREATE TRIGGER keep_search_entry AFTER INSERT OR DELETE OR UPDATE OF "complaint_words" ON "case"
FOR EACH ROW EXECUTE FUNCTION keep_search_entry('case', 'complaint_words');
--> statement-breakpoint
CREATE TRIGGER keep_search_entry AFTER INSERT OR DELETE OR UPDATE ON "finding_note"
FOR EACH ROW EXECUTE FUNCTION keep_search_entry('note', 'text');
--> statement-breakpoint
CREATE TRIGGER keep_search_entry AFTER INSERT OR DELETE OR UPDATE ON "call"
FOR EACH ROW EXECUTE FUNCTION keep_search_entry('call', 'unlisted_cause', 'why_not_leading');
--> statement-breakpoint
CREATE TRIGGER keep_search_entry AFTER INSERT OR DELETE OR UPDATE ON "case_event"
FOR EACH ROW EXECUTE FUNCTION keep_search_entry('event', 'reason');
--> statement-breakpoint
-- The entries whose words begin as the query asks, of each kind the likeliest.
CREATE FUNCTION search_entries(p_organisation uuid, p_kinds text[], p_query tsquery, p_most integer)
RETURNS TABLE (kind text, id uuid, likeness real, at timestamptz, total integer)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT f.kind, f.id, f.likeness, f.at, f.total
  FROM (
    SELECT e.kind, e.id, e.at, r.likeness,
           (count(*) OVER (PARTITION BY e.kind))::integer AS total,
           row_number() OVER (PARTITION BY e.kind ORDER BY r.likeness DESC, e.at DESC, e.id) AS place
    FROM public.search_entry e CROSS JOIN LATERAL (SELECT ts_rank(e.words, p_query) AS likeness) r
    WHERE e.organisation_id = p_organisation
      AND e.organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid
      AND e.kind = ANY (p_kinds)
      AND e.words @@ p_query
  ) f
  WHERE f.place <= p_most
  ORDER BY f.likeness DESC, f.at DESC, f.id
$$;
--> statement-breakpoint
-- Units by number: 0 the very one, 1 it begins so, 2 it holds it, 3 it is like it by its trigrams; which of those are near
-- enough is for whoever asks. "sure" counts the others, those beyond the most included.
CREATE FUNCTION search_fleet_numbers(p_organisation uuid, p_key text, p_near boolean, p_most integer)
RETURNS TABLE (id uuid, fleet_key text, manner integer, sure integer)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, pg_temp
AS $$
  SELECT e.id, e.fleet_key, m.manner, (count(*) FILTER (WHERE m.manner < 3) OVER ())::integer
  FROM public.search_entry e
  CROSS JOIN LATERAL (
    SELECT CASE WHEN e.fleet_key = p_key THEN 0 WHEN starts_with(e.fleet_key, p_key) THEN 1 WHEN strpos(e.fleet_key, p_key) > 0 THEN 2 ELSE 3 END AS manner
  ) m
  WHERE e.organisation_id = p_organisation
    AND e.organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid
    AND (e.fleet_key LIKE '%' || p_key || '%' OR (p_near AND e.fleet_key OPERATOR(public.%) p_key))
  ORDER BY m.manner, public.similarity(e.fleet_key, p_key) DESC, length(e.fleet_key), e.fleet_key, e.id
  LIMIT p_most
$$;
--> statement-breakpoint
REVOKE ALL ON FUNCTION search_fold(text), search_vector(text), search_fleet_key(text), keep_search_entry(),
  search_entries(uuid, text[], tsquery, integer), search_fleet_numbers(uuid, text, boolean, integer) FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION search_entries(uuid, text[], tsquery, integer), search_fleet_numbers(uuid, text, boolean, integer) TO carryover_app;
--> statement-breakpoint
GRANT SELECT ON "search_entry" TO carryover_app;
--> statement-breakpoint
-- What is there already; the owner of the tables is let past their policies for it.
ALTER TABLE "unit" NO FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "fit" NO FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case" NO FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "finding_note" NO FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "call" NO FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case_event" NO FORCE ROW LEVEL SECURITY;--> statement-breakpoint
INSERT INTO "search_entry" ("organisation_id", "kind", "id", "words", "fleet_key", "at")
SELECT * FROM (
  SELECT organisation_id, 'unit', id,
         setweight(search_vector(fleet_number), 'A') || search_vector(coalesce(engine_family, '')) || search_vector(coalesce(note, '')) AS words,
         search_fleet_key(fleet_number), created_at
  FROM "unit" WHERE hidden_at IS NULL
  UNION ALL SELECT organisation_id, 'fit', id, setweight(search_vector(coalesce(note, '')), 'A'), NULL, created_at FROM "fit" WHERE hidden_at IS NULL
  UNION ALL SELECT organisation_id, 'case', id, setweight(search_vector(coalesce(complaint_words, '')), 'A'), NULL, opened_at FROM "case"
  UNION ALL SELECT organisation_id, 'note', id, setweight(search_vector("text"), 'A'), NULL, created_at FROM "finding_note"
  UNION ALL SELECT organisation_id, 'call', id, setweight(search_vector(coalesce(unlisted_cause, '')), 'A') || search_vector(coalesce(why_not_leading, '')), NULL, at FROM "call"
  UNION ALL SELECT organisation_id, 'event', id, setweight(search_vector(coalesce(reason, '')), 'A'), NULL, at FROM "case_event"
) AS kept
WHERE words <> ''::tsvector;
--> statement-breakpoint
ALTER TABLE "unit" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "fit" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "finding_note" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "call" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "case_event" FORCE ROW LEVEL SECURITY;
