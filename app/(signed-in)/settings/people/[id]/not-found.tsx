import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function PersonNotFound() {
  return <NotFoundPage kind="person" to={{ href: '/settings/people', label: 'To the people' }}>Whoever it was has never been a member of this organisation. Those who left are still in the list.</NotFoundPage>;
}
