import type { Metadata } from 'next';
import Link from 'next/link';
import { scopeText } from '@/components/limits/scope-text';
import { Disclosure } from '@/components/ui/Disclosure';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { dayText } from '@/lib/schemas/day-text';
import { listLimits, type CheckLimits } from '@/lib/services/limit/list';

export const metadata: Metadata = { title: 'Limits' };

export default async function LimitsPage() {
  const ctx = await pageContext(PERMITTED['limit.see']);
  const checks = await listLimits({ ctx, input: {} });
  const rare = checks.filter((check) => !isUsual(check));
  const row = (check: CheckLimits) => <Check key={check.checkId} check={check} mayAdopt={may(ctx.roles, 'limit.adopt')} />;
  return (
    <>
      <PageHeader
        title="Limits"
        lead="What your organisation holds a measured value to, each with its source. A value out of its limit forbids the unit’s release. Where none is adopted, the rulebook’s own bands say."
      />
      <ul className="max-w-4xl border-t-2 border-ink">{checks.filter(isUsual).map(row)}</ul>
      <Disclosure summary={`${rare.length} more measured checks, none with a limit`} className="mt-6 max-w-4xl">
        <ul className="border-t border-rule">{rare.map(row)}</ul>
      </Disclosure>
    </>
  );
}

const isUsual = ({ published, limits }: CheckLimits) => published > 0 || limits.length > 0;

function Check({ check: { checkId, name, published, limits }, mayAdopt }: { check: CheckLimits; mayAdopt: boolean }) {
  return (
    <li className="grid gap-x-8 gap-y-2 border-b border-rule py-4 sm:grid-cols-[minmax(0,1fr)_auto]">
      <div className="min-w-0">
        <h2 className="text-lg">{name}</h2>
        {limits.length === 0 && <p className="text-ink-soft">None adopted.</p>}
        <ul>
          {limits.map((limit) => (
            <li key={limit.id} className="mt-2">
              <p>
                <Link href={`/settings/limits/${limit.id}`} className="inline-flex min-h-8 items-center underline underline-offset-4"><strong className="figure">{limit.text}</strong></Link> for {scopeText(limit)}
              </p>
              <p className="text-[0.9375rem] text-ink-soft">Source: {limit.source}. Adopted by {limit.person}, {dayText(limit.adoptedAt.slice(0, 10))}.</p>
            </li>
          ))}
        </ul>
      </div>
      {mayAdopt && (
        <p>
          <Link href={`/settings/limits/new?check=${checkId}`} className="inline-flex min-h-touch items-center underline underline-offset-4">
            Adopt a limit<span className="sr-only"> for {name}</span>
            {published > 0 && <span className="ml-1 text-ink-soft">({published} published)</span>}
          </Link>
        </p>
      )}
    </li>
  );
}
