/**
 * `npm run test:coverage-of-intervals`: 1,000 seeded fleets for each method; how often its 95 % interval held the truth. The
 * exit code says whether every share lies within the band.
 */
import { BAND, COVERAGE, coverageOf } from '@/tests/support/coverage/methods';
import { seededRandom } from '@/tests/support/random';

const FLEETS = 1000;
const percent = (share: number) => `${(100 * share).toFixed(1)} %`;

let allHold = true;
for (const method of COVERAGE) {
  const { share, estimable } = coverageOf(method, FLEETS, seededRandom);
  const held = share >= BAND.least && share <= BAND.most;
  allHold &&= held;
  console.log(`${held ? 'holds ' : 'FAILS '} ${percent(share)}  ${method.name}: ${method.size}${estimable < FLEETS ? `; ${estimable} of ${FLEETS} estimable` : ''}`);
}
console.log(`Each is to lie from ${percent(BAND.least)} to ${percent(BAND.most)}.`);
process.exit(allHold ? 0 : 1);
