'use client';

import { usePathname } from 'next/navigation';
import { pageAt } from '@/components/states/shape';
import { Skeleton } from '@/components/states/Skeleton';

/** One place for all pages: of nested ones the outermost would show first, which is the wrong outline for those below. */
export default function Loading() {
  return <Skeleton {...pageAt(usePathname())} />;
}
