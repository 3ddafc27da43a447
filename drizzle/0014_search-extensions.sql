-- Both are trusted: the owner of the database may make them, no superuser is needed. They come with the server's own
-- packages (contrib). pg_trgm compares fleet numbers that are typed wrongly; btree_gin lets an index of words begin with
-- the organisation, as every key here does. unaccent is not needed: accents are taken off by what every server has.
CREATE EXTENSION IF NOT EXISTS pg_trgm WITH SCHEMA public;
--> statement-breakpoint
CREATE EXTENSION IF NOT EXISTS btree_gin WITH SCHEMA public;
