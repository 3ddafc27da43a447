import type { UnitPreferences } from '@/lib/units';
import type { Namer } from './namer';

/** How a dossier is written: in whose units, whose clock, and with or without names. */
export interface Writer {
  units: UnitPreferences;
  timeZone: string;
  name: Namer;
}
