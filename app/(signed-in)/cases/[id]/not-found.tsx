import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function CaseNotFound() {
  return <NotFoundPage kind="case" to={{ href: '/cases', label: 'To the cases' }}>The link may be cut short, or the case belongs to another organisation. Look for it by its number, or by the unit.</NotFoundPage>;
}
