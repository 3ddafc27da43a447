import type { Transaction } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { lockCase, selectCaseHead } from '@/db/queries/case';
import { findOrganisation } from '@/db/queries/organisation';
import { insertWatchReading, lockWatch, lockWatchLink, updateWatchLink } from '@/db/queries/watch';
import { readWatchToken, type WatchToken } from '@/lib/auth/watch-token';
import { checkForVisitor } from '@/lib/case/view/check-for-visitor';
import { invalid } from '@/lib/errors';
import { readByLinkInput, viewWatchLinkInput } from '@/lib/schemas/watch';
import type { Visitor } from '../context';
import { compiledEdition } from '../edition/compiled';
import { deadLink, throughSignedLink } from '../signed-visit';
import { unitsOfCountry } from '../units-of-measure';
import { defineVisit } from '../visit';
import { readReading, takenReading } from './read-reading';

const NOT_OURS = 'This is not one of our links: ask whoever sent it for a new one.';

/** What the page of a link shows, and nothing else of the case. */
export const viewWatchLink = defineVisit({
  input: viewWatchLinkInput,
  run: ({ visitor, input: { token } }) =>
    throughLink(visitor, token, (_tx, { compiled, link, fleetNumber, organisation }) => {
      const check = compiled.checks.get(link.checkId)?.check;
      if (!check) throw deadLink(NOT_OURS);
      const units = unitsOfCountry(organisation.country);
      return Promise.resolve({
        organisationName: organisation.name,
        fleetNumber,
        ...checkForVisitor(compiled, check, units),
        units,
      });
    }),
});

/** Adds the one reading that a link is for. It is used up in the same transaction, under its lock. */
export const readByLink = defineVisit({
  input: readByLinkInput,
  run: ({ visitor, input: { token, id, name, hasReadCautions, ...typed } }) =>
    throughLink(visitor, token, async (tx, { compiled, link, watch, organisation }) => {
      if (!hasReadCautions) throw invalid({ hasReadCautions: 'Read the cautions first.' });
      const at = visitor.now();
      const habits = { organisation, person: { units: unitsOfCountry(organisation.country) } };
      const read = await readReading(tx, { habits, compiled, watch, typed: { ...typed, checkId: link.checkId } });
      const { organisationId, caseId, watchId } = link;
      if (!(await insertWatchReading(tx, { ...read, organisationId, caseId, watchId, id, byName: name, linkId: link.id, at }))) throw takenReading();
      await updateWatchLink(tx, { organisationId, linkId: link.id }, { usedAt: at });
      await insertAudit(tx, [{ organisationId, action: 'add.watch-reading', entity: 'watch', entityId: watchId, changed: { caseId, checkId: link.checkId, link: link.id, shares: read.shares, valueTyped: read.valueTyped, verdict: read.verdict }, at }]);
      return { verdict: read.verdict };
    }),
});

type Opened = Awaited<ReturnType<typeof open>>;

/** Does something with what a link opens; a link that leads nowhere is refused with one sentence. */
const throughLink = <Result>(visitor: Visitor, token: string, work: (tx: Transaction, opened: Opened) => Promise<Result>): Promise<Result> =>
  throughSignedLink(visitor, { token, read: readWatchToken, limit: 'link by network', notOurs: NOT_OURS }, async (tx, said) => work(tx, await open(tx, said, visitor.now())));

async function open(tx: Transaction, { organisationId, linkId, caseId, expiresAt }: WatchToken, now: Date) {
  const of = { organisationId, caseId };
  const locked = await lockCase(tx, of);
  const seen = locked && (await lockWatchLink(tx, { organisationId, linkId }));
  if (!locked || seen?.caseId !== caseId || seen.expiresAt.getTime() !== expiresAt) throw deadLink(NOT_OURS);
  if (seen.revokedAt) throw deadLink('This link was taken back by whoever gave it out.');
  if (seen.usedAt) throw deadLink('A reading was entered with this link already; it works once.');
  if (seen.expiresAt <= now) throw deadLink('This link has run out: ask whoever sent it for a new one.');
  const watch = await lockWatch(tx, { organisationId, watchId: seen.watchId });
  if (!watch || watch.endedAt) throw deadLink('This unit is not watched any more: nothing needs to be read.');
  const head = await selectCaseHead(tx, of);
  const organisation = await findOrganisation(tx, { organisationId });
  if (!head || !organisation) throw deadLink(NOT_OURS);
  return { link: seen, watch, organisation, fleetNumber: head.fleetNumber, compiled: await compiledEdition(tx, { organisationId, editionId: locked.editionId }) };
}
