import type { Executor } from '@/db/connect';
import { selectEdition } from '@/db/queries/edition';
import { notFound } from '@/lib/errors';
import { compileRulebook, type CompiledRulebook } from '@/lib/diagnose';

/** Editions are immutable, so that a compiled one is right for as long as the process lives. */
const cache = new Map<string, CompiledRulebook>();
const MOST = 32;

/** An organisation's edition, ready to rank; compiled once a process. */
export async function compiledEdition(
  db: Executor,
  { organisationId, editionId }: { organisationId: string; editionId: string },
): Promise<CompiledRulebook> {
  const key = `${organisationId}/${editionId}`;
  const kept = cache.get(key);
  if (kept) return kept;

  const edition = await selectEdition(db, { organisationId, editionId });
  if (!edition) throw notFound('edition');
  const compiled = compileRulebook(edition.rulebook);
  const oldest = cache.keys().next();
  if (cache.size >= MOST && !oldest.done) cache.delete(oldest.value);
  cache.set(key, compiled);
  return compiled;
}
