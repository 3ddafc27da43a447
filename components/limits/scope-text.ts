import { dayText } from '@/lib/schemas/day-text';
import { termLabel } from '@/lib/schemas/terms';

interface Scope {
  modelName: string | null;
  country: string | null;
  vehicleKind: string | null;
  builtFrom: string | null;
  builtBefore: string | null;
}

/** What a limit is for, in words: "trucks in US, built from 1 March 1997". */
export function scopeText({ modelName, country, vehicleKind, builtFrom, builtBefore }: Scope): string {
  const kind = termLabel('vehicleKind', vehicleKind)?.toLowerCase();
  const what = kind ? (kind === 'bus' ? 'buses' : `${kind}s`) : 'every unit';
  const parts = [
    `${what}${country ? ` in ${country}` : ''}`,
    modelName && `with ${modelName}`,
    builtFrom && `built from ${dayText(builtFrom)}`,
    builtBefore && `built before ${dayText(builtBefore)}`,
  ];
  return parts.filter(Boolean).join(', ');
}
