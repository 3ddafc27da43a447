import { createRequire } from 'node:module';
import { Font } from '@react-pdf/renderer';

const resolve = createRequire(import.meta.url).resolve;
const file = (face: 'next' | 'mono', subset: string, weight: number) => resolve(`@fontsource/atkinson-hyperlegible-${face}/files/atkinson-hyperlegible-${face}-${subset}-${weight}-normal.woff`);

export const TEXT = ['Text', 'Text more'];
export const FIGURES = ['Figures', 'Figures more'];

/** One family for each subset: a sign that the first doesn't have is taken from the second. */
const FAMILIES = [
  ['Text', 'next', 'latin'],
  ['Text more', 'next', 'latin-ext'],
  ['Figures', 'mono', 'latin'],
  ['Figures more', 'mono', 'latin-ext'],
] as const;

/**
 * The application's own faces, from its packages: embedded in the file, fetched from nowhere. Read anew for each document:
 * embedding one leaves glyphs in the reader's memory that stand for no letter, by which the lines of the next would be
 * broken one letter off.
 */
export function readyFonts(): void {
  const registered = Font.getRegisteredFonts();
  for (const [name, face, subset] of FAMILIES) {
    delete registered[name];
    Font.register({ family: name, fonts: [400, 700].map((fontWeight) => ({ src: file(face, subset, fontWeight), fontWeight })) });
  }
  // A hash or a part number that is broken by a hyphen is another one.
  Font.registerHyphenationCallback((word) => [word]);
}
