import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';

/**
 * The colours of both themes. They become CSS variables (`--paper`, `--ink-soft`, …) below, and
 * `tests/unit/ui/contrast.test.ts` computes the contrast of every pair in use from this table.
 *
 * - paper, sheet, sunk: grounds (the page; fields and raised parts; a band that lies lower)
 * - ink, inkSoft: text; edge: borders of controls; rule: hairlines that only decorate
 * - oil: lines that mean evidence or level; oilFill: the oil itself, always inside a line of ink;
 *   oilInk: the same meaning as text, and the surface of the oil
 * - danger, dangerGround: danger to people, and what was refused in a form
 */
export const palette = {
  light: {
    paper: '#f5eede',
    sheet: '#fcf8ee',
    sunk: '#eae1cc',
    ink: '#0f3138',
    inkSoft: '#3d5a5e',
    rule: '#c8bda3',
    edge: '#6b7f7d',
    oil: '#b56a00',
    oilFill: '#e2a02c',
    oilInk: '#7d4a00',
    danger: '#a8201a',
    dangerGround: '#fae3dc',
  },
  dark: {
    paper: '#0f1b1e',
    sheet: '#15262a',
    sunk: '#0a1315',
    ink: '#efe7d6',
    inkSoft: '#aab8b3',
    rule: '#30474b',
    edge: '#7d9490',
    oil: '#eca32a',
    oilFill: '#d9921c',
    oilInk: '#f3b554',
    danger: '#ff8f80',
    dangerGround: '#3a1714',
  },
} as const;

export type Token = keyof (typeof palette)['light'];

const kebab = (token: string) => token.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
const tokens = Object.keys(palette.light) as Token[];
/** What opens a list. A background can't take a variable's colour, so that each theme has its own. */
const arrow = (ink: string) => `url("data:image/svg+xml,%3Csvg xmlns='http://www.w3.org/2000/svg' viewBox='0 0 16 10'%3E%3Cpath d='M1.5 1.5 8 8l6.5-6.5' fill='none' stroke='${ink.replace('#', '%23')}' stroke-width='2.5'/%3E%3C/svg%3E")`;

const variables = (theme: keyof typeof palette) => ({
  colorScheme: theme,
  '--select-arrow': arrow(palette[theme].ink),
  ...Object.fromEntries(tokens.map((token) => [`--${kebab(token)}`, palette[theme][token]])),
});

export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(tokens.map((token) => [kebab(token), `var(--${kebab(token)})`])),
    },
    fontFamily: {
      heading: ['Archivo Variable', 'Archivo', 'Arial Narrow', 'sans-serif'],
      sans: ['Atkinson Hyperlegible Next', 'Verdana', 'sans-serif'],
      mono: ['Atkinson Hyperlegible Mono', 'ui-monospace', 'monospace'],
    },
    borderRadius: { none: '0', DEFAULT: '2px', full: '9999px' },
    extend: {
      spacing: { touch: '3rem' },
      maxWidth: { page: '80rem', prose: '38rem' },
    },
  },
  plugins: [
    plugin(({ addBase }) => {
      addBase({
        ':root': variables('light'),
        '@media (prefers-color-scheme: dark)': { ':root:not([data-theme])': variables('dark') },
        ':root[data-theme="dark"]': variables('dark'),
        // Paper is printed on paper, whatever the bay's screen shows.
        '@media print': { ':root, :root[data-theme]': { ...variables('light'), '--paper': '#fff', '--sheet': '#fff' } },
      });
    }),
  ],
} satisfies Config;
