import * as schema from '@/db/schema';
import type { Transaction } from '@/db/connect';
import type { Rulebook } from '@/lib/diagnose/types';
import { newId } from '@/lib/ids';

const AT = new Date('2026-03-02T09:00:00Z');
/** Whatever it says: nothing reads it here. */
const NO_RULEBOOK = {} as Rulebook;

/** One row in every table that belongs to an organisation; organisation, site, person and membership are there. */
export async function insertOneRowEach(tx: Transaction, { organisationId, siteId, personId }: { organisationId: string; siteId: string; personId: string }) {
  const [unitId, modelId, fitId, editionId, caseId, findingId, setId, catchId, repairId, fittingId, runId, dossierId, mailId] = [newId(), newId(), newId(), newId(), newId(), newId(), newId(), newId(), newId(), newId(), newId(), newId(), newId()];
  const of = { organisationId };
  await tx.insert(schema.invitation).values({ ...of, id: newId(), roles: ['technician'], expiresAt: AT, invitedBy: personId });
  await tx.insert(schema.compressorModel).values({ ...of, id: modelId, name: 'Model' });
  await tx.insert(schema.unit).values({ ...of, id: unitId, siteId, fleetNumber: '1', country: 'US', vehicleKind: 'truck' });
  await tx.insert(schema.unitReading).values({ ...of, id: newId(), unitId, readOn: '2026-03-02', source: 'unit' });
  await tx.insert(schema.fit).values({ ...of, id: fitId, unitId, modelId, condition: 'new', installedOn: '2026-01-02' });
  await tx.insert(schema.baselineSet).values({ ...of, id: setId, unitId, fitId, modelId, occasion: 'service', measuredOn: '2026-03-02', conditions: { ambientK: null, engineSpeedPerS: null, loadedS: null } });
  await tx.insert(schema.baselineFigure).values({ ...of, setId, figure: 'build-up-time', valueSi: 24, errorSi: 1, valueTyped: '24', unit: 's' });
  await tx.insert(schema.edition).values({ ...of, id: editionId, number: 1, rulebook: NO_RULEBOOK, reason: 'Test', publishedAt: AT });
  await tx.insert(schema.cases).values({ ...of, id: caseId, number: 1, unitId, siteId, fitId, editionId, complaints: ['oil'], openedBy: personId, openedAt: AT });
  await tx.insert(schema.caseEvent).values({ ...of, id: newId(), caseId, kind: 'opened', personId, at: AT });
  await tx.insert(schema.call).values({ ...of, id: newId(), caseId, mainCause: 'cause', contributingCauses: [], sureness: 'sure', personId, at: AT });
  await tx.insert(schema.finding).values({
    ...of, id: findingId, caseId, checkId: 'check', stage: { kind: 'diagnosis' }, source: 'asked', askedBecause: 'choice', kind: 'skip',
    shares: [], reliability: 1, personId, deviceAt: AT, clockOffsetMs: 0, correctedAt: AT, receivedAt: AT,
  });
  await tx.insert(schema.findingNote).values({ ...of, id: newId(), findingId, caseId, text: 'Words', personId });
  await tx.insert(schema.cautionAcknowledgement).values({ ...of, id: newId(), caseId, cautionId: 'caution', personId, onDay: '2026-03-02', dangers: [], at: AT });
  await tx.insert(schema.run).values({
    ...of, id: newId(), caseId, editionId, rankerVersion: '1', inputs: {} as never, result: {} as never, agreed: true, durationMs: 1, at: AT,
  });
  await tx.insert(schema.attachment).values({ ...of, id: newId(), ownerKind: 'case', ownerId: caseId, objectKey: 'key', mediaType: 'image/jpeg', bytes: 1, personId });
  await tx.insert(schema.apiToken).values({ ...of, id: newId(), personId, name: 'Script', tokenHash: newId(), ending: 'wxyz', scopes: ['cases:read'], expiresAt: AT });
  await tx.insert(schema.idempotentAnswer).values({ ...of, personId, key: 'key', requestHash: 'hash', status: 200, at: AT });
  await tx.insert(schema.adoptedLimit).values({ ...of, id: newId(), checkId: 'c', mostSi: 1, source: 'Ours', personId });
  await tx.insert(schema.unitHold).values({ ...of, id: newId(), unitId, caseId, checkId: 'c', placedAt: AT });
  await tx.insert(schema.oilCatch).values({ ...of, id: catchId, caseId, checkId: 'c', stage: { kind: 'diagnosis' }, startedAt: AT, startedBy: personId });
  await tx.insert(schema.oilWeighing).values({ ...of, id: newId(), catchId, caseId, massKg: 0.01, massErrorKg: 0.0005, ranS: 3600, personId, at: AT, findingId });
  await tx.insert(schema.mail).values({ ...of, id: mailId, kind: 'notice', toAddress: 'somebody@people.test', subject: 'Test', body: 'Words', entity: 'unit', entityId: unitId });
  await tx.insert(schema.mail).values({ ...of, id: newId(), kind: 'notice', toAddress: 'somebody@people.test', subject: 'Test', body: 'Words', entity: 'unit', entityId: unitId });
  await tx.insert(schema.notice).values({ ...of, id: newId(), personId, kind: 'assigned', key: 'k', caseId, about: {}, byMail: 'never' });
  await tx.insert(schema.noticePreference).values({ ...of, personId, byMail: {} });
  await tx.insert(schema.repair).values({ ...of, id: repairId, caseId, remedyId: 'r', chosenAt: AT, chosenBy: personId });
  await tx.insert(schema.repairStep).values({ ...of, id: newId(), repairId, caseId, step: 0, mark: 'done', personId, at: AT });
  await tx.insert(schema.fitting).values({ ...of, id: fittingId, caseId, fitId, startedAt: AT, startedBy: personId });
  await tx.insert(schema.installAnswer).values({ ...of, id: newId(), fittingId, caseId, pointId: 'sealant', answer: 'none', personId, at: AT });
  const figures = { engineRpm: 1000, pressure: { aim: 5.5e5, low: 5e5, high: 6e5 }, duration: { least: 1200, most: 1800 }, from: 'edition' as const, source: null };
  await tx.insert(schema.breakInRun).values({ ...of, id: runId, caseId, fitId, figures, startedAt: AT, startedBy: personId });
  await tx.insert(schema.breakInEvent).values({ ...of, id: newId(), runId, caseId, kind: 'resume', personId, at: AT, receivedAt: AT });
  await tx.insert(schema.release).values({ ...of, id: newId(), caseId, unitId, releasedAt: AT, releasedBy: personId, on: [] });
  await tx.insert(schema.dossier).values({ ...of, id: dossierId, caseId, number: 1, reference: 'D-2026-00001', madeAt: AT, madeBy: personId, paper: 'a4', leftOut: { sections: [], photoIds: [], names: false, fleet: false }, content: {} as never, contentHash: 'hash' });
  await tx.insert(schema.dossierSeal).values({ ...of, dossierId, kind: 'content', reference: 'D-2026-00001', hash: 'hash', madeAt: AT });
  await tx.insert(schema.dossierSending).values({ ...of, id: newId(), dossierId, caseId, toAddress: 'somebody@people.test', mailId, sentBy: personId, at: AT });
  await tx.insert(schema.claim).values({ ...of, id: newId(), caseId, toWhom: 'Desk', sentOn: '2026-03-02', createdBy: personId });
  await tx.insert(schema.coreCredit).values({ ...of, id: newId(), caseId, fitId, toWhom: 'Desk', sentOn: '2026-03-02', createdBy: personId });
  const watchId = newId();
  await tx.insert(schema.watch).values({ ...of, id: watchId, caseId, unitId, causeId: 'cause', plan: {} as never, begin: [], startedAt: AT, startedBy: personId });
  await tx.insert(schema.watchLink).values({ ...of, id: newId(), watchId, caseId, checkId: 'c', forWhom: 'Driver', expiresAt: AT, createdBy: personId });
  await tx.insert(schema.watchReading).values({ ...of, id: newId(), watchId, caseId, checkId: 'c', kind: 'state', shares: [], verdict: 'in-order', personId, at: AT });
  const [gateId, passageId] = [newId(), newId()];
  await tx.insert(schema.gate).values({ ...of, id: gateId, siteId, name: 'Counter', askWhom: 'Desk', expiresAt: AT, createdBy: personId });
  await tx.insert(schema.gatePassage).values({ ...of, id: passageId, gateId, siteId, unitId, editionId, complaints: [], byName: 'Kim', startedAt: AT });
  await tx.insert(schema.gateAnswer).values({ ...of, id: newId(), passageId, checkId: 'c', place: 1, answer: { kind: 'cannot-tell' }, cautions: [], minutes: 1, at: AT });
  await tx.insert(schema.savedView).values({ ...of, id: newId(), personId, list: 'cases', name: 'Mine', query: 'whose=me' });
  await tx.insert(schema.removal).values({ ...of, id: newId(), entity: 'unit', entityId: unitId, kind: 'hide', reason: 'Test', personId, at: AT });
  await tx.insert(schema.audit).values({ ...of, id: newId(), action: 'test', entity: 'unit', entityId: unitId, changed: {} });
}
