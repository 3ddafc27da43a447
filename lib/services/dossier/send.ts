import { insertSending, lockDossier, selectSendings } from '@/db/queries/dossier';
import { reviveMail } from '@/db/queries/mail';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, notFound } from '@/lib/errors';
import { sendDossierInput, sendingInput } from '@/lib/schemas/dossier';
import { defineWrite } from '../define';
import { postMail } from '../mail/post';

/**
 * Sends a dossier by mail, with the PDF as it is kept. Posted in the same transaction as it is noted, so that it goes out
 * once or not at all. One whose PDF isn't made yet is refused: nobody could look at what goes out.
 */
export const sendDossier = defineWrite({
  name: 'send.dossier',
  doing: 'send dossiers',
  roles: PERMITTED['case.work'],
  input: sendDossierInput,
  run: async ({ tx, ctx, input: { id, caseId, dossierId, to, words }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const row = await lockDossier(tx, { ...of, dossierId });
    if (row?.caseId !== caseId) throw notFound('dossier');
    const known = (await selectSendings(tx, of)).find((sending) => sending.id === id);
    if (known) {
      if (known.dossierId !== dossierId) throw conflict('This id belongs to another sending.');
      unchanged();
      return { id, dossierId };
    }
    if (row.objectKey === null) throw conflict('The PDF is not made yet. Send it when it is.');
    const at = ctx.now();
    const mailId = await postMail(tx, ctx.jobs, {
      by: ctx.person.id,
      organisationId: of.organisationId,
      kind: 'dossier',
      to,
      subject: `Dossier ${row.reference}`,
      entity: 'dossier',
      entityId: dossierId,
      attachment: { key: row.objectKey, name: `${row.reference}.pdf` },
      at,
    });
    const written = await insertSending(tx, { ...of, id, dossierId, toAddress: to, words, mailId, sentBy: ctx.person.id, at });
    if (!written) throw conflict('This id belongs to another sending.');
    audit({ entity: 'dossier', entityId: dossierId, changed: { reference: row.reference, sendingId: id } });
    return { id, dossierId };
  },
});

/** Tries a mail again that was given up; of one that waits or is sent nothing changes. */
export const sendDossierAgain = defineWrite({
  name: 'send-again.dossier',
  doing: 'send dossiers',
  roles: PERMITTED['case.work'],
  input: sendingInput,
  run: async ({ tx, ctx, input: { caseId, dossierId, sendingId }, audit, unchanged }) => {
    const organisationId = ctx.organisation.id;
    const row = await lockDossier(tx, { organisationId, dossierId });
    const sending = (await selectSendings(tx, { organisationId, caseId })).find(({ id }) => id === sendingId);
    if (row?.caseId !== caseId || sending?.dossierId !== dossierId) throw notFound('sending');
    if (sending.state !== 'given-up') unchanged();
    else {
      await reviveMail(tx, { organisationId, mailId: sending.mailId });
      await ctx.jobs.send(tx, 'send-mail', { organisationId, mailId: sending.mailId });
      audit({ entity: 'dossier', entityId: dossierId, changed: { reference: row.reference, sendingId } });
    }
    return { id: sendingId, dossierId };
  },
});
