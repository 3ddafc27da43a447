import type { Metadata } from 'next';
import Link from 'next/link';
import { InvitationButtons } from '@/components/settings/InvitationButtons';
import { Breakable } from '@/components/ui/Breakable';
import { ButtonLink } from '@/components/ui/Button';
import { DataTable } from '@/components/ui/DataTable';
import { PageHeader } from '@/components/ui/PageHeader';
import { Tag } from '@/components/ui/Tag';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { listInvitations } from '@/lib/services/invitation/list';
import { listPeople } from '@/lib/services/membership/list';
import { sendInvitationAgain, takeInvitationBack } from './actions';

export const metadata: Metadata = { title: 'People' };

const list = new Intl.ListFormat('en', { type: 'unit' });
const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium' });

export default async function PeoplePage() {
  const ctx = await pageContext(PERMITTED['people.manage']);
  const [people, invitations] = await Promise.all([listPeople({ ctx, input: {} }), listInvitations({ ctx, input: {} })]);
  return (
    <>
      <PageHeader
        title="People"
        lead="Who works here, and what each may do."
        actions={<ButtonLink href="/settings/people/invite">Invite somebody</ButtonLink>}
      />
      <div className="grid gap-10">
        {invitations.length > 0 && (
          <DataTable
            caption="Invited, no answer yet"
            rows={invitations}
            rowKey={({ id }) => id}
            columns={[
              { key: 'email', header: 'Address', cell: ({ email }) => email && <Breakable>{email}</Breakable>, rowHeader: true },
              { key: 'roles', header: 'Roles', cell: ({ roles }) => list.format(roles) },
              { key: 'until', header: 'Link works until', cell: ({ expiresAt, hasExpired }) => (hasExpired ? <Tag>Expired</Tag> : day.format(expiresAt)) },
              {
                key: 'do',
                header: <span className="sr-only">What to do</span>,
                cell: ({ id, email }) => <InvitationButtons invitationId={id} email={email ?? ''} resend={sendInvitationAgain} withdraw={takeInvitationBack} />,
              },
            ]}
          />
        )}
        <DataTable
          caption="People"
          rows={people}
          rowKey={({ personId }) => personId}
          columns={[
            {
              key: 'name',
              header: 'Name',
              rowHeader: true,
              cell: ({ personId, name, endedAt }) => (endedAt ? name : <Link href={`/settings/people/${personId}`}>{name}</Link>),
            },
            { key: 'email', header: 'Address', cell: ({ email }) => <Breakable>{email}</Breakable> },
            { key: 'roles', header: 'Roles', cell: ({ roles, endedAt }) => (endedAt ? <Tag>Left {day.format(endedAt)}</Tag> : list.format(roles)) },
            { key: 'site', header: 'Site', cell: ({ siteName }) => siteName ?? 'any' },
            { key: 'release', header: 'May release', cell: ({ mayRelease }) => (mayRelease ? 'yes' : 'no') },
          ]}
        />
      </div>
    </>
  );
}
