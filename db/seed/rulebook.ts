import { createHash } from 'node:crypto';
import { desc } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { edition, upstreamEdition } from '@/db/schema';
import type { Rulebook } from '@/lib/diagnose/types';

/** JSON with sorted keys, so that the same rulebook always has the same digest. */
export const canonicalJson = (value: unknown): string =>
  JSON.stringify(value, (_key, inner: unknown) =>
    typeof inner === 'object' && inner !== null && !Array.isArray(inner)
      ? Object.fromEntries(Object.entries(inner).sort(([a], [b]) => (a < b ? -1 : 1)))
      : inner,
  );

/** Publishes the product's rulebook as a new upstream edition, unless the last one is the same. Its number. */
export async function publishUpstream(tx: Executor, rulebook: Rulebook): Promise<number> {
  const digest = createHash('sha256').update(canonicalJson(rulebook)).digest('hex');
  const [last] = await tx
    .select({ number: upstreamEdition.number, digest: upstreamEdition.digest })
    .from(upstreamEdition)
    .orderBy(desc(upstreamEdition.number))
    .limit(1);
  if (last?.digest === digest) return last.number;
  const number = (last?.number ?? 0) + 1;
  await tx.insert(upstreamEdition).values({ number, rulebook, digest });
  return number;
}

/** Edition 1 of an organisation: a copy of an upstream edition. */
export async function publishFirstEdition(
  tx: Executor,
  given: { organisationId: string; id: string; rulebook: Rulebook; upstreamNumber: number; at: Date },
): Promise<void> {
  const { at, ...rest } = given;
  await tx.insert(edition).values({ ...rest, number: 1, reason: 'The default rulebook, as the product brings it.', publishedAt: at });
}
