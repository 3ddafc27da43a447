/** A rule's conditions as a sentence: what an editor builds by picking, and what json-rules-engine reads, are the same rule. */
import type { Condition, FactCondition, RootCondition } from '@/lib/diagnose/types';

/** What is said of one check. "Not" is said of a check, never of a whole: a whole would hold while nothing is known. */
export type Statement =
  | { says: 'is' | 'is not'; check: string; state: string }
  | { says: 'is one of' | 'is none of'; check: string; states: string[] }
  | { says: 'is below' | 'is at least'; check: string; /** A band edge, SI. */ edge: number };

/** Statements joined: all of them hold, or at least one. */
export interface Sentence {
  join: 'and' | 'or';
  parts: (Statement | Sentence)[];
}

const isSentence = (part: Statement | Sentence): part is Sentence => 'join' in part;

/**
 * A rule's conditions as a sentence.
 *
 * @param conditions conditions that the schema has accepted
 * @throws TypeError where an operator stands beside a value that it can't be asked of, which the schema refuses
 * @example toSentence({ all: [{ fact: 'noise', operator: 'equal', value: 'knock' }] }).join // 'and'
 */
export function toSentence(conditions: RootCondition): Sentence {
  return 'all' in conditions
    ? { join: 'and', parts: conditions.all.map(toPart) }
    : { join: 'or', parts: conditions.any.map(toPart) };
}

function toPart(condition: Condition): Statement | Sentence {
  return 'fact' in condition ? toStatement(condition) : toSentence(condition);
}

function toStatement({ fact: check, operator, value }: FactCondition): Statement {
  if (typeof value === 'string') {
    if (operator === 'equal') return { says: 'is', check, state: value };
    if (operator === 'notEqual') return { says: 'is not', check, state: value };
  } else if (typeof value === 'number') {
    if (operator === 'lessThan') return { says: 'is below', check, edge: value };
    if (operator === 'greaterThanInclusive') return { says: 'is at least', check, edge: value };
  } else {
    if (operator === 'in') return { says: 'is one of', check, states: [...value] };
    if (operator === 'notIn') return { says: 'is none of', check, states: [...value] };
  }
  throw new TypeError(`"${operator}" can’t be asked with ${JSON.stringify(value)}`);
}

/**
 * A sentence as a rule's conditions.
 *
 * @example toConditions({ join: 'and', parts: [{ says: 'is', check: 'noise', state: 'knock' }] })
 */
export function toConditions({ join, parts }: Sentence): RootCondition {
  const conditions = parts.map((part): Condition => (isSentence(part) ? toConditions(part) : toCondition(part)));
  return join === 'and' ? { all: conditions } : { any: conditions };
}

function toCondition(statement: Statement): FactCondition {
  const fact = statement.check;
  switch (statement.says) {
    case 'is':
      return { fact, operator: 'equal', value: statement.state };
    case 'is not':
      return { fact, operator: 'notEqual', value: statement.state };
    case 'is one of':
      return { fact, operator: 'in', value: [...statement.states] };
    case 'is none of':
      return { fact, operator: 'notIn', value: [...statement.states] };
    case 'is below':
      return { fact, operator: 'lessThan', value: statement.edge };
    case 'is at least':
      return { fact, operator: 'greaterThanInclusive', value: statement.edge };
  }
}
