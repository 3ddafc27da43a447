import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function GateNotFound() {
  return <NotFoundPage kind="gate" to={{ href: '/settings/sites', label: 'To the sites' }}>It was revoked, has run out, or belongs to another organisation.</NotFoundPage>;
}
