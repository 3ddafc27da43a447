import { NotFoundPage } from '@/components/states/NotFoundPage';

export default function ModelNotFound() {
  return <NotFoundPage kind="compressor model" to={{ href: '/models', label: 'To the compressor models' }}>The link may be cut short, or the model belongs to another organisation. The list has every model that fits can name.</NotFoundPage>;
}
