import { useState, type KeyboardEvent } from 'react';

/**
 * The chosen one of the options under a combobox, by its id; none at first and after what was typed has changed. The
 * focus stays in the box, which says by `aria-activedescendant` which option it is.
 */
export function useOptions(ids: readonly string[]) {
  const [chosen, setChosen] = useState<string | null>(null);
  const active = chosen !== null && ids.includes(chosen) ? chosen : null;

  /** Above the first and below the last lies the box itself. */
  function step(by: 1 | -1): void {
    const places = ids.length + 1;
    const at = active === null ? 0 : ids.indexOf(active) + 1;
    const next = ids[((at + by + places) % places) - 1] ?? null;
    setChosen(next);
    if (next !== null) document.getElementById(next)?.scrollIntoView({ block: 'nearest' });
  }

  function onKeyDown(event: KeyboardEvent): void {
    if (event.nativeEvent.isComposing || event.altKey || event.ctrlKey || event.metaKey || ids.length === 0) return;
    if (event.key !== 'ArrowDown' && event.key !== 'ArrowUp') return;
    event.preventDefault();
    step(event.key === 'ArrowDown' ? 1 : -1);
  }
  return { active, choose: setChosen, onKeyDown };
}
