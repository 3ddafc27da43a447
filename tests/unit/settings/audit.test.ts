import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { factsOf } from '@/app/(signed-in)/settings/audit/facts';
import { ACTION_WORDS, ENTITY_WORDS, actionWords, subjectOf } from '@/app/(signed-in)/settings/audit/words';
import { METRIC_UNITS, US_UNITS } from '@/lib/units';

const SERVICES = 'lib/services';
const sources = readdirSync(SERVICES, { recursive: true, encoding: 'utf8' })
  .filter((file) => file.endsWith('.ts'))
  .map((file) => readFileSync(join(SERVICES, file), 'utf8'));

/** What `pattern` finds in the services, each once. */
const found = (pattern: RegExp) => [...new Set(sources.flatMap((source) => [...source.matchAll(pattern)].flatMap(([, name]) => name ?? [])))].toSorted();

const people = new Map([['0191e4a0-0000-7000-8000-000000000001', 'Maud Tierney']]);

describe('words of the audit', () => {
  const actions = found(/(?:defineWrite\(\{\s*name|\baction): '([^']+)'/g);

  it('finds every write', () => expect(actions.length).toBeGreaterThan(40));
  it.each(actions)('%s has words', (action) => expect(ACTION_WORDS[action]).toMatch(/^[A-Z][^.]+$/));
  it.each(found(/\bentity: '([^']+)'/g))('the kind %s has words', (entity) => expect(ENTITY_WORDS[entity]).toBeDefined());
  it('has none for what no service writes', () => expect(Object.keys(ACTION_WORDS).filter((action) => !actions.includes(action))).toEqual([]));
  it('makes some of a name that it does not know', () => expect(actionWords('fold.wash_basin')).toBe('Fold wash basin'));
});

describe('facts of the audit', () => {
  it('shows measures in the units of the reader', () => {
    // 1 mi = 1609.344 m by definition.
    const changed = { odometerM: 410_000 * 1609.344 };
    expect(factsOf(changed, { units: US_UNITS, people })).toEqual([{ label: 'Odometer', value: '410,000\u00a0mi' }]);
    expect(factsOf(changed, { units: METRIC_UNITS, people })[0]?.value).toMatch(/\u00a0km$/);
  });

  it('keeps ids, what is empty and how it is kept to the record itself', () => {
    const changed = { caseId: '0191e4a0-0000-7000-8000-00000000000a', valueTyped: null, dangers: [], note: '', kind: 'state', shares: [{ state: 'yes', share: 1 }], asTyped: { boreM: '3 in' } };
    expect(factsOf(changed, { units: US_UNITS, people })).toEqual([]);
  });

  it('names people, checks, terms and days', () => {
    const changed = { assignedTo: [...people.keys()][0], checkId: 'a-check-of-no-edition', whyOut: 'precaution', removedOn: '2026-11-23', hidden: true };
    expect(factsOf(changed, { units: US_UNITS, people })).toEqual([
      { label: 'With', value: 'Maud Tierney' },
      { label: 'Check', value: 'a check of no edition' },
      { label: 'Why out', value: 'As a precaution' },
      { label: 'Removed on', value: '23 Nov 2026' },
      { label: 'Hidden', value: 'yes' },
    ]);
  });

  it('leads to the case of an answer', () => {
    expect(subjectOf({ entity: 'finding', entityId: 'f', changed: { caseId: 'c' } })?.href).toBe('/cases/c');
    expect(subjectOf({ entity: 'api-token', entityId: 't', changed: {} })).toBeNull();
  });
});
