import { Disclosure } from '@/components/ui/Disclosure';
import { symbolsIn } from '@/lib/air-and-oil/formula/expression';
import { toMathml } from '@/lib/air-and-oil/formula/to-mathml';
import { toSpeech } from '@/lib/air-and-oil/formula/to-speech';
import type { Sum, SumQuantity } from '@/lib/air-and-oil/sums/sum';
import { shown } from '@/lib/bench/show';
import type { Writing } from '@/lib/bench/read-texts';

interface Props {
  sum: Sum;
  /** Inputs, terms and the result by id, in SI; without them the formula stands in letters alone. */
  values?: Readonly<Record<string, number | undefined>>;
  writing: Writing;
}

const quantitiesOf = ({ inputs, outputs, formula }: Sum): SumQuantity[] => [...inputs, ...outputs, ...formula.terms];

/** The formula in letters, the same with the numbers put in, and what each letter stands for. */
export function Formula({ sum, values, writing }: Props) {
  const quantities = quantitiesOf(sum);
  const letters = Object.fromEntries(quantities.map(({ id, letter }) => [id, letter]));
  const names = Object.fromEntries(quantities.map(({ id, label }) => [id, label.slice(0, 1).toLowerCase() + label.slice(1)]));
  const main = sum.outputs.find(({ id }) => id === sum.main);
  const { expression } = sum.formula;
  const inWords = `${main?.label ?? sum.main} is ${toSpeech(expression, names)}.`;
  const numbers = values && Object.fromEntries(quantities.flatMap((quantity) => {
    const si = values[quantity.id];
    return si === undefined ? [] : [[quantity.id, shown(si, quantity, writing)]];
  }));
  const inFormula = new Set([sum.main, ...symbolsIn(expression)]);
  const drawn = [
    { key: 'letters', html: toMathml(expression, { letters, result: sum.main, alttext: inWords }) },
    ...(numbers?.[sum.main] ? [{ key: 'numbers', html: toMathml(expression, { letters, values: numbers, result: sum.main, alttext: `With the numbers put in: ${toSpeech(expression, numbers)} is ${numbers[sum.main]}.` }) }] : []),
  ];
  return (
    <div className="grid gap-3">
      {/* The library escapes every text that it puts in. */}
      {drawn.map(({ key, html }) => <div key={key} tabIndex={0} role="group" aria-label={key === 'letters' ? 'The formula' : 'With the numbers put in'} className="formula scroll-x" dangerouslySetInnerHTML={{ __html: html }} />)}
      <Disclosure summary="What the letters stand for">
        <dl className="grid grid-cols-[auto_minmax(0,1fr)_auto] items-baseline gap-x-4 gap-y-1">
          {quantities.filter(({ id }) => inFormula.has(id)).map((quantity) => (
            <div key={quantity.id} className="contents">
              <dt className="figure"><i>{quantity.letter.letter}</i>{quantity.letter.sub && <sub>{quantity.letter.sub}</sub>}</dt>
              <dd>{quantity.label}</dd>
              <dd className="figure text-right">{numbers?.[quantity.id] ?? ''}</dd>
            </div>
          ))}
        </dl>
        <p className="mt-3 max-w-prose text-[0.9375rem] text-ink-soft">{inWords}</p>
      </Disclosure>
    </div>
  );
}
