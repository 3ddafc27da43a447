import { useCallback, useSyncExternalStore } from 'react';

/** Whether a media query holds, now and as it changes; false on the server. */
export function useMedia(query: string): boolean {
  const subscribe = useCallback((changed: () => void) => {
    const media = matchMedia(query);
    media.addEventListener('change', changed);
    return () => media.removeEventListener('change', changed);
  }, [query]);
  return useSyncExternalStore(subscribe, () => matchMedia(query).matches, () => false);
}
