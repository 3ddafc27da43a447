import 'server-only';
import type { z } from 'zod';
import { notSignedIn } from '@/lib/errors';
import type { Service } from '@/lib/services/define';
import type { Visit } from '@/lib/services/visit';
import { failureOf } from './failure';
import { formObject, valuesOf, type ActionState, type FormFields, type FormValues } from './form';
import { getContext } from './session';
import { getVisitor } from './visitor';

export type { ActionState } from './form';

interface Options<Result> {
  /** From the fields as text to what the service takes; without it the fields go as they are. */
  input?: (fields: FormFields) => unknown;
  /** After it worked: revalidate, redirect. */
  after?: (result: Result, fields: FormFields) => void | Promise<void>;
}

type Action<Result> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;

/**
 * A server action for a form, around a service: sign-in, role, parsing and what is said about errors are the same for
 * every one. For `useActionState`; works before scripts have loaded as well.
 *
 * @example
 * 'use server';
 * export const saveSite = action(changeSite, { after: () => revalidatePath('/settings/sites') });
 */
export const action = <Schema extends z.ZodType, Result>(service: Service<Schema, Result>, options: Options<Result> = {}): Action<Result> =>
  formAction<Schema, Result>(service.action, options, async (input) => {
    const ctx = await getContext();
    if (!ctx) throw notSignedIn();
    return service({ ctx, input });
  });

/** The same for what somebody does who isn't signed in. */
export const visitorAction = <Schema extends z.ZodType, Result>(visit: Visit<Schema, Result>, options: Options<Result> = {}): Action<Result> =>
  formAction<Schema, Result>('a visit', options, async (input) => visit({ visitor: await getVisitor(), input }));

function formAction<Schema extends z.ZodType, Result>(
  doing: string,
  { input: toInput = (fields) => fields, after }: Options<Result>,
  run: (input: z.input<Schema>) => Promise<Result>,
): Action<Result> {
  return async (_previous, form) => {
    let values: FormValues = {};
    try {
      const fields = formObject(form);
      values = valuesOf(fields);
      // What a browser sends is unknown until the service has parsed it, which is the first thing that it does.
      const result = await run(toInput(fields) as z.input<Schema>);
      await after?.(result, fields);
      return { ok: true, result };
    } catch (error) {
      const { message, fields, reference } = failureOf(error, doing);
      return { ok: false, message, fields, values, reference };
    }
  };
}
