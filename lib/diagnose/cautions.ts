import type { Access, Caution, SetUp } from './types';

/** What makes a vehicle more dangerous than one that stands cold and closed. */
export type Danger = Caution['worseWhen'][number];

const OPENED: readonly Access[] = ['line-open', 'head-off', 'compressor-off'];

/**
 * The dangers of the state that a check needs.
 *
 * @param setUp of the check
 * @example dangersOf({ engine: 'governed' }) // ['engine-running']
 */
export function dangersOf({ engine, brakes, access = [] }: SetUp): Danger[] {
  const dangers: Danger[] = [];
  if (engine === 'idle' || engine === 'governed') dangers.push('engine-running');
  if (brakes === 'released') dangers.push('brakes-released');
  if (access.some((place) => OPENED.includes(place))) dangers.push('system-opened');
  return dangers;
}

/**
 * Which of a check's cautions a person still has to acknowledge: those not read today, and those read in a state
 * that was less dangerous in a way that matters to the caution.
 *
 * @param check cautions and set-up of the check
 * @param worseWhen of each caution, by id
 * @param acknowledged what this person has acknowledged in this case today
 * @returns ids of cautions, in the check's order
 * @example cautionsToRead({ cautions: ['hot-parts'], setUp: {} }, () => [], []) // ['hot-parts']
 */
export function cautionsToRead(
  check: { cautions: readonly string[]; setUp: SetUp },
  worseWhen: (cautionId: string) => readonly string[],
  acknowledged: readonly { cautionId: string; dangers: readonly string[] }[],
): string[] {
  const dangers = dangersOf(check.setUp);
  return check.cautions.filter((id) => {
    const telling = dangers.filter((danger) => worseWhen(id).includes(danger));
    return !acknowledged.some((read) => read.cautionId === id && telling.every((danger) => read.dangers.includes(danger)));
  });
}
