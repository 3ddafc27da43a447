import { describe, expect, it } from 'vitest';
import { chartProofs } from './fleet/charts';
import { practiceProofs } from './fleet/practices';
import { recurrenceProofs } from './fleet/recurrence';
import { repeatProofs } from './fleet/repeats';
import { holdTo, readFleetRows } from './fleet/rows';
import { spellProofs } from './fleet/spells';

const ROWS = readFleetRows();
const PROOFS = { ...spellProofs, ...recurrenceProofs, ...repeatProofs, ...practiceProofs, ...chartProofs };

describe('fleet statistics against outside values', () => {
  it('proves every row', () => {
    expect(Object.keys(PROOFS).sort()).toEqual(ROWS.map(({ id }) => id).sort());
  });

  for (const row of ROWS) {
    const memory = /memory/.test(row.source) ? '; in part from memory' : '';
    it(`${row.id}: ${row.inputs} = ${row.expected.join('; ')} ${row.unit} (${row.source}${memory})`, () => {
      holdTo(row, PROOFS[row.id]?.() ?? []);
    });
  }
});
