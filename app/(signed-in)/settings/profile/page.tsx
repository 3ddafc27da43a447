import type { Metadata } from 'next';
import { ChangeOrganisationForm, PasswordForm, RenameForm, SignOutEverywhereForm } from '@/components/settings/ProfileForms';
import { PageHeader } from '@/components/ui/PageHeader';
import { asRoles } from '@/lib/auth/role-words';
import { pageContext } from '@/lib/auth/page';
import { profile } from '@/lib/services/person/profile';
import { endEverySession, goOnElsewhere, renamePerson, setPassword } from './actions';

export const metadata: Metadata = { title: 'You' };

export default async function ProfilePage() {
  const ctx = await pageContext();
  const { name, email, organisations } = await profile({ ctx, input: {} });
  const others = organisations.filter(({ id }) => id !== ctx.organisation.id);
  return (
    <>
      <PageHeader title="You" lead={`You sign in as ${email}, and work ${asRoles(ctx.roles)} at ${ctx.organisation.name}.`} />
      <div className="grid gap-12">
        <section className="grid gap-4">
          <h2>Name</h2>
          <RenameForm action={renamePerson} name={name} />
        </section>
        <section className="grid gap-4">
          <h2>Password</h2>
          <PasswordForm action={setPassword} email={email} />
        </section>
        {others.length > 0 && (
          <section className="grid gap-4">
            <h2>Another organisation</h2>
            <ChangeOrganisationForm action={goOnElsewhere} organisations={others} />
          </section>
        )}
        <section className="grid gap-4">
          <h2>Every device</h2>
          <SignOutEverywhereForm action={endEverySession} />
        </section>
      </div>
    </>
  );
}
