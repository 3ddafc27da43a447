import type { Problem } from './errors';

/** Sizes beyond which a rulebook is refused unread: no honest one comes near, and a huge one could stall a server. */
export const LIMITS = {
  depth: 24,
  values: 200_000,
  textLength: 4_000,
  causes: 100,
  checks: 300,
  statesInACheck: 16,
  panels: 100,
  evidenceGroups: 200,
  rules: 2_000,
  conditionsInARule: 64,
  conditionDepth: 6,
  checksInARule: 6,
  combinationsInARule: 20_000,
  remedies: 300,
  cautions: 100,
  priorVariants: 50,
  items: 60,
} as const;

/** Keys and ids that mean something to JavaScript objects. None is an honest name. */
const RESERVED = new Set(['__proto__', 'constructor', 'prototype', ...Object.getOwnPropertyNames(Object.prototype)]);

/** Whether a text may not be used as a name or key, since every object has something under it. */
export function isReserved(name: string): boolean {
  return RESERVED.has(name);
}

/** Where something is, as a person writes it: "rules[3].conditions.all[0].operator". */
export function pathText(path: readonly PropertyKey[]): string {
  const text = path.map((part) => (typeof part === 'number' ? `[${part}]` : `.${String(part)}`)).join('');
  return text.replace(/^\./, '') || 'the rulebook';
}

/** Thrown inside the walk, never out of this file: past this point there is no use in reading on. */
class TooLarge extends Error {}

/**
 * Looks at raw JSON before anything else does: size, depth, numbers that are none, and keys such as `__proto__`,
 * which a schema library may drop without a word.
 *
 * @param json anything at all
 * @returns what is wrong; empty when it may be read
 */
export function limitProblems(json: unknown): Problem[] {
  const problems: Problem[] = [];
  let values = 0;

  function visit(value: unknown, path: readonly PropertyKey[]): void {
    values += 1;
    const add = (message: string, instead: string, at = path) => problems.push({ ...placeOf(json, at), message, instead });
    if (values > LIMITS.values) {
      add(`there are more than ${LIMITS.values} values in all`, 'split the rulebook, or leave out what is not used');
      throw new TooLarge();
    }
    if (path.length > LIMITS.depth) {
      add(`nested more than ${LIMITS.depth} deep`, 'write it flatter');
      throw new TooLarge();
    }
    if (typeof value === 'string' && value.length > LIMITS.textLength) {
      add(`a text of ${value.length} characters`, `write at most ${LIMITS.textLength}`);
    } else if (typeof value === 'number' && !Number.isFinite(value)) {
      add(`${value} is not a number`, 'write a finite number');
    } else if (Array.isArray(value)) {
      value.forEach((item, index) => visit(item, [...path, index]));
    } else if (typeof value === 'object' && value !== null) {
      for (const key of Object.keys(value)) {
        if (isReserved(key)) add(`the key "${key}" is reserved`, 'use another name', [...path, key]);
        else visit((value as Record<string, unknown>)[key], [...path, key]);
      }
    }
  }

  try {
    visit(json, []);
  } catch (error) {
    if (!(error instanceof TooLarge)) throw error;
  }
  return problems;
}

/** A problem's place: its path, and the name of the rule it is in, read from raw JSON that may be anything. */
export function placeOf(json: unknown, path: readonly PropertyKey[]): Pick<Problem, 'rule' | 'path'> {
  const [list, index] = path;
  const place = { path: pathText(path) };
  if (list !== 'rules' || typeof index !== 'number') return place;
  const rules: unknown = typeof json === 'object' && json !== null && 'rules' in json ? json.rules : undefined;
  const rule: unknown = Array.isArray(rules) ? rules[index] : undefined;
  const name: unknown = typeof rule === 'object' && rule !== null && 'name' in rule ? rule.name : undefined;
  return { rule: typeof name === 'string' && name !== '' ? name : `number ${index + 1}`, ...place };
}
