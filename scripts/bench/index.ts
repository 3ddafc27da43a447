/**
 * `npm run bench`: how fast things are beside each other. Each line holds when the better end of the interval meets
 * the limit. The exit code says whether all hold; times are for reading only.
 */
import { answers } from './answers';
import { backTest } from './back-test';
import { casePage } from './case-page';
import { compare, compareMeasured, type Ratio } from './compare';
import { dossierMemory } from './dossier';
import { growth } from './reliability';
import { whatIfs } from './what-ifs';

const shown = ({ median, low, high }: Ratio) => `${median.toFixed(2)} (${low.toFixed(2)} to ${high.toFixed(2)})`;
const ms = ({ p50, p95 }: { p50: number; p95: number }) => `p50 ${p50.toFixed(2)} ms, p95 ${p95.toFixed(2)} ms`;

let allHold = true;
function report(name: string, ratio: Ratio, holds: boolean, limit: string) {
  allHold &&= holds;
  console.log(`${holds ? 'holds ' : 'FAILS '} ${name}: ${shown(ratio)}, ${limit}`);
}

{
  const { a, b, about } = await whatIfs();
  const measured = await compare({ a, b }, { pairs: 30, warmUp: 3 });
  console.log(`\nWhat-ifs: ${about}\n  by the engine    ${ms(measured.a)}\n  by predicates    ${ms(measured.b)}`);
  report('engine / predicates', measured.ratio, measured.ratio.high >= 50, 'at least 50');
}

{
  const { a, b, about } = await backTest();
  // The engine takes most of a minute each time; the limit is far from where it could matter.
  const measured = await compare({ a, b }, { pairs: 3, warmUp: 0 });
  console.log(`\nA weight moves: ${about}\n  by the engine    ${ms(measured.a)}\n  by what is kept  ${ms(measured.b)}`);
  report('engine / kept', measured.ratio, measured.ratio.high >= 100, 'at least 100');
}

console.log('\nFleet statistics: a million events beside ten thousand');
for (const { name, a, b } of growth()) {
  const measured = await compare({ a, b }, { pairs: 8, warmUp: 2 });
  console.log(`  ${name}\n    a million      ${ms(measured.a)}\n    ten thousand   ${ms(measured.b)}`);
  report(name, measured.ratio, measured.ratio.low <= 150, 'at most 150');
}

{
  const turns = { pairs: 60, warmUp: 60 };
  const { a, b, about, close } = await answers(turns.pairs + turns.warmUp);
  const measured = await compare({ a, b }, turns);
  await close();
  console.log(`\nAn answer: ${about}\n  with its ranking ${ms(measured.a)}\n  insert and audit ${ms(measured.b)}`);
  report('p50', measured.ratio, measured.ratio.low <= 4, 'at most 4');
  report('p95', measured.ratioP95, measured.ratioP95.low <= 4, 'at most 4');
}

{
  const { many, few, about, close } = await dossierMemory();
  const measured = await compareMeasured({ a: many, b: few }, { pairs: 3, warmUp: 0 });
  await close();
  const mib = ({ p50 }: { p50: number }) => `${p50.toFixed(0)} MiB at the most`;
  console.log(`\nThe PDF of a dossier: ${about}\n  many             ${mib(measured.a)}\n  few              ${mib(measured.b)}`);
  report('peak memory', measured.ratio, measured.ratio.low <= 2, 'at most 2');
}

{
  const page = await casePage();
  const { bare, whole, found } = await page.scripts();
  const kib = (bytes: number) => `${(bytes / 1024).toFixed(1)} KiB`;
  console.log(`\nThe case page on a phone\n  script until the first answer can be saved ${kib(whole)} gzip, of a bare page ${kib(bare)}`);
  const ratio = whole / bare;
  report('script / bare page', { median: ratio, low: ratio, high: ratio }, ratio <= 1.6, 'at most 1.6');
  if (found.length > 0) report(`first script has the ${found.join(' and the ')}`, { median: 1, low: 1, high: 1 }, false, 'never');
  const { answer, toggle, shifts, close } = await page.taps();
  const measured = await compareMeasured({ a: answer, b: toggle }, page.turns);
  console.log(`  a tap to the next frame, ${page.slower} times slower\n  an answer        ${ms(measured.a)}\n  toggles a class  ${ms(measured.b)}`);
  report('tap / toggle, p50', measured.ratio, measured.ratio.low <= 5, 'at most 5');
  const { sum, moved } = await shifts();
  report('layout shift', { median: sum, low: sum, high: sum }, sum <= 0.02, 'at most 0.02');
  for (const what of moved) console.log(`  ${what}`);
  await close();

  const keys = await page.keys();
  const typed = await compareMeasured({ a: keys.sum, b: keys.echo }, keys.turns);
  console.log(`\nA key in the heaviest sum of the bench\n  worked out, drawn ${ms(typed.a)}\n  echoed            ${ms(typed.b)}`);
  report('sum / echo, p50', typed.ratio, typed.ratio.low <= 4, 'at most 4');
  await keys.close();
  await page.close();
}

process.exit(allHold ? 0 : 1);
