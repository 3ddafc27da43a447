import { z } from 'zod';
import type { CallView, CaseEventView, CaseHead, OtherHoldView, WatchingView } from '@/lib/schemas/case-view';
import { count, day, id, instant, list, probability } from './common';

const status = z.enum(['open', 'called', 'closed']);

export const caseList = list(
  'cases',
  z.object({
    id,
    number: count,
    status,
    complaints: z.array(z.string()),
    openedAt: instant,
    unitId: id,
    fleetNumber: z.string(),
    siteId: id,
    siteName: z.string(),
    assignedTo: id.nullable(),
    assignedToName: z.string().nullable(),
    editionId: id,
    leader: z.object({ causeId: z.string(), p: probability }).nullable(),
  }),
).meta({ id: 'CaseList' });

const head = z.object({
  id,
  number: count,
  unit: z.object({ id, fleetNumber: z.string(), vehicleKind: z.string() }),
  siteName: z.string(),
  timeZone: z.string(),
  fit: z.object({ modelName: z.string(), installedOn: day }).nullable(),
  complaintWords: z.string().nullable(),
  odometer: z.string().nullable(),
  openedBy: z.string(),
  openedAt: instant,
  editionNumber: count,
}) satisfies z.ZodType<CaseHead>;

const call = z
  .object({
    id,
    mainCause: z.string(),
    contributingCauses: z.array(z.string()),
    sureness: z.string(),
    proof: z.string(),
    whyNotLeading: z.string().nullable(),
    unlistedCause: z.string().nullable(),
    person: z.string(),
    at: instant,
    standing: z.boolean().meta({ description: 'The one that stands: no later one, the case not reopened since.' }),
  })
  .meta({ id: 'Call' }) satisfies z.ZodType<CallView>;

const event = z.object({ id, kind: z.string(), reason: z.string().nullable(), person: z.string(), at: instant }) satisfies z.ZodType<CaseEventView>;

const otherHold = z.object({ caseId: id, number: count, checks: z.array(z.string()), passed: z.array(z.string()) }) satisfies z.ZodType<OtherHoldView>;

const anotherCase = z.object({ caseId: id, number: count });
const watching = z
  .object({
    own: z.object({ until: day, isOver: z.boolean(), next: z.object({ check: z.string(), dueOn: day, state: z.enum(['waits', 'due', 'overdue']) }).nullable() }).nullable(),
    others: z.array(anotherCase.extend({ since: instant })),
    cameBackFrom: anotherCase.nullable(),
  })
  .meta({ description: 'The watch of this case under way, those of other cases of its unit, and the case whose repair didn’t hold that this one goes on with.' }) satisfies z.ZodType<WatchingView>;

export const caseRecord = z
  .object({
    head,
    assignedTo: id.nullable(),
    calls: z.array(call),
    events: z.array(event),
    moments: z.array(z.object({ at: instant, what: z.string() })).meta({ description: 'Instants that `at` of the state can be asked with.' }),
    usual: z.record(z.string(), z.string()).meta({ description: 'What is usual for the unit or its model, by the checks that compare with it.' }),
    catching: z.array(z.object({ checkId: z.string(), since: instant, remindAt: instant.nullable() })).meta({ description: 'Oil that is being caught for a check, now.' }),
    watching,
    otherHolds: z.array(otherHold).meta({ description: 'Other cases of the unit that forbid its release.' }),
  })
  .meta({ id: 'CaseRecord' });

export const opened = z.object({ id, number: count });
export const noted = z.object({ id, findingId: id, text: z.string(), person: z.string(), at: instant });
export const acknowledged = z.array(z.object({ cautionId: z.string(), dangers: z.array(z.string()) }));
export const peopleList = list('people', z.object({ id, name: z.string() }));
