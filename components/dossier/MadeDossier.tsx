import Link from 'next/link';
import type { ReactNode } from 'react';
import { timeText } from '@/components/case/words';
import { buttonClass } from '@/components/ui/Button';
import { Tag } from '@/components/ui/Tag';
import type { DossierRowView, SendingView } from '@/lib/schemas/dossier';
import { AgainForm, SendForm, type DossierAction, type Made, type Sent } from './SendForms';

interface Props {
  dossier: DossierRowView;
  timeZone: string;
  newId: string;
  works: boolean;
  actions: { send: DossierAction<Sent>; sendAgain: DossierAction<Sent>; makeAgain: DossierAction<Made> };
}

const STATES = { waiting: 'PDF being made', made: 'PDF made', failed: 'PDF failed' } as const;
const PAPER = { a4: 'A4', letter: 'US letter' } as const;
const KIB = 1024;

/** One that was made: where its PDF stands, to whom it went, and what can be done with it. */
export function MadeDossier({ dossier, timeZone, newId, works, actions }: Props) {
  const { id: dossierId, caseId, reference, madeAt, madeBy, paper, state, error, bytes, leftOut, contentHash, sendings } = dossier;
  const of = { caseId, dossierId, reference };
  return (
    <li className="keep grid gap-3 border-b border-rule pb-5">
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
        <h3 className="figure text-xl">{reference}</h3>
        <Tag tone={state === 'made' ? 'strong' : 'plain'}>{STATES[state]}</Tag>
      </div>
      <p>
        {timeText(madeAt, timeZone)}, {madeBy}; {PAPER[paper]}
        {bytes !== null && `, ${Math.ceil(bytes / KIB).toLocaleString('en')} KiB`}
      </p>
      {leftOut.length > 0 && <p className="text-ink-soft">Left out: {leftOut.join('; ')}</p>}
      <p className="text-[0.9375rem] text-ink-soft">SHA-256 of its content <span className="figure wrap-anywhere">{contentHash}</span></p>
      {error && <p>{error}</p>}
      <div className="flex flex-wrap gap-3">
        <Link className={buttonClass({ variant: 'quiet' })} href={`/cases/${caseId}/dossier/${dossierId}`}>Read it<span className="sr-only">: {reference}</span></Link>
        {state === 'made' && <a className={buttonClass({ variant: 'quiet' })} href={`/api/v1/cases/${caseId}/dossiers/${dossierId}/pdf`} download={`${reference}.pdf`}>Download the PDF<span className="sr-only"> of {reference}</span></a>}
      </div>
      {state === 'failed' && works && <AgainForm action={actions.makeAgain} label={`Make the PDF of ${reference} again`} pendingLabel="Asking…" values={{ caseId, dossierId }} />}
      {sendings.length > 0 && (
        <ul className="grid gap-2">
          {sendings.map((sending) => (
            <Sending key={sending.id} sending={sending} timeZone={timeZone}>
              {works && sending.state === 'given-up' && <AgainForm action={actions.sendAgain} label={`Try again to send it to ${sending.to}`} pendingLabel="Posting…" values={{ caseId, dossierId, sendingId: sending.id }} />}
            </Sending>
          ))}
        </ul>
      )}
      {works && state === 'made' && <SendForm action={actions.send} {...of} newId={newId} />}
    </li>
  );
}

function Sending({ sending: { to, sentBy, at, state, sentAt, error }, timeZone, children }: { sending: SendingView; timeZone: string; children: ReactNode }) {
  return (
    <li className="grid gap-2 border-l-2 border-ink pl-3">
      <p>
        To <span className="wrap-anywhere">{to}</span>: {state === 'sent' ? `taken by the mail server ${sentAt ? timeText(sentAt, timeZone) : ''}` : state === 'waiting' ? 'waits to be sent' : 'not sent'}. Posted {timeText(at, timeZone)}, {sentBy}.
      </p>
      {state !== 'sent' && error && <p className="text-ink-soft">The last try: {error}</p>}
      {children}
    </li>
  );
}
