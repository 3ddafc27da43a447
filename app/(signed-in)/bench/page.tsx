import type { Metadata } from 'next';
import Link from 'next/link';
import { PageHeader } from '@/components/ui/PageHeader';
import { SUMS } from '@/lib/air-and-oil/sums';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { GROUPS } from '@/lib/bench/groups';

export const metadata: Metadata = { title: 'Bench' };

export default async function BenchPage() {
  await pageContext(PERMITTED['bench.use']);
  return (
    <>
      <PageHeader title="Bench" lead="Sums for what you measured, each with its doubt. They work without a connection once you have opened them." />
      <div className="grid gap-10">
        {GROUPS.map(({ name, sums, others = [] }) => (
          <section key={name} aria-labelledby={`group-${sums[0]}`} className="grid gap-3">
            <h2 id={`group-${sums[0]}`}>{name}</h2>
            <ul className="grid gap-x-12 border-t-2 border-ink lg:grid-cols-2">
              {[...sums.flatMap((id) => SUMS.find((sum) => sum.id === id) ?? []), ...others].map(({ id, name: title, purpose }) => (
                <li key={id} className="border-b border-rule">
                  <Link href={`/bench/${id}`} className="grid min-h-touch gap-0.5 py-3 no-underline hover:bg-sunk">
                    <span className="heading text-[1.1875rem] underline underline-offset-4">{title}</span>
                    <span className="max-w-prose text-ink-soft">{purpose}</span>
                  </Link>
                </li>
              ))}
            </ul>
          </section>
        ))}
      </div>
    </>
  );
}
