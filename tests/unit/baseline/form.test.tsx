// @vitest-environment jsdom
import { afterEach, expect, test } from 'vitest';
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import axe from 'axe-core';
import { BaselineForm } from '@/components/units/BaselineForm';
import { FIGURES } from '@/lib/baseline/figures';
import type { ActionState } from '@/lib/auth/form';
import { METRIC_UNITS } from '@/lib/units';

afterEach(cleanup);

type State = ActionState<{ id: string; unitId: string }>;
const refusing = (_: State, form: FormData): Promise<State> =>
  Promise.resolve({
    ok: false,
    message: 'Some of what you entered needs another look.',
    fields: { headTemperature: '900 can’t be right here.' },
    values: Object.fromEntries([...form].map(([name, value]) => [name, String(value)])),
  });

const show = () =>
  render(
    <main>
      <h1>Healthy baseline</h1>
      <BaselineForm action={refusing} newId="set" unitId="unit" units={METRIC_UNITS} today="2026-05-12" />
    </main>,
  );
const field = (name: string) => document.querySelector<HTMLInputElement>(`[name=${name}]`) ?? expect.fail(`no field ${name}`);
const type = (name: string, value: string) => fireEvent.input(field(name), { target: { value } });

test('has a step for each figure, its caution before its steps and its field', () => {
  show();
  for (const { name, caution, steps, field: of } of FIGURES) {
    const step = within(screen.getByRole('group', { name: new RegExp(name.slice(0, 12)) }));
    const parts = [step.getByText(caution), step.getByRole('list'), field(of)];
    expect(step.getAllByRole('listitem')).toHaveLength(steps.length);
    for (const [i, part] of parts.slice(1).entries()) expect(parts[i]?.compareDocumentPosition(part)).toBe(Node.DOCUMENT_POSITION_FOLLOWING);
  }
});

test('says how many are measured, as they are typed', () => {
  show();
  expect(screen.getByText('0 of 5 measured')).toBeTruthy();
  type('buildUp', '24');
  type('oilCarried', '0.2');
  type('ambient', '20');
  expect(screen.getByText('2 of 5 measured')).toBeTruthy();
  type('buildUp', ' ');
  expect(screen.getByText('1 of 5 measured')).toBeTruthy();
});

test('loses nothing that was typed when it is refused, and says so beside the field', async () => {
  show();
  type('buildUp', '24');
  type('headTemperature', '900');
  type('note', 'Elbow of the fitting');
  fireEvent.submit(field('buildUp').form ?? document.body);
  await screen.findAllByText('900 can’t be right here.');
  expect(['buildUp', 'headTemperature', 'note'].map((name) => field(name).value)).toEqual(['24', '900', 'Elbow of the fitting']);
  expect(field('headTemperature').getAttribute('aria-invalid')).toBe('true');
  expect(screen.getByText('2 of 5 measured')).toBeTruthy();
});

test('reads well to a screen reader', async () => {
  show();
  const { violations } = await axe.run(document.body, { rules: { 'color-contrast': { enabled: false }, region: { enabled: false } } });
  expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
});
