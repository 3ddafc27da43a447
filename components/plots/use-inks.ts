import { useMemo, useSyncExternalStore } from 'react';

export interface Inks {
  ink: string;
  soft: string;
  rule: string;
  oil: string;
  text: string;
  mono: string;
}

const DARK = '(prefers-color-scheme: dark)';

/** Hears when the theme changes, by the system or by hand. */
function onTheme(changed: () => void): () => void {
  const media = matchMedia(DARK);
  const observer = new MutationObserver(changed);
  media.addEventListener('change', changed);
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme', 'class'] });
  return () => {
    media.removeEventListener('change', changed);
    observer.disconnect();
  };
}

const theme = () => `${document.documentElement.dataset.theme ?? ''}/${matchMedia(DARK).matches}`;

/** The page's colours and faces for a canvas, which knows no style sheet; anew when the theme changes. */
export function useInks(): Inks {
  const now = useSyncExternalStore(onTheme, theme, () => '');
  return useMemo(() => {
    void now;
    const style = getComputedStyle(document.documentElement);
    const of = (name: string) => style.getPropertyValue(name).trim();
    return { ink: of('--ink'), soft: of('--ink-soft'), rule: of('--rule'), oil: of('--oil'), text: getComputedStyle(document.body).fontFamily, mono: "'Atkinson Hyperlegible Mono', monospace" };
  }, [now]);
}
