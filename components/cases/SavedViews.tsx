'use client';

import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { ActionState } from '@/lib/auth/form';

type Action<Result> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;

interface View {
  id: string;
  name: string;
}

interface SaveProps<Result> {
  action: Action<Result>;
  list: string;
  /** The filters in use, as they stand in the address. */
  query: string;
  /** A fresh one for each view. */
  id: string;
}

/** Keeps the filters in use under a name. */
export function SaveView<Result>({ action, list, query, id }: SaveProps<Result>) {
  const form = useForm(action);
  return (
    <Disclosure summary="Save this view" open={form.message !== undefined} className="print:hidden">
      <Form form={form} label="Save this view" saved="It stands with the views above.">
        <input type="hidden" name="id" value={id} readOnly />
        <input type="hidden" name="list" value={list} readOnly />
        <input type="hidden" name="query" value={query} readOnly />
        <TextField label="Name of the view" hint="Its filters and its order are kept, for you alone." autoComplete="off" required {...form.field('name')} />
        <div><SubmitButton>Save the view</SubmitButton></div>
      </Form>
    </Disclosure>
  );
}

interface ChangeProps<Renamed, Removed> {
  rename: Action<Renamed>;
  remove: Action<Removed>;
  views: readonly View[];
}

/** Names and deletes one's own views; renders nothing without any. */
export function ChangeViews<Renamed, Removed>({ rename, remove, views }: ChangeProps<Renamed, Removed>) {
  if (views.length === 0) return null;
  return (
    <Disclosure summary="Rename or delete a view" className="print:hidden">
      <ul className="grid max-w-prose gap-2">
        {views.map((view) => (
          <li key={view.id} className="flex flex-wrap items-end gap-3 border-b border-rule pb-3">
            <RenameView action={rename} view={view} />
            <RemoveView action={remove} view={view} />
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}

function RenameView<Result>({ action, view }: { action: Action<Result>; view: View }) {
  const form = useForm(action);
  const field = form.field('name', view.name);
  return (
    <form action={form.submit} aria-label={`Rename ${view.name}`} className="flex min-w-0 flex-1 flex-wrap items-end gap-3">
      <input type="hidden" name="id" value={view.id} readOnly />
      <TextField key={form.attempt} label={`Name of “${view.name}”`} autoComplete="off" required className="min-w-0 flex-1 basis-48" {...field} id={`name-${view.id}`} error={field.error ?? form.message} />
      <SubmitButton variant="quiet">Rename</SubmitButton>
    </form>
  );
}

function RemoveView<Result>({ action, view }: { action: Action<Result>; view: View }) {
  const form = useForm(action);
  return (
    <form action={form.submit} aria-label={`Delete ${view.name}`}>
      <input type="hidden" name="id" value={view.id} readOnly />
      <SubmitButton variant="quiet" pendingLabel="Deleting…" aria-label={`Delete the view ${view.name}`}>Delete</SubmitButton>
    </form>
  );
}
