import { redirect } from 'next/navigation';
import { pageContext } from '@/lib/auth/page';

export default async function SettingsPage() {
  await pageContext();
  redirect('/settings/profile');
}
