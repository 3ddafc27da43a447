'use client';

import { useId, useState, type ChangeEvent } from 'react';
import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Notice } from '@/components/ui/Notice';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

type Verified = { found: 'content' | 'pdf'; madeAt: string } | { found: null };

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'short', timeZone: 'UTC' });

/** A file's hash is worked out on the device: the file stays there. */
export function VerifyForm({ action }: { action: (previous: ActionState<Verified>, form: FormData) => Promise<ActionState<Verified>> }) {
  const form = useForm(action);
  const [reference, hash] = [form.field('reference'), form.field('hash')];
  // Kept as they stand when the answer has come, to be put right or tried with another file.
  const [typed, setTyped] = useState({ reference: reference.defaultValue, hash: hash.defaultValue });
  const type = (name: keyof typeof typed) => ({ target }: ChangeEvent<HTMLInputElement>) => setTyped((before) => ({ ...before, [name]: target.value }));
  return (
    <>
      <h2 className="sr-only">What came of it</h2>
      <div role="status">{form.result && <Outcome verified={form.result} />}</div>
      <Form form={form} label="Verify a dossier" errorTitle="Not looked up yet">
        <TextField label="Reference" hint="At the head of the dossier" autoComplete="off" autoCapitalize="characters" required name="reference" error={reference.error} value={typed.reference} onChange={type('reference')} />
        <FileHash onHash={(ofFile) => setTyped((before) => ({ ...before, hash: ofFile }))} />
        <TextField label="Hash (SHA-256)" hint="Filled in from the file, or as it is printed" autoComplete="off" autoCapitalize="none" spellCheck={false} required name="hash" error={hash.error} value={typed.hash} onChange={type('hash')} />
        <div>
          <SubmitButton pendingLabel="Looking…">Verify</SubmitButton>
        </div>
      </Form>
    </>
  );
}

function FileHash({ onHash }: { onHash: (hash: string) => void }) {
  const id = useId();
  const [problem, setProblem] = useState<string>();
  async function read({ target }: ChangeEvent<HTMLInputElement>) {
    const file = target.files?.[0];
    if (!file) return;
    // Browsers work hashes out only where nobody can listen in.
    if (!window.crypto?.subtle) return setProblem('This browser can’t work out the hash here. Type the one that is printed.');
    setProblem(undefined);
    const digest = await crypto.subtle.digest('SHA-256', await file.arrayBuffer());
    onHash(Array.from(new Uint8Array(digest), (byte) => byte.toString(16).padStart(2, '0')).join(''));
  }
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="font-bold">The PDF that you hold</label>
      <p id={`${id}-hint`} className="text-[0.9375rem] text-ink-soft">It stays on this device: only its hash is sent.</p>
      <input id={id} type="file" accept="application/pdf" aria-describedby={`${id}-hint`} onChange={(event) => void read(event)} className="w-full min-w-0 py-1 file:mr-4 file:min-h-touch file:cursor-pointer file:rounded file:border file:border-edge file:bg-transparent file:px-5" />
      {problem && <p role="alert">{problem}</p>}
    </div>
  );
}

function Outcome({ verified }: { verified: Verified }) {
  if (verified.found === null) {
    return <Notice title="Not one that was made here, or changed since">No dossier has this reference and this hash together. Check both for a slip. If the hash is that of the file, the file is not as it was made.</Notice>;
  }
  const when = `${day.format(new Date(verified.madeAt))} UTC`;
  if (verified.found === 'pdf') return <Notice title="Unchanged">This file is what was made on {when}, to the last byte.</Notice>;
  return <Notice title="Such a dossier was made here">On {when}, with this reference and this hash of its content. That a paper says what was made then, only its file can tell: choose the PDF to be sure.</Notice>;
}
