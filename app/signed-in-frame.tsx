import type { ReactNode } from 'react';
import { cookies } from 'next/headers';
import { DeviceKeeper } from '@/components/device/DeviceKeeper';
import { SignOutForm } from '@/components/device/SignOutForm';
import { SignedInShell } from '@/components/shell/SignedInShell';
import { THEME_COOKIE, themeFrom } from '@/components/shell/theme';
import { navigationFor } from '@/lib/auth/navigation';
import { may } from '@/lib/auth/permissions';
import type { Ctx } from '@/lib/services/context';
import { countUnread } from '@/lib/services/notice/list';
import { signOut } from './(signed-in)/actions';

/** The shell around what somebody sees who is signed in, the not-found page of any address included. */
export async function SignedInFrame({ ctx, children }: { ctx: Ctx; children: ReactNode }) {
  const { person, organisation, roles } = ctx;
  return (
    <SignedInShell
      person={{ name: person.name, email: person.email }}
      organisation={{ name: organisation.name }}
      items={navigationFor(roles)}
      unread={await countUnread({ ctx, input: {} })}
      theme={themeFrom((await cookies()).get(THEME_COOKIE)?.value)}
      signOut={<SignOutForm action={signOut} />}
    >
      <DeviceKeeper personId={person.id} organisationId={organisation.id} keepsCases={may(roles, 'case.see')} />
      {children}
    </SignedInShell>
  );
}
