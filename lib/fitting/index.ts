import type { Fact, InstallOption, InstallPoint, ModelFacts } from './point';
import { INSTALL_POINTS } from './points';

export { INSTALL_GROUPS, type Fact, type InstallOption, type InstallPoint, type ModelFacts } from './point';
export { INSTALL_POINTS } from './points';

const isFor = ({ onlyFor = {} }: Pick<InstallPoint | InstallOption, 'onlyFor'>, model: ModelFacts): boolean =>
  (Object.keys(onlyFor) as (keyof ModelFacts)[]).every((name) => onlyFor[name]?.includes(model[name]) ?? true);

/**
 * The points that are asked for a compressor of a model, each with the answers that can be given to it.
 *
 * @param model what the record of the model says; null where it says nothing: everything is asked then
 * @example pointsFor({ driveGear: 'steel', cooling: 'air' }).some(({ id }) => id === 'coolant-bled') // false
 */
export function pointsFor(model: ModelFacts): InstallPoint[] {
  return INSTALL_POINTS.filter((point) => isFor(point, model)).map((point) => ({ ...point, answers: point.answers.filter((answer) => isFor(answer, model)) }));
}

interface Said {
  pointId: string;
  answer: string;
}

/** What was last said of each point. @param said oldest first */
export const standingAnswers = <One extends Said>(said: readonly One[]): Map<string, One> => new Map(said.map((one) => [one.pointId, one]));

/** An answer in words, and whether it is known to shorten a compressor's life; one that is no longer asked stands as it was given. */
export function saidOf<One extends Said>({ answers }: Pick<InstallPoint, 'answers'>, said: One): One & { label: string; against: boolean } {
  const option = answers.find(({ id }) => id === said.answer);
  return { ...said, label: option?.label ?? said.answer, against: option?.against ?? false };
}

/**
 * What the answers make of the fit's practice record.
 *
 * @param said oldest first; of a point the last counts
 * @returns fields of the fit with what becomes of each; a point that was not answered leaves its field alone
 */
export function practiceOf(said: readonly Said[]): Partial<Record<Fact, string>> {
  const standing = standingAnswers(said);
  return Object.fromEntries(
    INSTALL_POINTS.flatMap(({ id, answers }) => {
      const practice = answers.find((answer) => answer.id === standing.get(id)?.answer)?.practice;
      return practice ? [[practice.field, practice.value]] : [];
    }),
  );
}

/** What is still to be written with an answer; null: nothing. */
export function missingWith({ asks }: InstallOption, { value, note }: { value: string | null; note: string | null }): { field: 'value' | 'note'; message: string } | null {
  if ((asks === 'value' || asks === 'value-and-note') && !value) return { field: 'value', message: 'Write the value, as you measured it or had it from the maker.' };
  if ((asks === 'note' || asks === 'value-and-note') && !note) return { field: 'note', message: 'Say why, in a few words.' };
  return null;
}
