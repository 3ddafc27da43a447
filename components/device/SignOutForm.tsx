'use client';

import { unstable_rethrow } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { unsentCount, wipeDevice } from '@/lib/offline/wipe';

/** Signs out and takes everything off the device; asks first where that would lose something. */
export function SignOutForm({ action }: { action: () => Promise<void> }) {
  const [wouldLose, setWouldLose] = useState(0);
  const [failed, setFailed] = useState(false);
  return (
    <form
      className="grid gap-3"
      action={async () => {
        setFailed(false);
        const unsent = await unsentCount();
        if (unsent > 0 && wouldLose === 0) {
          setWouldLose(unsent);
          return;
        }
        await wipeDevice();
        setWouldLose(0);
        try {
          await action();
        } catch (error) {
          unstable_rethrow(error);
          setFailed(true);
        }
      }}
    >
      {wouldLose > 0 && (
        <Notice kind="danger" title={`${wouldLose} ${wouldLose === 1 ? 'entry is' : 'entries are'} on this device only`}>
          They are sent when the connection is back. Signing out now throws them away.
        </Notice>
      )}
      {failed && (
        <Notice kind="danger" title="You are still signed in">
          Carryover could not be reached. Cases were taken off this device; sign out again when the connection is back.
        </Notice>
      )}
      <Button type="submit" variant="quiet" wide>{wouldLose > 0 ? 'Sign out and throw them away' : 'Sign out'}</Button>
    </form>
  );
}
