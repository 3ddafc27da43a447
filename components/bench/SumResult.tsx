import { Notice } from '@/components/ui/Notice';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import type { Writing } from '@/lib/bench/read-texts';
import { shown, shownValue } from '@/lib/bench/show';
import type { WorkedOut } from '@/lib/bench/work-out';

/** What stands where no result can be: as wide as one. */
const NOTHING = '—';

interface Props {
  sum: Sum;
  worked: WorkedOut;
  writing: Writing;
}

/** The answer with its band, what it hangs on most, and what else follows. Its parts keep their places while one types. */
export function SumResult({ sum, worked, writing }: Props) {
  const main = sum.outputs.find(({ id }) => id === sum.main);
  if (!main) return null;
  const values = worked.kind === 'values' ? worked.values : {};
  const value = values[main.id];
  const others = sum.outputs.filter(({ id }) => id !== main.id);
  return (
    <section aria-labelledby="result" className="grid content-start gap-4 border-t-2 border-ink pt-4">
      <h2 id="result">{main.label}</h2>
      <div className="grid min-h-32 content-start gap-1">
        <p className="figure text-[2.75rem] leading-none font-bold" data-testid="result">{value === undefined ? (worked.kind === 'never' ? 'Never' : NOTHING) : shown(value, main, writing)}</p>
        <p className="min-h-13 max-w-prose">{worked.kind === 'never' ? worked.because : worked.kind === 'refused' ? 'Something above is missing or can’t be used; see beside its field.' : <BandText {...{ sum, worked, writing }} />}</p>
      </div>
      {others.length > 0 && (
        <dl className="grid gap-y-1.5">
          {others.map((output) => {
            const si = values[output.id];
            return (
              <div key={output.id} className="flex items-baseline justify-between gap-4 border-b border-rule pb-1.5">
                <dt>{output.label}</dt>
                <dd className="figure whitespace-nowrap">{si === undefined ? NOTHING : shown(si, output, writing)}</dd>
              </div>
            );
          })}
        </dl>
      )}
      {worked.kind === 'values' && worked.notes.length > 0 && (
        <Notice>
          <ul className="grid gap-1">{worked.notes.map((note) => <li key={note}>{note}</li>)}</ul>
        </Notice>
      )}
    </section>
  );
}

function BandText({ sum, worked, writing }: Props) {
  const main = sum.outputs.find(({ id }) => id === sum.main);
  if (worked.kind !== 'values' || !worked.band || !main) return null;
  const { low, high, shares } = worked.band;
  const [most] = shares;
  const matters = most && most.share > 0 ? sum.inputs.find(({ id }) => id === most.input) : undefined;
  if (low === high && !matters) return <>Taken as exact: no input is given a doubt.</>;
  const end = (si: number | undefined) => (si === undefined ? 'never' : shown(si, main, writing));
  return (
    <>
      Between <b className="figure font-normal">{end(low)}</b> and <b className="figure font-normal">{end(high)}</b>, 19 times in 20.
      {matters && most && <> Most of the doubt, {Math.round(most.share * 100)}{' '}%, comes with “{matters.label}”.</>}
    </>
  );
}

/** The answer in one line, in sight at the foot of a phone's screen while one types; a wide screen has it beside the readings. */
export function SumAtFoot({ sum, worked, writing }: Props) {
  const main = sum.outputs.find(({ id }) => id === sum.main);
  if (!main) return null;
  const value = worked.kind === 'values' ? worked.values[main.id] : undefined;
  const band = worked.kind === 'values' ? worked.band : undefined;
  return (
    <p aria-hidden="true" className="flex min-h-touch items-center justify-between gap-4 py-2 lg:hidden">
      <span className="leading-tight">{main.label}</span>
      <span className="figure text-right leading-tight whitespace-nowrap">
        <b>{value === undefined ? (worked.kind === 'never' ? 'Never' : NOTHING) : shown(value, main, writing)}</b>
        {band?.low !== undefined && band.high !== undefined && <span className="block text-[0.9375rem] text-ink-soft">{shownValue(band.low, main, writing)} to {shownValue(band.high, main, writing)}</span>}
      </span>
    </p>
  );
}
