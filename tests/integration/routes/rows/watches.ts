import { PERMITTED } from '@/lib/auth/permissions';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { callCause } from '@/lib/services/case/call';
import { openCase } from '@/lib/services/case/open';
import { createWatchLink } from '@/lib/services/watch/links';
import { listWatches } from '@/lib/services/watch/list';
import { addWatchReading } from '@/lib/services/watch/readings';
import { startWatch } from '@/lib/services/watch/start';
import { feature } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const PAGE = '(signed-in)/cases/[id]/watch';
const CASE = 'api/v1/cases/[id]/watches';
const ONE = `${CASE}/[watchId]`;
const CHECK = 'oil-amount';
const YES = { answer: 'yes' as const };

/** A case that is watched, with a reading and a link; and one that was called. */
export const watches = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [caseId, calledId, watchId, readingId, linkId] = [newId(), newId(), newId(), newId(), newId()];
    for (const id of [caseId, calledId]) {
      await openCase({ ctx, input: { id, unit: { kind: 'new', id: newId(), fleetNumber: id, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
      await callCause({ ctx, input: { id: newId(), caseId: id, mainCause: 'rings-worn', sureness: 'sure', whyNotLeading: 'Seen' } });
    }
    await startWatch({ ctx, input: { id: watchId, caseId, begin: [YES, YES, YES, YES] } });
    const cautions = defaultRulebook.checks.find(({ id }) => id === CHECK)?.cautions ?? [];
    for (const who of WORK) await acknowledgeCautions({ ctx: as(who), input: { caseId, checkId: CHECK, cautions: cautions.map((cautionId) => ({ id: newId(), cautionId })) } });
    await addWatchReading({ ctx, input: { id: readingId, caseId, watchId, checkId: CHECK, state: 'film' } });
    await createWatchLink({ ctx, input: { id: linkId, caseId, watchId, checkId: CHECK, forWhom: 'Driver' } });
    const { watches: [watch] } = await listWatches({ ctx, input: { caseId } });
    return { caseId, calledId, watchId, readingId, linkId, token: watch?.links[0]?.path?.replace('/watch/', '') ?? '', caution: cautions[0] ?? '' };
  },
  rows: [
    { page: PAGE, roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { page: '(auth)/watch/[token]', roles: 'anybody', params: ({ token }) => ({ token }) },
    { action: '(auth)/watch/[token]', name: 'saveReading', roles: 'anybody', form: ({ token }) => ({ token, id: newId(), name: 'Driver', hasReadCautions: 'on', state: 'film', odometer: '', note: '' }) },
    { action: PAGE, name: 'readCautions', roles: WORK, form: ({ caseId, caution }) => ({ caseId, checkId: CHECK, cautions: [caution] }) },
    { action: PAGE, name: 'beginWatch', roles: WORK, form: ({ calledId }) => ({ id: newId(), caseId: calledId, odometer: '', ...Object.fromEntries([0, 1, 2, 3].flatMap((i) => [[`begin.${i}.answer`, 'no'], [`begin.${i}.why`, 'No time']])) }) },
    { action: PAGE, name: 'saveReading', roles: WORK, form: ({ caseId, watchId }) => ({ id: newId(), caseId, watchId, checkId: CHECK, state: 'light', odometer: '100,000 mi', note: 'cold' }) },
    { action: PAGE, name: 'takeBack', roles: WORK, form: ({ caseId, watchId, readingId }) => ({ caseId, watchId, readingId, whyTakenBack: 'The wrong unit' }) },
    { action: PAGE, name: 'makeLink', roles: WORK, form: ({ caseId, watchId }) => ({ id: newId(), caseId, watchId, checkId: CHECK, forWhom: 'Driver', mailTo: 'driver@people.test', days: '7' }) },
    { action: PAGE, name: 'takeLinkBack', roles: WORK, form: ({ caseId, watchId, linkId }) => ({ caseId, watchId, linkId }) },
    { action: PAGE, name: 'endIt', roles: WORK, form: ({ caseId, watchId }) => ({ caseId, watchId, outcome: 'lost', why: 'Sold' }) },

    { route: CASE, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: CASE, method: 'POST', roles: WORK, params: ({ calledId }) => ({ id: calledId }), body: () => ({ id: newId(), begin: [YES, YES, YES, YES] }) },
    { route: `${ONE}/readings`, method: 'POST', roles: WORK, params: ({ caseId, watchId }) => ({ id: caseId, watchId }), body: () => ({ id: newId(), checkId: CHECK, state: 'light' }) },
    { route: `${ONE}/readings/[readingId]/take-back`, method: 'POST', roles: WORK, params: ({ caseId, watchId, readingId }) => ({ id: caseId, watchId, readingId }), body: () => ({ whyTakenBack: 'The wrong unit' }) },
    { route: `${ONE}/links`, method: 'POST', roles: WORK, params: ({ caseId, watchId }) => ({ id: caseId, watchId }), body: () => ({ id: newId(), checkId: CHECK, forWhom: 'Driver' }) },
    { route: `${ONE}/links/[linkId]/revoke`, method: 'POST', roles: WORK, params: ({ caseId, watchId, linkId }) => ({ id: caseId, watchId, linkId }) },
    { route: `${ONE}/end`, method: 'POST', roles: WORK, params: ({ caseId, watchId }) => ({ id: caseId, watchId }), body: () => ({ outcome: 'lost', why: 'Sold' }) },
  ],
});
