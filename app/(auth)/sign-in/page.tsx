import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { homeFor } from '@/lib/auth/navigation';
import { returnPath } from '@/lib/auth/return-path';
import { getContext } from '@/lib/auth/session';
import { Doorway } from '@/components/sign-in/Doorway';
import { SignInForm } from '@/components/sign-in/SignInForm';
import { signIn } from './actions';

export const metadata: Metadata = { title: 'Sign in' };

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function SignInPage({ searchParams }: Props) {
  const query = await searchParams;
  const next = returnPath(query.next);
  const ctx = await getContext();
  if (ctx) redirect(next ?? homeFor(ctx.roles));
  return (
    <Doorway>
      <h1>Sign in</h1>
      <SignInForm action={signIn} next={next} />
      <p>
        <Link href="/reset-password">Password forgotten?</Link>
      </p>
    </Doorway>
  );
}
