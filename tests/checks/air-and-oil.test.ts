import { describe, expect, it } from 'vitest';
import { airFlowRows } from './air-and-oil/air-flow';
import { compressionRows } from './air-and-oil/compression';
import { conversionRows, reliabilityRows } from './air-and-oil/conversions-and-reliability';
import { deliveryAndOilRows } from './air-and-oil/delivery-and-oil';
import { regulation } from './air-and-oil/regulation';
import { holdTo, readAirAndOil } from './air-and-oil/rows';
import { tankRows } from './air-and-oil/tank';

const ROWS = readAirAndOil(new URL('data/air-and-oil.csv', import.meta.url));
const PROVERS = [...regulation, ...compressionRows, ...airFlowRows, ...tankRows, ...deliveryAndOilRows, ...conversionRows, ...reliabilityRows];

describe('the bench against outside values', () => {
  it('proves every row, each by one way', () => {
    expect(ROWS.length).toBeGreaterThan(100);
    for (const row of ROWS) expect(PROVERS.filter(({ of }) => of(row)), row.id).toHaveLength(1);
  });

  for (const row of ROWS) {
    const memory = /from memory/.test(`${row.confidence} ${row.source}`) ? '; from memory' : '';
    it(`${row.id} ${row.topic}: ${row.inputs} = ${row.expected.join(', ')} ${row.unit} (${row.source}${memory})`, () => {
      const got = PROVERS.find(({ of }) => of(row))?.prove(row) ?? [];
      holdTo(row, typeof got === 'number' ? [got] : got);
    });
  }
});
