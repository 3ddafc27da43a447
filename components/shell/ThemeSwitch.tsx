'use client';

import { useId, useState } from 'react';
import { applyTheme, themes, type Theme } from './theme';

const words: Record<Theme, string> = { device: 'As device', light: 'Light', dark: 'Dark' };

/** Light, dark, or as the device asks. Takes effect at once and is kept in a cookie that the server reads. */
export function ThemeSwitch({ theme }: { theme: Theme }) {
  const [chosen, setChosen] = useState(theme);
  const name = useId();

  function choose(next: Theme) {
    setChosen(next);
    applyTheme(next);
  }

  return (
    <fieldset className="min-w-0">
      <legend className="label mb-1 text-ink-soft">Theme</legend>
      <div className="flex rounded border border-edge">
        {themes.map((option) => (
          <label
            key={option}
            className="grid min-h-touch flex-1 cursor-pointer place-items-center border-l border-edge px-3 font-heading font-semibold font-stretch-[80%] whitespace-nowrap first:border-l-0 hover:bg-sunk has-[:checked]:bg-ink has-[:checked]:text-paper has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-ink"
          >
            <input type="radio" className="sr-only" name={name} value={option} checked={chosen === option} onChange={() => choose(option)} />
            {words[option]}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
