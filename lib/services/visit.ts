import type { z } from 'zod';
import { invalid } from '@/lib/errors';
import type { Visitor } from './context';
import { fieldErrors } from './field-errors';
import { refuseUnkeepable } from './unkeepable';

interface Definition<Schema extends z.ZodType, Result> {
  input: Schema;
  run: (work: { visitor: Visitor; input: z.output<Schema> }) => Promise<Result>;
}

export interface Visit<Schema extends z.ZodType, Result> {
  readonly input: Schema;
  (args: { visitor: Visitor; input: z.input<Schema> }): Promise<Result>;
}

/** What somebody can do who isn't signed in: parse, then work. There is no role to check and no organisation to set. */
export function defineVisit<Schema extends z.ZodType, Result>({ input: schema, run }: Definition<Schema, Result>): Visit<Schema, Result> {
  const visit = async ({ visitor, input }: { visitor: Visitor; input: z.input<Schema> }) => {
    refuseUnkeepable(input);
    const parsed = schema.safeParse(input);
    if (!parsed.success) throw invalid(fieldErrors(parsed.error));
    return run({ visitor, input: parsed.data });
  };
  return Object.assign(visit, { input: schema });
}
