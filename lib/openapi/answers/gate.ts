import { z } from 'zod';
import { count, id, instant } from './common';
import { siteAnswer } from './record';

const text = z.string();

const gate = z.object({
  id,
  name: text,
  askWhom: text,
  createdBy: text,
  createdAt: instant,
  expiresAt: instant,
  state: z.enum(['open', 'revoked', 'expired']),
  passages: count.meta({ description: 'That ended with a verdict.' }),
  path: text.nullable(),
});

export const gateList = z.object({ site: siteAnswer, gates: z.array(gate) }).meta({ id: 'GateList' });
export const gateWritten = z.object({ id, siteId: id });
