import { expect, test } from 'vitest';
import { fieldsOf, nameIn, typeInWords } from '@/lib/openapi/fields';

test.each([
  [{ type: 'string' }, 'text'],
  [{ type: 'string', format: 'uuid' }, 'uuid'],
  [{ type: 'integer', minimum: 1, maximum: 100 }, 'whole number from 1 to 100'],
  [{ type: 'array', items: { type: 'string' } }, 'list of text'],
  [{ enum: ['truck', 'bus'] }, '“truck”, “bus”'],
  [{ const: 'known' }, '“known”'],
  [{ anyOf: [{ type: 'number' }, { type: 'null' }] }, 'number or null'],
  [{ $ref: '#/components/schemas/Finding' }, 'Finding'],
  [{ type: 'object', additionalProperties: { type: 'boolean' } }, 'true or false by name'],
  [{}, 'anything'],
])('%j is a %s', (schema, words) => {
  expect(typeInWords(schema)).toBe(words);
});

test('fields stand in a flat list, each with its way from the top', () => {
  const inner = { type: 'object', properties: { at: { type: 'string', format: 'date-time' } }, required: ['at'] };
  const schema = { type: 'object', properties: { one: inner, many: { type: 'array', items: inner } }, required: ['one'] };
  expect(fieldsOf(schema).map(({ path, isRequired }) => [path, isRequired])).toEqual([
    ['one', true],
    ['one.at', true],
    ['many', false],
    ['many[].at', true],
  ]);
});

test('a field of one variant says when it counts', () => {
  const variant = (kind: string, name: string) => ({ type: 'object', properties: { kind: { const: kind }, [name]: { type: 'string' } } });
  const fields = fieldsOf({ type: 'object', properties: { unit: { oneOf: [variant('known', 'unitId'), variant('new', 'fleetNumber')] } } });
  expect(fields.find(({ path }) => path === 'unit.unitId')?.when).toBe('unit.kind is “known”');
  expect(fields.find(({ path }) => path === 'unit.fleetNumber')?.when).toBe('unit.kind is “new”');
});

test('a schema that is named is looked up, not written out again', () => {
  const list = { type: 'array', items: { $ref: '#/components/schemas/Finding' } };
  expect(nameIn(list)).toBe('Finding');
  expect(fieldsOf({ type: 'object', properties: { findings: list } })).toHaveLength(1);
});
