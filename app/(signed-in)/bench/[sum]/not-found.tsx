import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function SumNotFound() {
  return <NotFoundPage kind="sum" to={{ href: '/bench', label: 'To the bench' }}>The link may be cut short, or the case that it was for takes no such figure. The bench has every sum.</NotFoundPage>;
}
