import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function LimitNotFound() {
  return <NotFoundPage kind="limit" to={{ href: '/settings/limits', label: 'To the limits' }}>It may have been withdrawn, or belongs to another organisation.</NotFoundPage>;
}
