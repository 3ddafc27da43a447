import { exactMoneyText } from '@/components/repair/money';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { Tag } from '@/components/ui/Tag';
import { CLAIM_STATES, CORE_STATES, type ClaimView, type CoreView } from '@/lib/schemas/claim';
import { dayText } from '@/lib/schemas/day-text';
import { SettleClaimForm, SettleCoreForm, type ClaimAction } from './ClaimForms';

interface Of {
  caseId: string;
  currency: string;
  /** Given to those who may say what came of it. */
  settle: ClaimAction | null;
}

const money = (amount: number | null, currency: string) => amount === null ? null : exactMoneyText(amount, currency);

export const Claims = ({ claims, caseId, currency, settle }: Of & { claims: readonly ClaimView[] }) => (
  <ul className="grid gap-8">
    {claims.map(({ id, toWhom, theirReference, sentOn, amount, state, settledOn, settledAmount, why, createdBy }) => (
      <li key={id} className="keep grid gap-2">
        <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
          <h3 className="text-lg">{toWhom}</h3>
          <Tag tone={state === 'sent' ? 'plain' : 'strong'}>{CLAIM_STATES[state]}</Tag>
        </div>
        <DefinitionList
          items={[
            { term: 'Sent', value: `${dayText(sentOn)}, kept by ${createdBy}` },
            { term: 'Their reference', value: theirReference },
            { term: 'Claimed', value: money(amount, currency), figure: true },
            ...(settledOn ? [{ term: 'They said so', value: dayText(settledOn) }] : []),
            ...(state === 'paid' || state === 'part-paid' ? [{ term: 'Paid', value: money(settledAmount, currency), figure: true }] : []),
            ...(why ? [{ term: 'Why', value: why }] : []),
          ]}
        />
        {settle && <SettleClaimForm action={settle} caseId={caseId} currency={currency} claimId={id} about={toWhom} isSettled={state !== 'sent'} />}
      </li>
    ))}
  </ul>
);

export const Cores = ({ cores, caseId, currency, settle }: Of & { cores: readonly CoreView[] }) => (
  <ul className="grid gap-8">
    {cores.map(({ id, fit, toWhom, sentOn, expectedAmount, state, settledOn, creditedAmount, why, createdBy }) => (
      <li key={id} className="keep grid gap-2">
        <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
          <h3 className="text-lg">{toWhom}</h3>
          <Tag tone={state === 'sent' ? 'plain' : 'strong'}>{CORE_STATES[state]}</Tag>
        </div>
        <DefinitionList
          items={[
            { term: 'Compressor', value: fit },
            { term: 'Sent', value: `${dayText(sentOn)}, kept by ${createdBy}` },
            { term: 'Credit expected', value: money(expectedAmount, currency), figure: true },
            ...(settledOn ? [{ term: 'They said so', value: dayText(settledOn) }] : []),
            ...(state === 'credited' ? [{ term: 'Credited', value: money(creditedAmount, currency), figure: true }] : []),
            ...(why ? [{ term: 'Why', value: why }] : []),
          ]}
        />
        {settle && <SettleCoreForm action={settle} caseId={caseId} currency={currency} coreId={id} about={toWhom} isSettled={state !== 'sent'} />}
      </li>
    ))}
  </ul>
);
