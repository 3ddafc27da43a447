import type { ReactNode } from 'react';
import { NavLinks } from '@/components/shell/NavLinks';
import { settingsFor } from '@/lib/auth/navigation';
import { pageContext } from '@/lib/auth/page';

export default async function SettingsLayout({ children }: { children: ReactNode }) {
  const { roles } = await pageContext();
  return (
    <>
      <nav aria-label="Settings" className="mb-6 border-b border-rule">
        <NavLinks items={settingsFor(roles)} look="row" />
      </nav>
      {children}
    </>
  );
}
