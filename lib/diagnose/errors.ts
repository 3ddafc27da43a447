/** One thing that is wrong in a rulebook: where, what, and what to write instead. */
export interface Problem {
  /** Name of the rule it is in, where it is in one. */
  rule?: string;
  /** Place in the JSON: "rules[3].conditions.all[0].operator". */
  path: string;
  message: string;
  instead: string;
}

/** A rulebook that can't be compiled. Carries every problem found. */
export class RulebookError extends Error {
  override readonly name = 'RulebookError';

  constructor(readonly problems: readonly Problem[]) {
    super(problems.map(lineOf).join('\n'));
  }
}

/** A problem as one line of text. */
export function lineOf({ rule, path, message, instead }: Problem): string {
  return `${rule === undefined ? '' : `rule "${rule}", `}${path}: ${message}. Instead: ${instead}`;
}

export type FindingErrorCode =
  | 'unknown-check'
  | 'unknown-state'
  | 'out-of-range'
  | 'bad-error'
  | 'wrong-kind'
  | 'bad-shares'
  | 'bad-reliability'
  | 'answered-twice';

/** A finding or an answer that the rulebook does not know what to do with. */
export class FindingError extends Error {
  override readonly name = 'FindingError';

  constructor(
    readonly code: FindingErrorCode,
    readonly checkId: string,
    message: string,
  ) {
    super(message);
  }
}
