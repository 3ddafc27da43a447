import type { Check } from '@/lib/diagnose/types';
import type { Sentence, Statement } from './sentence';

/** Shows a band edge of a check in the reader's unit: "10 mm". */
export type ShowEdge = (check: Check, si: number) => string;

/**
 * A sentence in words: "Discharge line bore is below 10 mm and (Noise is Knock or Oil at the dryer is not None)".
 *
 * @param sentence from `toSentence`
 * @param checks checks of the rulebook, by id; one that isn't there is named by its id
 * @param showEdge how a band edge is written
 * @example sentenceText(toSentence(rule.conditions), checks, (check, si) => `${si}`)
 */
export function sentenceText(sentence: Sentence, checks: ReadonlyMap<string, Check>, showEdge: ShowEdge): string {
  return sentence.parts
    .map((part) => {
      if (!('join' in part)) return statementText(part, checks.get(part.check), showEdge);
      const text = sentenceText(part, checks, showEdge);
      // One statement needs no brackets, nor does a whole sentence that is nothing but this one.
      return part.parts.length > 1 && sentence.parts.length > 1 ? `(${text})` : text;
    })
    .join(` ${sentence.join} `);
}

function statementText(statement: Statement, check: Check | undefined, showEdge: ShowEdge): string {
  const label = (id: string) => check?.states.find((state) => state.id === id)?.label ?? id;
  const subject = `${check?.name ?? statement.check} ${statement.says}`;
  if ('state' in statement) return `${subject} ${label(statement.state)}`;
  if ('states' in statement) return `${subject} ${statement.states.map(label).join(', ')}`;
  return `${subject} ${check ? showEdge(check, statement.edge) : statement.edge}`;
}
