import { divergenceBits, entropyBits, forecast } from '@/lib/diagnose/information';
import { rank } from '@/lib/diagnose';
import type { Proofs } from '../../support/outside-values';
import { found, probability, textbook } from './small-rulebook';

/** Whether they played, yes then no, by what the weather was: fourteen days. */
const PLAYED: Record<string, Record<string, readonly [number, number]>> = {
  outlook: { sunny: [2, 3], overcast: [4, 0], rainy: [3, 2] },
  temperature: { hot: [2, 2], mild: [4, 2], cool: [3, 1] },
  humidity: { high: [3, 4], normal: [6, 1] },
  windy: { yes: [3, 3], no: [6, 2] },
};
const days = [9 / 14, 5 / 14];
const share = ([yes, no]: readonly [number, number]) => [yes / 9, no / 5];
const gain = (what: string) => forecast(days, Object.values(PLAYED[what] ?? {}).map(share)).bits;

const weather = textbook({
  causes: { yes: 9 / 14, no: 5 / 14 },
  checks: Object.fromEntries(Object.entries(PLAYED).map(([what, counts]) => [
    what,
    Object.fromEntries(Object.entries(counts).map(([answer, count]) => [answer, share(count)])),
  ])),
});
const day = { outlook: 'sunny', temperature: 'cool', humidity: 'high', windy: 'yes' };
const cannotTell = { ...found('outlook', []) };
const newDay = Object.entries(day).map(([what, answer]) => found(what, answer));
const withoutOutlook = [cannotTell, ...newDay.filter(({ checkId }) => checkId !== 'outlook')];

/** pi_c prod_v P(v | c): the score without the background rates that it is measured against. */
function likelihood(findings: typeof newDay, causeId: string): number {
  const score = rank(weather, findings).causes.find((cause) => cause.causeId === causeId)?.scoreNats ?? NaN;
  return findings.flatMap(({ checkId, shares }) => shares.map(({ state }) => {
    const check = weather.checks.get(checkId);
    return check?.backgrounds[check.stateIndex.get(state) ?? -1] ?? NaN;
  })).reduce((product, background) => product * background, Math.exp(score));
}

/** Cover and Thomas, example 2.2.1: rows y, columns x. */
const JOINT = [
  [1 / 8, 1 / 16, 1 / 32, 1 / 32],
  [1 / 16, 1 / 8, 1 / 32, 1 / 32],
  [1 / 16, 1 / 16, 1 / 16, 1 / 16],
  [1 / 4, 0, 0, 0],
];
const columnSums = (joint: number[][]) => (joint[0] ?? []).map((_, x) => joint.reduce((sum, row) => sum + (row[x] ?? 0), 0));
const asked = (joint: number[][]) => {
  const p = columnSums(joint);
  return { p, forecast: forecast(p, joint.map((row) => row.map((value, x) => value / (p[x] ?? NaN)))) };
};
const coverThomas = asked(JOINT);

export const information: Proofs = {
  T01: () => entropyBits(days),
  T03: () => gain('temperature'),
  T04: () => gain('humidity'),
  T05: () => gain('windy'),
  T07: () => likelihood(newDay, 'no'),
  T08: () => probability(weather, newDay, (id) => id === 'yes'),
  T09: () => likelihood(withoutOutlook, 'yes'),
  I01: () => entropyBits(coverThomas.p),
  I02: () => entropyBits(coverThomas.forecast.chances),
  I03: () => coverThomas.forecast.posteriors.reduce((sum, p, y) => sum + (coverThomas.forecast.chances[y] ?? 0) * entropyBits(p), 0),
  I05: () => coverThomas.forecast.bits,
  I06: () => entropyBits([1 / 2, 1 / 4, 1 / 8, 1 / 16, 1 / 64, 1 / 64, 1 / 64, 1 / 64]),
  I07: () => divergenceBits([1 / 2, 1 / 2], [3 / 4, 1 / 4]),
  I09: () => asked([[0.18, 0.16], [0.02, 0.64]]).forecast.bits,
};
