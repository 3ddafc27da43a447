import { selectCaseHead } from '@/db/queries/case';
import { insertWatchLink, lockWatchLink, updateWatchLink } from '@/db/queries/watch';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, invalid, notFound } from '@/lib/errors';
import { createWatchLinkInput, revokeWatchLinkInput } from '@/lib/schemas/watch';
import { lockCaseOf } from '../case/locked';
import { defineWrite } from '../define';
import { postMail } from '../mail/post';
import { lockWatchOf, refuseEnded } from './locked';

const A_DAY_MS = 86_400_000;

/** Makes a link with which somebody adds one reading without a sign-in, and mails it where an address is given. */
export const createWatchLink = defineWrite({
  name: 'create.watch-link',
  doing: 'give out links',
  roles: PERMITTED['case.work'],
  input: createWatchLinkInput,
  run: async ({ tx, ctx, input: { id, caseId, watchId, checkId, forWhom, mailTo, days }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId, watchId };
    await lockCaseOf(tx, of);
    const watch = await lockWatchOf(tx, of);
    const known = await lockWatchLink(tx, { ...of, linkId: id });
    if (known && known.watchId !== watchId) throw conflict('This id belongs to another link.');
    if (known) {
      unchanged();
      return { id, caseId };
    }
    refuseEnded(watch);
    if (!watch.plan.readings.some(({ check }) => check === checkId)) throw invalid({ checkId: 'This is not read in this watch.' });
    const at = ctx.now();
    const written = await insertWatchLink(tx, { ...of, id, checkId, forWhom, expiresAt: new Date(at.getTime() + days * A_DAY_MS), createdBy: ctx.person.id, createdAt: at });
    if (!written) throw conflict('This id belongs to another link.');
    const head = await selectCaseHead(tx, of);
    if (mailTo) await postMail(tx, ctx.jobs, { ...of, kind: 'watch-link', to: mailTo, subject: `A reading of unit ${head?.fleetNumber ?? ''} for ${ctx.organisation.name}`, entity: 'watch-link', entityId: id, at });
    audit({ entity: 'watch', entityId: watchId, changed: { caseId, checkId, link: id, days, mailed: mailTo !== null } });
    return { id, caseId };
  },
});

/** Makes a link worthless. */
export const revokeWatchLink = defineWrite({
  name: 'revoke.watch-link',
  doing: 'give out links',
  roles: PERMITTED['case.work'],
  input: revokeWatchLinkInput,
  run: async ({ tx, ctx, input: { caseId, watchId, linkId }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId, watchId, linkId };
    await lockCaseOf(tx, of);
    await lockWatchOf(tx, of);
    const link = await lockWatchLink(tx, of);
    if (link?.watchId !== watchId) throw notFound('link');
    if (link.usedAt) throw conflict('This link was used. Take its reading back instead.');
    if (link.revokedAt) unchanged();
    else {
      await updateWatchLink(tx, of, { revokedAt: ctx.now(), revokedBy: ctx.person.id });
      audit({ entity: 'watch', entityId: watchId, changed: { caseId, link: linkId, revoked: true } });
    }
    return { id: linkId, caseId };
  },
});
