'use client';

import { useEffect } from 'react';
import { onConnection, readConnection } from '@/lib/offline/connection';
import { takeDevice } from '@/lib/offline/owner';
import { startPhotoSender } from '@/lib/offline/photos-sender';
import { startSender } from '@/lib/offline/sender';

interface Props {
  personId: string;
  organisationId: string;
  /** Whether this person works on cases, which is what a device keeps. */
  keepsCases: boolean;
}

/** Once a page has come to rest, before the device fills its keep. */
const KEEP_AFTER_MS = 2_500;

/**
 * Sends what waits on this device, and keeps on it what a case needs without a connection. Without a keep of its own (a
 * private window) the browser works as any page does, with a connection.
 */
export function DeviceKeeper({ personId, organisationId, keepsCases }: Props) {
  useEffect(() => {
    if (!('indexedDB' in window) || !navigator.locks) return;
    let stopped = false;
    let stopSenders: () => void = () => undefined;
    let timer: ReturnType<typeof setTimeout> | undefined;

    async function fill(): Promise<void> {
      // The development server's files change under the same name.
      if (process.env.NODE_ENV !== 'production') return;
      if (!keepsCases || !readConnection().reachable || !('serviceWorker' in navigator)) return;
      await navigator.serviceWorker.register('/sw.js');
      await navigator.serviceWorker.ready;
      const { keepOpenCases } = await import('@/lib/offline/keep-open-cases');
      await navigator.locks.request('carryover-keep', { ifAvailable: true }, (lock) => (lock ? keepOpenCases() : undefined));
    }
    const fillSoon = () => {
      clearTimeout(timer);
      timer = setTimeout(() => void fill().catch(() => undefined), KEEP_AFTER_MS);
    };

    void takeDevice({ personId, organisationId })
      .then(() => {
        if (stopped) return;
        const senders = [startSender({ personId, organisationId }), startPhotoSender({ personId, organisationId })];
        stopSenders = () => senders.forEach((sender) => sender.stop());
        fillSoon();
      })
      .catch(() => undefined);
    const unsubscribe = onConnection(() => readConnection().reachable && fillSoon());
    return () => {
      stopped = true;
      clearTimeout(timer);
      unsubscribe();
      stopSenders();
    };
  }, [personId, organisationId, keepsCases]);
  return null;
}
