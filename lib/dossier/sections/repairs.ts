import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { STEP_MARK_WORDS, type StepMark } from '@/lib/schemas/repair';
import { heading, table, text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface RepairPart {
  name: string;
  whyBefore: string | null;
  chosenAt: Date;
  chosenBy: string;
  endedAt: Date | null;
  endedBy: string | null;
  outcome: string | null;
  whyDropped: string | null;
  steps: readonly { text: string; mark: { mark: StepMark; value: string | null; note: string | null; by: string; at: Date } | null }[];
}

/** @param repairs in the order in which they were chosen */
export function repairsSection(repairs: readonly RepairPart[], writer: Writer): DossierBlock[] {
  if (repairs.length === 0) return text('No repair was chosen.');
  const { name, timeZone } = writer;
  return repairs.flatMap((repair) => [
    ...heading(repair.name),
    ...text(`Chosen ${momentText(repair.chosenAt, timeZone)}, ${name(repair.chosenBy)}.${repair.whyBefore ? ` It went before what the plan had first: “${repair.whyBefore}”` : ''}`),
    ...table(
      [
        { title: 'Step', share: 52 },
        { title: 'Said of it', share: 18 },
        { title: 'Value', share: 30, figure: true },
      ],
      repair.steps.map(({ text: step, mark }) => ({
        cells: [step, mark ? STEP_MARK_WORDS[mark.mark] : 'Nothing said', [mark?.value, mark?.note].filter(Boolean).join('; ')],
        note: mark && `${momentText(mark.at, timeZone)}, ${name(mark.by)}`,
        strong: mark?.mark === 'not-done',
      })),
    ),
    ...text(endText(repair, writer)),
  ]);
}

function endText({ endedAt, endedBy, outcome, whyDropped }: RepairPart, { name, timeZone }: Writer): string {
  if (!endedAt) return 'Not finished yet.';
  const when = `${momentText(endedAt, timeZone)}${endedBy ? `, ${name(endedBy)}` : ''}`;
  return outcome === 'dropped' ? `Dropped ${when}: “${whyDropped ?? ''}”` : `Finished ${when}.`;
}
