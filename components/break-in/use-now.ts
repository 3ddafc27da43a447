'use client';

import { useEffect, useState } from 'react';
import { stamp } from '@/lib/offline/clock';

/**
 * The time by our clock, once a second while something runs and whenever the page comes to the front again: a hidden page's
 * timers sleep, the clock doesn't.
 *
 * @param atFirst ms, the server's time when it drew the page
 */
export function useNow(atFirst: number, runs: boolean): number {
  const [now, setNow] = useState(atFirst);
  useEffect(() => {
    if (!runs) return;
    const look = () => {
      const { deviceAt, clockOffsetMs } = stamp();
      setNow(Date.parse(deviceAt) + clockOffsetMs);
    };
    look();
    const timer = setInterval(look, 1000);
    document.addEventListener('visibilitychange', look);
    return () => {
      clearInterval(timer);
      document.removeEventListener('visibilitychange', look);
    };
  }, [runs]);
  return now;
}
