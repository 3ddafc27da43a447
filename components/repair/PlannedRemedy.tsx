import type { ReactNode } from 'react';
import { minutesText } from '@/components/case/words';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { Disclosure } from '@/components/ui/Disclosure';
import { SightGlass } from '@/components/ui/SightGlass';
import { Tag } from '@/components/ui/Tag';
import type { PlannedRemedyView } from '@/lib/schemas/repair';
import { moneyText } from './money';
import { RepairCautions } from './RepairCautions';

interface Props {
  remedy: PlannedRemedyView;
  /** 1 is first. */
  place: number;
  currency: string;
  causeName: (id: string) => string;
  /** By which the reader says that the cautions were read; null: he or she doesn't work on cases. */
  read: ReactNode;
  /** By which it is chosen; null: it can't be. */
  choose: ReactNode;
}

/** One remedy: why it stands at this place, what it takes, and its steps behind its cautions. */
export function PlannedRemedy({ remedy, place, currency, causeName, read, choose }: Props) {
  const { name, why, called, causeIds, p, lookMinutes, fixMinutes, lookCost, fixCost, comebackCost, parts, steps, basis, source } = remedy;
  const money = (amount: number) => moneyText(amount, currency);
  return (
    <li className="grid gap-3 border-t-2 border-ink pt-4">
      <div className="flex items-start gap-4">
        <SightGlass label={`Chance that it is this: ${name}`} value={p} />
        <div className="min-w-0">
          <h3 className="text-xl">{place}. {name}</h3>
          <p>{why}</p>
          {called && <p className="mt-1"><Tag>removes what was called</Tag></p>}
        </div>
      </div>
      <Disclosure summary={<>What it takes<span className="sr-only">: {name}</span></>}>
        <DefinitionList
          items={[
            { term: 'Removes', value: causeIds.map(causeName).join('; ') },
            { term: 'To look', value: `${minutesText(lookMinutes)}, ${money(lookCost)}`, figure: true },
            { term: 'To put right', value: fixMinutes > 0 ? `${minutesText(fixMinutes)}, ${money(fixCost)} with parts` : 'looking already does it', figure: fixMinutes > 0 },
            { term: 'Parts', value: parts.length > 0 ? parts.map((part) => `${part.name}, ${money(part.cost)}`).join('; ') : 'none' },
            ...(comebackCost > 0 ? [{ term: 'If it was not the one', value: `${money(comebackCost)} for a comeback: nobody sees it in the bay`, figure: false }] : []),
          ]}
        />
        <p className="mt-2 text-[0.9375rem] text-ink-soft">{source ?? `Basis: ${basis}.`}</p>
      </Disclosure>
      <Disclosure summary={<>Steps<span className="sr-only">: {name}</span></>}>
        <RepairCautions {...{ repair: remedy, read }} />
        {remedy.toRead.length === 0 && (
          <ol className="mt-4 ml-5 grid max-w-prose list-decimal gap-1.5">{steps.map((step) => <li key={step}>{step}</li>)}</ol>
        )}
      </Disclosure>
      {choose}
    </li>
  );
}
