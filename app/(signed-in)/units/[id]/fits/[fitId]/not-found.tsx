import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function FitNotFound() {
  return <NotFoundPage kind="fit" to={{ href: '/units', label: 'To the units' }}>The fit may have been struck out since, or it is another unit’s. The unit’s page shows the fits that it has.</NotFoundPage>;
}
