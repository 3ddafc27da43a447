import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { percent } from '@/lib/schemas/percent';
import { text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface RankingPart {
  /** When it stood so. */
  at: Date;
  /** It is that of the call; else that of now. */
  isOfCall: boolean;
  editionNumber: number;
  /** The most likely first. */
  causes: readonly { name: string; p: number; reasons: readonly { finding: string; direction: 'for' | 'against'; strength: string; note: string }[] }[];
}

const LEAST_P = 0.01;
const [FEWEST, MOST] = [3, 8];
/** Causes whose reasons are told, and how many of each: those that decide. What barely counts is for the case's own page. */
const [EXPLAINED, REASONS] = [3, 6];

export function rankingSection({ at, isOfCall, editionNumber, causes }: RankingPart, { timeZone }: Writer): DossierBlock[] {
  const shown = causes.filter(({ p }, i) => i < FEWEST || (i < MOST && p >= LEAST_P));
  const rest = causes.slice(shown.length).reduce((sum, { p }) => sum + p, 0);
  return [
    ...text(`${isOfCall ? 'As it stood when the cause was called' : 'As it stands, with no cause called'}, ${momentText(at, timeZone)}; rulebook edition ${editionNumber}.`),
    {
      kind: 'levels',
      levels: shown.map(({ name, p, reasons }, i) => ({
        name,
        p,
        printed: percent(p),
        reasons: i < EXPLAINED ? reasons.filter(({ strength }) => strength !== 'barely').slice(0, REASONS).map(({ finding, direction, strength, note }) => `${finding}: counts ${strengthText(direction, strength)}. ${note}`) : [],
      })),
    },
    ...(rest > 0 ? text(`All other causes together: ${percent(rest)}.`) : []),
  ];
}

const strengthText = (direction: 'for' | 'against', strength: string): string => `${strength} ${direction} it`;
