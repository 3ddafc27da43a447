import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function SiteNotFound() {
  return <NotFoundPage kind="site" to={{ href: '/settings/sites', label: 'To the sites' }}>The link may be cut short, or the site belongs to another organisation.</NotFoundPage>;
}
