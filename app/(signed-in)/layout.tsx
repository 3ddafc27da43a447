import type { ReactNode } from 'react';
import { cookies } from 'next/headers';
import { SignedInShell } from '@/components/shell/SignedInShell';
import { THEME_COOKIE, themeFrom } from '@/components/shell/theme';
import { Button } from '@/components/ui/Button';
import { navigationFor } from '@/lib/auth/navigation';
import { requireContext } from '@/lib/auth/session';
import { signOut } from './actions';

export default async function SignedInLayout({ children }: { children: ReactNode }) {
  const { person, organisation, roles } = await requireContext();
  return (
    <SignedInShell
      person={{ name: person.name, email: person.email }}
      organisation={{ name: organisation.name }}
      items={navigationFor(roles)}
      theme={themeFrom((await cookies()).get(THEME_COOKIE)?.value)}
      signOut={
        <form action={signOut}>
          <Button type="submit" variant="quiet" wide>Sign out</Button>
        </form>
      }
    >
      {children}
    </SignedInShell>
  );
}
