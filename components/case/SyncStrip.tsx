'use client';

import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { percent } from '@/components/ui/SightGlass';
import { discard, tryAgain, type Kept } from '@/lib/offline/waiting';
import type { RulebookView } from '@/lib/schemas/case-view';
import type { Sync } from './use-case';

/** How page and server stand to each other; nothing at all while everything is saved. */
export function SyncStrip({ sync, rulebook }: { sync: Sync; rulebook: RulebookView }) {
  const { reachable, signedOut, unsent, refused, provisional, difference } = sync;
  return (
    <div className="grid gap-3 empty:hidden" data-testid="sync">
      {signedOut && (
        <Notice title="You are signed out">
          {unsent.length > 0 && 'What you entered is kept on this device and is sent once you are back. '}
          <a className="underline underline-offset-4" href={`/sign-in?next=${typeof location === 'undefined' ? '' : encodeURIComponent(location.pathname)}`}>Sign in again</a>
        </Notice>
      )}
      {!reachable && (
        <Notice title="No connection">
          Go on: each answer is kept on this device. {waitsText(unsent)} {provisional && 'The ranking is provisional, worked out on this device.'}
        </Notice>
      )}
      {difference && (
        <Notice title="The server ranks otherwise than this device did">
          {rulebook.causes[difference.causeId]?.name ?? difference.causeId}: <span className="figure">{percent(difference.is)}</span>, shown here as{' '}
          <span className="figure">{percent(difference.was)}</span>. {difference.others.length > 0 && `Meanwhile ${difference.others.join(' and ')} answered too.`}
        </Notice>
      )}
      {refused.map((item) => <Refused key={item.order} item={item} rulebook={rulebook} />)}
    </div>
  );
}

/**
 * That the server takes its time. It comes and goes by itself long after a tap, so that it stands below the check at hand,
 * where it moves nothing that one is about to tap; the ranking itself says that it is provisional.
 */
export function SlowNote({ sync: { reachable, signedOut, unsent, provisional } }: { sync: Sync }) {
  if (!reachable || signedOut || !provisional) return null;
  return <Notice title="Slow connection">{waitsText(unsent)} Until then the ranking is provisional, worked out on this device.</Notice>;
}

function waitsText(unsent: Sync['unsent']): string {
  if (unsent.length === 0) return '';
  return `${unsent.length === 1 ? 'One entry waits' : `${unsent.length} entries wait`} on this device and ${unsent.length === 1 ? 'goes' : 'go'} out when the connection is back.`;
}

function Refused({ item, rulebook }: { item: Kept; rulebook: RulebookView }) {
  const checkId = item.kind === 'finding' || item.kind === 'acknowledgement' ? item.body.checkId : null;
  return (
    <Notice
      kind="danger"
      title="Not taken by the server, kept here"
      actions={
        <>
          <Button onClick={() => void tryAgain(item)}>Send it again</Button>
          <Button variant="quiet" onClick={() => void discard(item)}>Throw it away</Button>
        </>
      }
    >
      {checkId && <>{rulebook.checks[checkId]?.name ?? checkId}: </>}
      {item.refusal?.message} {Object.values(item.refusal?.fields ?? {}).filter((text) => text.includes(' ')).join(' ')}
    </Notice>
  );
}
