import { expect, test } from 'vitest';
import { cautionsHere } from '@/lib/case/cautions-here';

const rulebook = { cautions: { rolls: { text: '', worseWhen: [] }, hot: { text: '', worseWhen: ['engine-running'] }, noise: { text: '', worseWhen: [] } } } as unknown as Parameters<typeof cautionsHere>[0]['rulebook'];
const check = (cautions: string[], engine: 'off' | 'governed' = 'off') => ({ cautions, setUp: { engine } }) as unknown as Parameters<typeof cautionsHere>[1];
const nothingRead = { rulebook, state: { acknowledged: [] } };
const read = (...ids: string[]) => ({ rulebook, state: { acknowledged: ids.map((cautionId) => ({ cautionId, dangers: [] })) } });

test('alone it asks for all that is unread and reminds of the rest', () => {
  expect(cautionsHere(read('rolls'), check(['rolls', 'hot']))).toEqual({ toRead: ['hot'], askedHere: ['hot'], remindedHere: ['rolls'] });
});

test('what a check above asks for is not asked again, and is still to be read', () => {
  expect(cautionsHere(nothingRead, check(['rolls', 'noise']), [check(['rolls', 'hot'])])).toEqual({ toRead: ['rolls', 'noise'], askedHere: ['noise'], remindedHere: [] });
});

test('what a check above reminds of is not repeated', () => {
  expect(cautionsHere(read('rolls', 'noise'), check(['rolls', 'noise']), [check(['rolls'])])).toEqual({ toRead: [], askedHere: [], remindedHere: ['noise'] });
});

test('what was read for a state with less danger is asked for, though a check above shows it as read', () => {
  expect(cautionsHere(read('hot'), check(['hot'], 'governed'), [check(['hot'])])).toEqual({ toRead: ['hot'], askedHere: ['hot'], remindedHere: [] });
});
