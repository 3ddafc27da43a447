import sharp from 'sharp';
import { extractText, getDocumentProxy, getMeta } from 'unpdf';
import { describe, expect, it } from 'vitest';
import { dossierContent } from '@/lib/dossier/content';
import { dossierPdf } from '@/lib/pdf';
import { printable } from '@/lib/pdf/printable';
import { finding, NOTHING_OUT, parts } from '../dossier/parts';

const picture = await sharp({ create: { width: 400, height: 300, channels: 3, background: '#c86' } }).jpeg().toBuffer();
const made = (paper: 'a4' | 'letter', more: Parameters<typeof parts>[0] = {}) =>
  dossierPdf({ content: dossierContent(parts(more), NOTHING_OUT), contentHash: 'ab'.repeat(32), paper, madeAt: new Date('2026-03-02T15:10:00Z'), pictures: () => picture });
const opened = (pdf: Buffer) => getDocumentProxy(new Uint8Array(pdf));

describe('the PDF of a dossier', () => {
  it('keeps every letter, whatever was set before it in the same process', async () => {
    // Its title has a colon, which is drawn of full stops, and no full stop in bold: one stays in memory that stands for no letter.
    await made('letter');
    const source = "model commercial driver's licence manual, section 5.3, as states print it (driver's check)";
    const { findings } = parts();
    const standing = [finding({ judgement: { limit: { id: 'l', checkId: 'build-up-time', least: null, most: 25, below: false, source }, verdict: 'out', doubtful: false } })];
    const { text } = await extractText(await opened(await made('letter', { findings: { ...findings, standing } })), { mergePages: true });
    expect(text.replace(/\s+/g, ' ')).toContain(source);
  });

  it.each([
    ['a4', 595, 842],
    ['letter', 612, 792],
  ] as const)('is set on %s', async (paper, width, height) => {
    const page = await (await opened(await made(paper))).getPage(1);
    const { width: w, height: h } = page.getViewport({ scale: 1 });
    expect([Math.round(w), Math.round(h)]).toEqual([width, height]);
  });

  it('has its title and language, and on every page its number, reference and hash', async () => {
    const causes = Array.from({ length: 8 }, (_, i) => ({ name: `Cause ${i}`, p: 0.125, reasons: Array.from({ length: 6 }, () => ({ finding: 'A check: an answer', direction: 'for' as const, strength: 'strongly', note: 'Words that take their place on paper. '.repeat(6) })) }));
    const pdf = await opened(await made('a4', { ranking: { ...parts().ranking, causes } }));
    const { info } = await getMeta(pdf);
    expect(info).toMatchObject({ Title: 'D-2026-00012: Dossier of case 7: unit K-104', Language: 'en' });
    const { text, totalPages } = await extractText(pdf, { mergePages: false });
    expect(totalPages).toBeGreaterThan(1);
    for (const [i, page] of text.entries()) {
      for (const words of [`page ${i + 1} of ${totalPages}`, 'D-2026-00012', 'ab'.repeat(32)]) expect(page).toContain(words);
    }
  });

  it('embeds its fonts', async () => {
    const bytes = (await made('a4')).toString('latin1');
    expect(bytes).toContain('/FontFile');
    expect(bytes).not.toContain('/Helvetica');
  });
});

describe('words that are printed', () => {
  it.each([
    ['48\u00a0s ± 1\u00a0s', '48\u00a0s ± 1\u00a0s'],
    ['Łódź, Ångström, ÷ × ½ “q” – …', 'Łódź, Ångström, ÷ × ½ “q” – …'],
    ['≤ 12 μm', '<= 12 um'],
    ['CO₂', 'CO2'],
    ['5/8″', '5/8"'],
    ['油漏', '??'],
    ['a\u200bb\u00adc', 'abc'],
  ])('%s', (words, printed) => expect(printable(words)).toBe(printed));
});
