import { route } from '@/lib/auth/route';
import { workedOut } from '@/lib/openapi/answers/bench';
import { workOutSum } from '@/lib/services/bench/work-out';

export const POST = route(workOutSum, {
  scope: 'bench:read',
  doc: {
    summary: 'Work out a sum',
    description: 'From readings as they are typed, each with its unit and how far it can be off. Nothing is written.',
    answers: workedOut,
  },
});
