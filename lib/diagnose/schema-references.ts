import type { Problem } from './errors';
import { pathText } from './schema-limits';
import type { ShapedRulebook } from './schema-shape';
import { SOMETHING_ELSE } from './types';

/** How far shares that must sum to 1 may be off it. */
export const SUM_WITHIN = 1e-6;

/**
 * Names that stand twice, names of things that are not there, and priors that do not add up.
 *
 * @param book a rulebook of the right shape
 * @returns every problem found
 */
export function referenceProblems(book: ShapedRulebook): Problem[] {
  return [...duplicates(book), ...dangling(book), ...priorProblems(book)];
}

type Path = readonly PropertyKey[];

function duplicates(book: ShapedRulebook): Problem[] {
  const found: Problem[] = [];
  /** Each text with its place; of two equal ones the second is the problem. */
  const unique = (entries: readonly { text: string; path: Path }[]) => {
    const first = new Map<string, Path>();
    for (const { text, path } of entries) {
      const before = first.get(text);
      if (!before) {
        first.set(text, path);
        continue;
      }
      found.push({
        ...(path[0] === 'rules' ? { rule: text } : {}),
        path: pathText(path),
        message: `"${text}" stands there twice, first at ${pathText(before)}`,
        instead: 'give each its own, or leave one out',
      });
    }
  };
  const ids = (path: Path, items: readonly { id: string }[]) =>
    unique(items.map(({ id }, index) => ({ text: id, path: [...path, index, 'id'] })));
  const names = (path: Path, items: readonly { name: string }[]) =>
    unique(items.map(({ name }, index) => ({ text: name, path: [...path, index, 'name'] })));
  const texts = (path: Path, items: readonly string[]) => unique(items.map((text, index) => ({ text, path: [...path, index] })));

  ids(['causes'], book.causes);
  names(['causes'], book.causes);
  ids(['checks'], book.checks);
  book.checks.forEach((check, index) => {
    ids(['checks', index, 'states'], check.states);
    unique(check.states.map(({ label }, state) => ({ text: label, path: ['checks', index, 'states', state, 'label'] })));
    texts(['checks', index, 'spoils'], check.spoils);
    texts(['checks', index, 'cautions'], check.cautions);
    texts(['checks', index, 'setUp', 'access'], check.setUp.access ?? []);
  });
  ids(['panels'], book.panels);
  // A check is shown on one screen, so it stands in one panel at most.
  unique(book.panels.flatMap(({ checks }, panel) => checks.map((text, index) => ({ text, path: ['panels', panel, 'checks', index] }))));
  ids(['evidenceGroups'], book.evidenceGroups);
  names(['evidenceGroups'], book.evidenceGroups);
  names(['rules'], book.rules);
  ids(['remedies'], book.remedies);
  names(['remedies'], book.remedies);
  book.remedies.forEach((remedy, index) => {
    texts(['remedies', index, 'causes'], remedy.causes);
    texts(['remedies', index, 'cautions'], remedy.cautions);
  });
  ids(['cautions'], book.cautions);
  names(['priorVariants'], book.priorVariants ?? []);
  return found;
}

function dangling(book: ShapedRulebook): Problem[] {
  const found: Problem[] = [];
  const known = {
    cause: new Set(book.causes.map(({ id }) => id)),
    check: new Set(book.checks.map(({ id }) => id)),
    caution: new Set(book.cautions.map(({ id }) => id)),
    'evidence group': new Set(book.evidenceGroups.map(({ id }) => id)),
  };
  const need = (kind: keyof typeof known, id: string, path: Path, rule?: string) => {
    if (known[kind].has(id)) return;
    found.push({
      ...(rule === undefined ? {} : { rule }),
      path: pathText(path),
      message: `there is no ${kind} "${id}"`,
      instead: `write the id of ${kind === 'evidence group' ? 'an' : 'a'} ${kind} of this rulebook`,
    });
  };
  const needAll = (kind: keyof typeof known, ids: readonly string[], path: Path) =>
    ids.forEach((id, index) => need(kind, id, [...path, index]));

  book.checks.forEach((check, index) => {
    needAll('check', check.spoils, ['checks', index, 'spoils']);
    needAll('caution', check.cautions, ['checks', index, 'cautions']);
    if (check.spoils.includes(check.id)) {
      found.push({ path: pathText(['checks', index, 'spoils']), message: `"${check.id}" spoils itself`, instead: 'leave it out of its own list' });
    }
  });
  book.panels.forEach((panel, index) => needAll('check', panel.checks, ['panels', index, 'checks']));
  book.remedies.forEach((remedy, index) => {
    needAll('cause', remedy.causes, ['remedies', index, 'causes']);
    needAll('caution', remedy.cautions, ['remedies', index, 'cautions']);
  });
  book.rules.forEach(({ name, weights, group }, index) => {
    if (group !== undefined) need('evidence group', group, ['rules', index, 'group'], name);
    for (const cause of Object.keys(weights)) need('cause', cause, ['rules', index, 'weights', cause], name);
  });
  book.priorVariants?.forEach(({ priors }, index) => {
    for (const cause of Object.keys(priors)) need('cause', cause, ['priorVariants', index, 'priors', cause]);
  });
  return found;
}

function priorProblems(book: ShapedRulebook): Problem[] {
  const found: Problem[] = [];
  const sum = book.causes.reduce((total, { prior }) => total + prior, 0);
  if (Math.abs(sum - 1) > SUM_WITHIN) {
    found.push({ path: 'causes', message: `the priors sum to ${round(sum)}, not to 1`, instead: 'change them so that they sum to 1' });
  }
  if (!book.causes.some(({ id }) => id === SOMETHING_ELSE)) {
    found.push({ path: 'causes', message: `there is no cause "${SOMETHING_ELSE}"`, instead: `list it, with its prior: no rulebook knows everything` });
  }
  book.priorVariants?.forEach(({ when, priors }, index) => {
    const named = Object.values(priors).reduce((total, prior) => total + prior, 0);
    const namesAll = book.causes.every(({ id }) => Object.hasOwn(priors, id));
    if (namesAll ? Math.abs(named - 1) > SUM_WITHIN : named >= 1) {
      found.push({
        path: pathText(['priorVariants', index, 'priors']),
        message: `its priors sum to ${round(named)}`,
        instead: namesAll ? 'change them so that they sum to 1' : 'leave something for the causes it does not name: less than 1 in all',
      });
    }
    for (const [fact, wanted] of Object.entries(when)) {
      if (typeof wanted === 'string') continue;
      const { atLeast = -Infinity, below = Infinity } = wanted;
      if (atLeast < below && (wanted.atLeast !== undefined || wanted.below !== undefined)) continue;
      found.push({
        path: pathText(['priorVariants', index, 'when', fact]),
        message: 'the range holds nothing, or everything',
        instead: 'write "atLeast", "below" or both, "atLeast" the smaller',
      });
    }
  });
  return found;
}

const round = (value: number) => Number(value.toFixed(6));
