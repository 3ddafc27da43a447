import type { Metadata } from 'next';
import Link from 'next/link';
import { MakeTokenForm } from '@/components/settings/MakeTokenForm';
import { RevokeButton } from '@/components/settings/RevokeButton';
import { DataTable } from '@/components/ui/DataTable';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { Tag } from '@/components/ui/Tag';
import { pageContext } from '@/lib/auth/page';
import { SCOPES, scopesFor } from '@/lib/auth/scopes';
import { TOKEN_DAYS } from '@/lib/schemas/token';
import { listTokens, type TokenRow } from '@/lib/services/token/list';
import { endToken, makeToken } from './actions';

export const metadata: Metadata = { title: 'Tokens' };

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium' });
const instant = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });

const until = ({ state, expiresAt }: TokenRow) => (state === 'works' ? day.format(expiresAt) : <Tag>{state === 'revoked' ? 'Revoked' : `Expired ${day.format(expiresAt)}`}</Tag>);

export default async function TokensPage() {
  const ctx = await pageContext();
  const tokens = await listTokens({ ctx, input: {} });
  return (
    <>
      <PageHeader
        title="Tokens"
        lead={
          <>
            A token lets a script of yours work here without signing in: as you, at {ctx.organisation.name}, and only for what you tick. What scripts can do stands in the{' '}
            <Link href="/api/docs">description of the API</Link>.
          </>
        }
      />
      <div className="grid gap-12">
        <section className="grid gap-4" aria-labelledby="make-a-token">
          <h2 id="make-a-token">Make a token</h2>
          <MakeTokenForm action={makeToken} scopes={scopesFor(ctx.roles).map((scope) => ({ scope, does: SCOPES[scope].does }))} days={TOKEN_DAYS} />
        </section>
        <DataTable
          caption="Your tokens"
          rows={tokens}
          rowKey={({ id }) => id}
          empty={<EmptyState title="No token yet">The tokens that you make stand here, with when they were last used.</EmptyState>}
          columns={[
            { key: 'name', header: 'Name', rowHeader: true, cell: ({ name, ending }) => <>{name} <span className="figure text-sm whitespace-nowrap text-ink-soft">… {ending}</span></> },
            { key: 'scopes', header: 'May', cell: ({ scopes }) => <span className="figure text-sm">{scopes.join(', ')}</span> },
            { key: 'until', header: 'Works until', cell: until },
            { key: 'used', header: 'Last used', cell: ({ lastUsedAt }) => (lastUsedAt ? <time dateTime={lastUsedAt.toISOString()}>{instant.format(lastUsedAt)} UTC</time> : 'never') },
            {
              key: 'do',
              header: <span className="sr-only">What to do</span>,
              cell: ({ id, name, state }) => state === 'works' && <RevokeButton tokenId={id} name={name} action={endToken} />,
            },
          ]}
        />
      </div>
    </>
  );
}
