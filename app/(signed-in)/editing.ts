import { revalidatePath } from 'next/cache';
import type { ActionState } from '@/lib/auth/form';

type Action<Result> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;

/**
 * The action of a form that is filled from a row and carries its version along. When it is refused, the page comes
 * back with the answer, read anew: what was typed stays, and saving once more is meant against what is stored now,
 * which the refusal has shown.
 */
export const editing =
  <Result>(act: Action<Result>, pages: string): Action<Result> =>
  async (previous, form) => {
    const state = await act(previous, form);
    if (state && !state.ok) revalidatePath(pages, 'layout');
    return state;
  };
