import type { Metadata } from 'next';
import Link from 'next/link';
import { LimitForm } from '@/components/limits/LimitForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { limitFormInput } from '@/lib/schemas/limit';
import { firstOfEach } from '@/lib/schemas/list';
import { readLimitForm } from '@/lib/services/limit/list';
import { adoptLimit } from '../actions';

export const metadata: Metadata = { title: 'Adopt a limit' };

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function NewLimitPage({ searchParams }: Props) {
  const ctx = await pageContext(PERMITTED['limit.adopt']);
  const asked = limitFormInput.parse(firstOfEach(await searchParams));
  const { checks, check, figures, values, models } = await readLimitForm({ ctx, input: asked });
  return (
    <>
      <PageHeader
        title={check ? `Adopt a limit: ${check.name}` : 'Adopt a limit'}
        lead="It holds for values measured from now on. What was judged before stays as it was judged."
        breadcrumbs={[{ label: 'Limits', href: '/settings/limits' }]}
      />
      {!check && (
        <ul className="max-w-prose border-t border-ink">
          {checks.map(({ id, name }) => (
            <li key={id} className="border-b border-rule"><Link href={`/settings/limits/new?check=${id}`} className="inline-flex min-h-touch items-center underline underline-offset-4">{name}</Link></li>
          ))}
        </ul>
      )}
      {check && figures.length > 0 && (
        <section aria-labelledby="published" className="mb-10 max-w-4xl">
          <h2 id="published" className="mb-2">Published figures to begin from</h2>
          <p className="mb-2 text-ink-soft">None binds your vehicles by itself: look up the source, and adopt what holds for you.</p>
          <ul className="border-t border-ink">
            {figures.map((figure) => (
              <li key={figure.id} className="border-b border-rule py-2">
                <Link href={`/settings/limits/new?check=${check.id}&from=${figure.id}`} aria-current={figure.id === asked.from || undefined} className="inline-flex min-h-touch items-center underline underline-offset-4 aria-current:font-bold">
                  <span className="figure">{figure.text}</span>, {figure.what.toLowerCase()}
                </Link>
                <p className="text-[0.9375rem] text-ink-soft">{figure.for}. {figure.source}.</p>
              </li>
            ))}
          </ul>
        </section>
      )}
      {check && <LimitForm key={asked.from ?? ''} action={adoptLimit} id={newId()} check={check} values={values} models={models} units={ctx.person.units} />}
    </>
  );
}
