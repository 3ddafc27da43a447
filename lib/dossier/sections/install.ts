import { dayText } from '@/lib/schemas/day-text';
import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { heading, table, text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface InstallPart {
  modelName: string;
  installedOn: string;
  finishedAt: Date | null;
  /** Every point that is asked of this model; `said` null: not answered. */
  points: readonly { name: string; said: { label: string; against: boolean; value: string | null; note: string | null; by: string; at: Date } | null }[];
}

/** How each compressor was fitted, point by point. @param installs in the order in which they began */
export function installSection(installs: readonly InstallPart[], { name, timeZone }: Writer): DossierBlock[] {
  if (installs.length === 0) return text('No compressor was fitted in this case.');
  return installs.flatMap(({ modelName, installedOn, finishedAt, points }) => [
    ...heading(`${modelName}, fitted ${dayText(installedOn)}`),
    ...table(
      [
        { title: 'Point', share: 30 },
        { title: 'Answer', share: 34 },
        { title: 'Value and note', share: 36 },
      ],
      points.map((point) => ({
        cells: [point.name, point.said ? `${point.said.label}${point.said.against ? ' (known to shorten its life)' : ''}` : 'Not answered', [point.said?.value, point.said?.note].filter(Boolean).join('; ')],
        note: point.said && `${momentText(point.said.at, timeZone)}, ${name(point.said.by)}`,
        strong: point.said === null || point.said.against,
      })),
    ),
    ...text(finishedAt ? `Finished ${momentText(finishedAt, timeZone)}.` : 'Not finished yet.'),
  ]);
}
