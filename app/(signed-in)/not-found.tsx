import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function SignedInNotFound() {
  return <NotFoundPage kind="page" to={{ href: '/cases', label: 'To the cases' }}>It was never here, or it was removed.</NotFoundPage>;
}
