import { describe, expect, it } from 'vitest';
import { RECORD_FACTS, type KnownRecordFacts } from '@/lib/diagnose/default-rulebook/record-facts';
import type { RecordFacts } from '@/lib/diagnose/types';

describe('record facts', () => {
  it('have names of their own and say what they mean', () => {
    expect(new Set(RECORD_FACTS.map(({ name }) => name)).size).toBe(RECORD_FACTS.length);
    for (const { name, meaning } of RECORD_FACTS) expect(meaning, name).toMatch(/^[A-Z].+\.$/);
  });

  it('hold the texts that the type promises', () => {
    const facts: KnownRecordFacts = { drainOpening: 'small-hole', milesSinceFit: 96_560, dischargeLineChanged: 'no' };
    const accepted: RecordFacts = { ...facts };
    expect(accepted).toEqual({ drainOpening: 'small-hole', milesSinceFit: 96_560, dischargeLineChanged: 'no' });
  });
});
