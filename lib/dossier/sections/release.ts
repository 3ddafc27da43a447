import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { table, text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface ReleasePart {
  releasedAt: Date;
  releasedBy: string;
  basis: string | null;
  note: string | null;
  on: readonly { name: string; answer: string }[];
}

/** Each release: by whom, by what right, and on which measurements. */
export function releaseSection(releases: readonly ReleasePart[], { name, timeZone }: Writer): DossierBlock[] {
  if (releases.length === 0) return text('The unit was not released in this case.');
  return releases.flatMap(({ releasedAt, releasedBy, basis, note, on }) => [
    ...text(`Released ${momentText(releasedAt, timeZone)}, ${name(releasedBy)}${basis ? `, by this right: ${basis}` : ''}.${note ? ` “${note}”` : ''}`),
    ...table(
      [
        { title: 'Measured after the repair', share: 60 },
        { title: 'Answer', share: 40, figure: true },
      ],
      on.map(({ name: check, answer }) => ({ cells: [check, answer] })),
    ),
  ]);
}
