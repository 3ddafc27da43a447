import { createRequire } from 'node:module';
import { Font } from '@react-pdf/renderer';

const resolve = createRequire(import.meta.url).resolve;
const file = (face: 'next' | 'mono', subset: string, weight: number) => resolve(`@fontsource/atkinson-hyperlegible-${face}/files/atkinson-hyperlegible-${face}-${subset}-${weight}-normal.woff`);

/** One family for each subset: a sign that the first doesn't have is taken from the second. */
const family = (name: string, face: 'next' | 'mono', subset: string) =>
  Font.register({ family: name, fonts: [400, 700].map((fontWeight) => ({ src: file(face, subset, fontWeight), fontWeight })) });

export const TEXT = ['Text', 'Text more'];
export const FIGURES = ['Figures', 'Figures more'];

let areThere = false;

/** The application's own faces, from its packages: embedded in the file, fetched from nowhere. */
export function registerFonts(): void {
  if (areThere) return;
  family('Text', 'next', 'latin');
  family('Text more', 'next', 'latin-ext');
  family('Figures', 'mono', 'latin');
  family('Figures more', 'mono', 'latin-ext');
  // A hash or a part number that is broken by a hyphen is another one.
  Font.registerHyphenationCallback((word) => [word]);
  areThere = true;
}
