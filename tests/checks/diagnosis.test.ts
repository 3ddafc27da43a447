import { describe } from 'vitest';
import { proveOutsideValues, readOutsideValues } from '../support/outside-values';
import { information } from './diagnosis/information';
import { learning } from './diagnosis/learning';
import { moneyAndOrder } from './diagnosis/money-and-order';
import { networks } from './diagnosis/networks';
import { scores } from './diagnosis/scores';
import { soybean } from './diagnosis/soybean';
import { unsure } from './diagnosis/unsure';
import { weightsAndRatios } from './diagnosis/weights-and-ratios';

const SEARCH_INDEX = 'repairs are ordered by p / Co and by sets, not by a search index';

const NOT_HERE_YET: Record<string, string> = {
  V12: SEARCH_INDEX,
  V13: SEARCH_INDEX,
};

describe('the ranking core against outside values', () => {
  proveOutsideValues(
    readOutsideValues(new URL('data/diagnosis.csv', import.meta.url)),
    { ...weightsAndRatios, ...networks, ...information, ...moneyAndOrder, ...unsure, ...scores, ...soybean, ...learning },
    NOT_HERE_YET,
  );
});
