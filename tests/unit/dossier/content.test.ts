import { describe, expect, it } from 'vitest';
import { contentHash } from '@/lib/dossier/canonical';
import { dossierContent } from '@/lib/dossier/content';
import { makeNamer } from '@/lib/dossier/namer';
import { dossierReference } from '@/lib/dossier/reference';
import { dossierContent as schema, DOSSIER_SECTION_IDS, type DossierBlock } from '@/lib/schemas/dossier-content';
import { finding, NOTHING_OUT, parts } from './parts';

const blocksOf = (content: ReturnType<typeof dossierContent>, id: string): DossierBlock[] => content.sections.find((section) => section.id === id)?.blocks ?? [];
const tableOf = (blocks: DossierBlock[]) => {
  const table = blocks.find((block) => block.kind === 'table');
  if (table?.kind !== 'table') throw new Error('no table');
  return table;
};

describe('what a dossier says', () => {
  it('is of its schema, with every section in its order', () => {
    const content = dossierContent(parts(), NOTHING_OUT);
    expect(schema.parse(content)).toEqual(content);
    expect(content.sections.map(({ id }) => id)).toEqual(DOSSIER_SECTION_IDS);
    expect(content.leftOut).toEqual([]);
  });

  it('says how it was fitted, run in, released and proved, and makes what is missing or speaks against it stand out', () => {
    const content = dossierContent(parts(), NOTHING_OUT);
    expect(tableOf(blocksOf(content, 'install')).rows.map(({ cells, strong }) => [cells[1], strong])).toEqual([['A bead (known to shorten its life)', true], ['Not answered', true]]);
    // 550 kPa, ten minutes after the start.
    expect(tableOf(blocksOf(content, 'break-in')).rows).toMatchObject([{ cells: ['10 min 0 s', expect.stringMatching(/^5\.5\d? bar$|^550 kPa$/), 'yes'] }]);
    expect(JSON.stringify(blocksOf(content, 'break-in'))).toContain('25 min 0 s');
    expect(JSON.stringify(blocksOf(content, 'release'))).toContain('by this right: Inspector since 2019');
    expect(JSON.stringify(blocksOf(content, 'proof'))).toContain('several things were changed together, and it held');
    const nothing = dossierContent(parts({ installs: [], breakIns: [], releases: [], watches: [] }), NOTHING_OUT);
    for (const id of ['install', 'break-in', 'release', 'proof']) expect(blocksOf(nothing, id)).toMatchObject([{ kind: 'text' }]);
  });

  it('gives a measured value its limit, where that comes from, and the verdict, with who and when and what was noted', () => {
    const [row] = tableOf(blocksOf(dossierContent(parts(), NOTHING_OUT), 'measurements')).rows;
    expect(row?.cells.map((cell) => cell.replaceAll('\u00a0', ' '))).toEqual([expect.any(String), '48 s ± 1 s', 'at most 25 s', 'Our own rule 7', 'Out of limit']);
    expect(row).toMatchObject({ strong: true, note: '2 Mar 2026, 09:10, Ada “Cold engine”' });
  });

  it('shows a value in its maker’s units, and as it was typed where that was in others', () => {
    const compiled = parts().findings.compiled;
    const standing = [finding({ checkId: 'cut-out-pressure', valueTyped: '120 psi', valueSi: 827_370.875, errorSi: null, unit: 'psi', judgement: null })];
    const [row] = tableOf(blocksOf(dossierContent(parts({ findings: { compiled, standing, notes: [] } }), NOTHING_OUT), 'measurements')).rows;
    expect(row?.cells[1]?.replaceAll('\u00a0', ' ')).toBe('827 kPa, typed as “120 psi”');
    expect(row?.cells.slice(2)).toEqual(['none adopted', '', 'Not judged']);
  });

  it('says what was said of each step of a repair, and of which nothing was', () => {
    const { rows } = tableOf(blocksOf(dossierContent(parts(), NOTHING_OUT), 'repairs'));
    expect(rows.map(({ cells }) => cells)).toEqual([['Open it.', 'Done', '30 lb·ft'], ['Look through it.', 'Nothing said', '']]);
  });

  it('leaves out sections and photos, and says what it left out', () => {
    const { photos } = parts();
    const content = dossierContent(parts(), { ...NOTHING_OUT, sections: ['ranking', 'fits'], photoIds: [photos[0]?.id ?? ''] });
    expect(content.sections.map(({ id }) => id)).not.toEqual(expect.arrayContaining(['ranking']));
    expect(JSON.stringify(content)).not.toContain(photos[0]?.id);
    expect(content.leftOut).toEqual(['History of compressors', 'Ranking of causes', '1 of 2 photos']);
  });

  it('numbers people in the order in which they appear when names are withheld, and names none', () => {
    const json = JSON.stringify(dossierContent(parts(), { ...NOTHING_OUT, names: true }));
    for (const name of ['Ada', 'Bo', 'Cy']) expect(json).not.toMatch(new RegExp(`\\b${name}\\b`));
    expect([...new Set(json.match(/Technician \d/g))]).toEqual(['Technician 1', 'Technician 2', 'Technician 3']);
  });

  it('holds back whose unit it is', () => {
    const json = JSON.stringify(dossierContent(parts(), { ...NOTHING_OUT, fleet: true }));
    for (const words of ['K-104', 'Northern Haulage', 'Yard']) expect(json).not.toContain(words);
  });

  it('has one hash for the same parts, and another when a word of it is another', () => {
    const hash = contentHash(dossierContent(parts(), NOTHING_OUT));
    expect(contentHash(JSON.parse(JSON.stringify(dossierContent(parts(), NOTHING_OUT))))).toBe(hash);
    expect(contentHash(dossierContent(parts({ complaint: { ...parts().complaint, words: 'It spits.' } }), NOTHING_OUT))).not.toBe(hash);
  });
});

describe('a reference and names', () => {
  it('count from one and keep their places', () => {
    expect(dossierReference(12, '2026-03-02')).toBe('D-2026-00012');
    expect(dossierReference(123_456, '2026-03-02')).toBe('D-2026-123456');
    const name = makeNamer({ withheld: true });
    expect(['Ada', 'Bo', 'Ada'].map(name)).toEqual(['Technician 1', 'Technician 2', 'Technician 1']);
    expect(makeNamer({ withheld: false })('Ada')).toBe('Ada');
  });
});
