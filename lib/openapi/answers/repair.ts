import { z } from 'zod';
import { STATION_IDS } from '@/lib/diagnose/stations';
import { STEP_MARKS, type RepairPlanView, type RepairView } from '@/lib/schemas/repair';
import { day, id, instant, probability } from './common';

const money = z.number().meta({ description: 'In the organisation’s currency.' });

export const repairPlan = z
  .object({
    caseId: id,
    currency: z.string(),
    labourRatePerHour: money,
    rateFrom: z.enum(['organisation', 'rulebook']),
    remedies: z.array(
      z.object({
        remedyId: z.string(),
        name: z.string(),
        station: z.enum(STATION_IDS).nullable(),
        causeIds: z.array(z.string()).meta({ description: 'That it removes and none before it does.' }),
        p: probability.meta({ description: 'That it is the one.' }),
        pWhenReached: probability.meta({ description: 'The same, given that none before it was.' }),
        lookMinutes: z.number(),
        fixMinutes: z.number(),
        lookCost: money,
        fixCost: money,
        comebackCost: money,
        parts: z.array(z.object({ name: z.string(), cost: money })),
        why: z.string(),
        called: z.boolean().meta({ description: 'It removes what the standing call named.' }),
        cautions: z.array(z.object({ id: z.string(), text: z.string() })),
        toRead: z.array(z.string()).meta({ description: 'Cautions that you have still to acknowledge today.' }),
        steps: z.array(z.string()),
        basis: z.string(),
        source: z.string().nullable(),
      }),
    ),
    left: z.array(z.object({ causeId: z.string(), name: z.string(), p: probability })),
    expectedCost: money,
    costOfLeaving: money,
    exact: z.boolean().meta({ description: 'The best of all orders; else a good one.' }),
  })
  .meta({ id: 'RepairPlan' }) satisfies z.ZodType<RepairPlanView>;

const mark = z.object({ mark: z.enum(STEP_MARKS), value: z.string().nullable(), note: z.string().nullable(), by: z.string(), at: instant });

const chosen = z.object({
  id,
  remedyId: z.string(),
  name: z.string(),
  chosenAt: instant,
  chosenBy: z.string(),
  whyBefore: z.string().nullable().meta({ description: 'Why it went before what the plan had first.' }),
  plannedOn: day.nullable(),
  assignedTo: id.nullable(),
  assignedToName: z.string().nullable(),
  endedAt: instant.nullable(),
  endedBy: z.string().nullable(),
  outcome: z.string().nullable().meta({ description: 'done, dropped' }),
  whyDropped: z.string().nullable(),
  cautions: z.array(z.object({ id: z.string(), text: z.string() })),
  toRead: z.array(z.string()).meta({ description: 'Cautions that you have still to acknowledge today.' }),
  steps: z.array(z.object({ text: z.string(), mark: mark.nullable() })),
  place: z.int().meta({ description: 'Of the case’s repairs, from 1. What is seen at it is of the stage “after-remedy” with this number.' }),
  looks: z.array(z.string()).meta({ description: 'Checks that tell most when something is opened for it.' }),
}) satisfies z.ZodType<RepairView>;

export const repairList = z.object({ caseId: id, repairs: z.array(chosen) }).meta({ id: 'RepairList' });
export const repairWritten = z.object({ id, caseId: id });
