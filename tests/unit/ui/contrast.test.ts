import { describe, expect, test } from 'vitest';
import { palette, type Token } from '../../../tailwind.config';

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const channel = parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  }) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [dark, light] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

const grounds: Token[] = ['paper', 'sheet', 'sunk'];

/** Text needs 4.5 (1.4.3); borders of controls, fills that carry meaning and the focus outline need 3 (1.4.11). */
const pairs: [Token, Token, number][] = [
  ...grounds.flatMap((ground): [Token, Token, number][] => [
    ['ink', ground, 4.5],
    ['inkSoft', ground, 4.5],
    ['oilInk', ground, 4.5],
    ['danger', ground, 4.5],
    ['edge', ground, 3],
    ['oil', ground, 3],
  ]),
  ['paper', 'ink', 4.5],
  ['paper', 'inkSoft', 4.5],
  ['paper', 'danger', 4.5],
  ['ink', 'dangerGround', 4.5],
  ['danger', 'dangerGround', 4.5],
  ['edge', 'dangerGround', 3],
];

test('the formula gives the published extremes', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10);
  expect(contrast('#777777', '#ffffff')).toBeCloseTo(4.48, 2); // WebAIM's well-known near miss, from memory
});

describe.each(['light', 'dark'] as const)('%s theme', (theme) => {
  test.each(pairs)('%s on %s reaches %s to 1', (front, ground, needed) => {
    expect(contrast(palette[theme][front], palette[theme][ground])).toBeGreaterThanOrEqual(needed);
  });
});
