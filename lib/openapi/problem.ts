import { z } from 'zod';

/** RFC 9457, as lib/auth/problem.ts answers it. */
export const problem = z
  .object({
    type: z.string().meta({ example: 'urn:carryover:problem:invalid' }),
    title: z.string(),
    status: z.int(),
    detail: z.string().meta({ description: 'What happened and what to do, in a sentence or two.' }),
    errors: z.record(z.string(), z.string()).optional().meta({ description: 'What is wrong with each field, by its path.' }),
    reference: z.string().optional().meta({ description: 'Names the entry in our log, for an error on our side.' }),
  })
  .meta({ id: 'Problem' });

/** What each status means here. */
export const PROBLEMS = {
  400: 'The body is not JSON.',
  401: 'No sign-in, or a token that does not work; `WWW-Authenticate` says why.',
  403: 'Your role does not allow it, or the token lacks the scope.',
  404: 'It does not exist, or is not your organisation’s.',
  409: 'In conflict with what is stored; the sentence says with what.',
  412: 'It was changed since the state that `If-Match` names.',
  413: 'The body is too large.',
  422: 'Something in it is not valid; `errors` says what by field.',
  428: '`If-Match` is missing.',
  500: 'An error on our side; nothing was saved.',
} as const;

export type ProblemStatus = keyof typeof PROBLEMS;
