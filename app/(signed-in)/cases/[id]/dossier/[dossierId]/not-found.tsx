import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function DossierNotFound() {
  return <NotFoundPage kind="dossier" to={{ href: '/cases', label: 'To the cases' }}>The link may be cut short, or the dossier belongs to another organisation. Look for it at its case.</NotFoundPage>;
}
