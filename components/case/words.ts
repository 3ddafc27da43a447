import type { Access, SetUp } from '@/lib/diagnose/types';

/** "3 min", "under a minute", "1 h 10 min" */
export function minutesText(minutes: number): string {
  if (minutes < 1) return 'under a minute';
  const whole = Math.round(minutes);
  const hours = Math.floor(whole / 60);
  if (hours === 0) return `${whole} min`;
  return whole % 60 === 0 ? `${hours} h` : `${hours} h ${whole % 60} min`;
}

const ACCESS: Record<Access, string> = {
  'wheels-chocked': 'wheels chocked',
  'cab-tilted': 'cab tilted',
  'panels-off': 'panels off',
  'line-open': 'line open',
  'head-off': 'head off',
  'compressor-off': 'compressor off',
};
const ENGINE = { off: 'engine off', idle: 'engine idling', governed: 'engine at governed speed' } as const;

/** How the vehicle has to stand, in words; empty where it doesn't matter. */
export function setUpWords({ engine, air, heat, brakes, access = [] }: SetUp): string[] {
  return [
    ...(engine ? [ENGINE[engine]] : []),
    ...(air ? [air === 'full' ? 'air up' : 'air drained'] : []),
    ...(heat ? [heat === 'hot' ? 'warmed up' : 'cold'] : []),
    ...(brakes ? [`brakes ${brakes}`] : []),
    ...access.map((place) => ACCESS[place]),
  ];
}

/** "up 10 points", "down 3 points", "unchanged": whole points, as the levels are printed. */
export function changeText(change: number | null): string | null {
  if (change === null) return null;
  const points = Math.round(change * 100);
  if (points === 0) return null;
  return `${points > 0 ? 'up' : 'down'} ${Math.abs(points)}`;
}

/** "+6.0 dB" */
export const decibanText = (decibans: number) => `${decibans >= 0 ? '+' : '−'}${Math.abs(decibans).toFixed(1)} dB`;

/** An instant where the site is. */
export function timeText(iso: string, timeZone: string): string {
  return new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone }).format(new Date(iso));
}
