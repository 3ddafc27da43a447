import { describe } from 'vitest';
import { proveOutsideValues, readOutsideValues } from '../support/outside-values';
import { information } from './diagnosis/information';
import { moneyAndOrder } from './diagnosis/money-and-order';
import { networks } from './diagnosis/networks';
import { scores } from './diagnosis/scores';
import { soybean } from './diagnosis/soybean';
import { unsure } from './diagnosis/unsure';
import { weightsAndRatios } from './diagnosis/weights-and-ratios';

const LEARNING = 'weights learned from proved cases are not here yet';
const SEARCH_INDEX = 'repairs are ordered by p / Co and by sets, not by a search index';

const NOT_HERE_YET: Record<string, string> = {
  T11: LEARNING,
  T12: LEARNING,
  T13: LEARNING,
  C01: LEARNING,
  C03: LEARNING,
  C04: LEARNING,
  C05: LEARNING,
  C07: LEARNING,
  C08: LEARNING,
  C09: LEARNING,
  V12: SEARCH_INDEX,
  V13: SEARCH_INDEX,
};

describe('the ranking core against outside values', () => {
  proveOutsideValues(
    readOutsideValues(new URL('data/diagnosis.csv', import.meta.url)),
    { ...weightsAndRatios, ...networks, ...information, ...moneyAndOrder, ...unsure, ...scores, ...soybean },
    NOT_HERE_YET,
  );
});
