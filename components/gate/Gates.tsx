'use client';

import Link from 'next/link';
import { useActionState } from 'react';
import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { ActionState } from '@/lib/auth/form';

type Written = ActionState<{ id: string; siteId: string }>;
type Action = (previous: Written, form: FormData) => Promise<Written>;

interface Gate {
  id: string;
  name: string;
  state: 'open' | 'revoked' | 'expired';
  passages: number;
  /** A day. */
  until: string;
}

interface Props {
  siteId: string;
  newId: string;
  gates: readonly Gate[];
  make: Action;
  revoke: Action;
}

/** The gates of a site: the links that hang at its parts counter. */
export function Gates({ siteId, newId, gates, make, revoke }: Props) {
  const form = useForm(make);
  return (
    <div className="grid gap-6">
      {gates.length > 0 && (
        <ul className="grid gap-3">
          {gates.map((gate) => (
            <li key={gate.id} className="flex flex-wrap items-center justify-between gap-3 border-b border-rule pb-3">
              <span>
                {gate.state === 'open' ? <Link href={`/settings/sites/${siteId}/gates/${gate.id}`}>{gate.name}: link and code to print</Link> : gate.name}
                <span className="block text-ink-soft">{gate.state === 'open' ? `Works until ${gate.until}` : gate.state === 'revoked' ? 'Revoked' : `Ran out ${gate.until}`}. Passed {gate.passages} {gate.passages === 1 ? 'time' : 'times'}.</span>
              </span>
              {gate.state === 'open' && <Revoke siteId={siteId} gate={gate} action={revoke} />}
            </li>
          ))}
        </ul>
      )}
      <Form key={newId} form={form} label="A gate" saved="Its link is in the list above.">
        <Hidden values={{ id: newId, siteId }} />
        <TextField label="Where it hangs" hint="Such as: Parts counter" autoComplete="off" required {...form.field('name')} />
        <TextField label="Whom to ask" hint="Its page says this where it can’t help: the workshop desk, extension 12" autoComplete="off" required {...form.field('askWhom')} />
        <TextField label="Days that it works" inputMode="numeric" autoComplete="off" required {...form.field('days', '365')} />
        <SubmitButton>Make the gate</SubmitButton>
      </Form>
    </div>
  );
}

function Revoke({ siteId, gate, action }: { siteId: string; gate: Gate; action: Action }) {
  const [state, submit] = useActionState(action, null);
  return (
    <form action={submit}>
      <Hidden values={{ siteId, gateId: gate.id }} />
      <SubmitButton variant="quiet" pendingLabel="Revoking…">Revoke<span className="sr-only"> the gate {gate.name}</span></SubmitButton>
      <span role="status">{state && !state.ok ? state.message : ''}</span>
    </form>
  );
}
