import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function UnitNotFound() {
  return <NotFoundPage kind="unit" to={{ href: '/units', label: 'To the units' }}>The link may be cut short, or the unit belongs to another organisation. Look for it by its fleet number; hidden units are under “List”.</NotFoundPage>;
}
