'use client';

import { useEffect, useState } from 'react';

/** An address for what is on this device, as long as it is shown; null without one, and for the first instant. */
export function useObjectUrl(blob: Blob | undefined): string | null {
  const [url, setUrl] = useState<{ of: Blob; href: string } | null>(null);
  useEffect(() => {
    if (!blob) return;
    const href = URL.createObjectURL(blob);
    // eslint-disable-next-line react-hooks/set-state-in-effect -- an address has to be given back, which only an effect can
    setUrl({ of: blob, href });
    return () => URL.revokeObjectURL(href);
  }, [blob]);
  return url && url.of === blob ? url.href : null;
}
