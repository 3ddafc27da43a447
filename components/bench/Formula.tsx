import { Disclosure } from '@/components/ui/Disclosure';
import { symbolsIn } from '@/lib/air-and-oil/formula/expression';
import { formulaMathml, formulaSpeech, quantitiesOf } from '@/lib/air-and-oil/sums/describe';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import { shown } from '@/lib/bench/show';
import type { Writing } from '@/lib/bench/read-texts';

interface Props {
  sum: Sum;
  /** Inputs, terms and the result by id, in SI; without them the formula stands in letters alone. */
  values?: Readonly<Record<string, number | undefined>>;
  writing: Writing;
}

/** The formula in letters, the same with the numbers put in, and what each letter stands for. */
export function Formula({ sum, values, writing }: Props) {
  const quantities = quantitiesOf(sum);
  const numbers = values && Object.fromEntries(quantities.flatMap((quantity) => {
    const si = values[quantity.id];
    return si === undefined ? [] : [[quantity.id, shown(si, quantity, writing)]];
  }));
  const inFormula = new Set([sum.main, ...symbolsIn(sum.formula.expression)]);
  const drawn = [{ name: 'The formula', html: formulaMathml(sum) }, ...(numbers?.[sum.main] ? [{ name: 'With the numbers put in', html: formulaMathml(sum, numbers) }] : [])];
  return (
    <div className="grid gap-3">
      {/* The library escapes every text that it puts in. */}
      {drawn.map(({ name, html }) => <div key={name} tabIndex={0} role="group" aria-label={name} className="formula scroll-x" dangerouslySetInnerHTML={{ __html: html }} />)}
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
        <p className="mt-3 max-w-prose text-[0.9375rem] text-ink-soft first-letter:uppercase">{formulaSpeech(sum)}.</p>
      </Disclosure>
    </div>
  );
}
