import { answerText } from '@/lib/case/view/answer-text';
import { measureOf } from '@/lib/case/view/measure';
import type { FindingRow, NoteRow } from '@/lib/case/rows';
import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { STATIONS } from '@/lib/diagnose/stations';
import { limitText } from '@/lib/limits';
import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { heading, table, text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface FindingsPart {
  compiled: CompiledRulebook;
  /** The answers that stand. */
  standing: readonly FindingRow[];
  notes: readonly NoteRow[];
}

const STAGES: Record<FindingRow['stage']['kind'], string | null> = { diagnosis: null, 'after-remedy': 'after a repair', release: 'at the release', watch: 'on watch' };

/** Who and when, and what was noted with it. */
function noteOf(row: FindingRow, notes: readonly NoteRow[], { name, timeZone }: Writer): string {
  const words = notes.filter(({ findingId }) => findingId === row.id).map(({ text: said }) => `“${said}”`);
  const who = row.source === 'record' ? 'from the record' : name(row.person);
  return [[momentText(row.correctedAt, timeZone), who, STAGES[row.stage.kind], row.reliability < 1 && 'thinks so, not sure'].filter(Boolean).join(', '), ...words].join(' ');
}

/** Measured values, with the limit that each was judged by when it was entered: one adopted later changes none of them. */
export function measurementsSection({ compiled, standing, notes }: FindingsPart, writer: Writer): DossierBlock[] {
  const rows = standing.filter(({ kind }) => kind === 'measured');
  if (rows.length === 0) return text('Nothing was measured.');
  return [
    ...table(
      [
        { title: 'Measured', share: 27 },
        { title: 'Value', share: 18, figure: true },
        { title: 'Limit adopted', share: 17, figure: true },
        { title: 'Source of the limit', share: 24 },
        { title: 'Verdict', share: 14 },
      ],
      rows.map((row) => {
        const check = compiled.checks.get(row.checkId)?.check;
        const measure = check && measureOf(check, writer.units);
        const value = answerText(check, row, writer.units);
        const { judgement } = row;
        const isOut = judgement?.verdict === 'out';
        return {
          cells: [
            check?.name ?? row.checkId,
            [value, typedText(row, value)].filter(Boolean).join(', '),
            judgement && measure ? limitText(judgement.limit, measure) : 'none adopted',
            judgement?.limit.source ?? '',
            judgement ? `${isOut ? 'Out of limit' : 'Within'}${judgement.doubtful ? '; by the error of the reading it could be on either side' : ''}` : 'Not judged',
          ],
          note: noteOf(row, notes, writer),
          strong: isOut,
        };
      }),
    ),
    ...text('A limit is the one that this organisation adopted, and stands here as it was when the value was entered.', { quiet: true }),
  ];
}

/** What was typed, where it was typed in another unit than it is shown in. */
function typedText({ valueTyped }: FindingRow, shown: string): string | null {
  const plain = (words: string) => words.replace(/[\s\u00a0]+/g, ' ');
  return valueTyped !== null && /[^\d.,\s]/.test(valueTyped) && !plain(shown).startsWith(plain(valueTyped)) ? `typed as “${valueTyped}”` : null;
}

/** Everything that was answered otherwise, by the place on the path of oil and air. */
export function findingsSection({ compiled, standing, notes }: FindingsPart, writer: Writer): DossierBlock[] {
  const rows = standing.filter(({ kind }) => kind !== 'measured' && kind !== 'skip');
  if (rows.length === 0) return text('Nothing else was answered.');
  return STATIONS.flatMap(({ id, name: station }) => {
    const here = rows.filter((row) => compiled.checks.get(row.checkId)?.check.station === id);
    if (here.length === 0) return [];
    return [
      ...heading(station),
      ...table(
        [
          { title: 'Looked at', share: 50 },
          { title: 'Found', share: 50 },
        ],
        here.map((row) => {
          const check = compiled.checks.get(row.checkId)?.check;
          return { cells: [check?.name ?? row.checkId, answerText(check, row, writer.units)], note: noteOf(row, notes, writer) };
        }),
      ),
    ];
  });
}
