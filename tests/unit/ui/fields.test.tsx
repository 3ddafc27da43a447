// @vitest-environment jsdom
import { afterEach, expect, test } from 'vitest';
import { cleanup, render, screen, within } from '@testing-library/react';
import axe from 'axe-core';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { FormErrorSummary } from '@/components/ui/FormErrorSummary';
import { NumberWithUnitField } from '@/components/ui/NumberWithUnitField';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { TextareaField } from '@/components/ui/TextareaField';
import { TextField } from '@/components/ui/TextField';

afterEach(cleanup);

const describedBy = (control: Element) =>
  (control.getAttribute('aria-describedby') ?? '').split(' ').map((id) => document.getElementById(id)?.textContent);

test.each([
  ['text', <TextField key="f" label="Fleet number" name="f" hint="On the door" error="Give it." />],
  ['textarea', <TextareaField key="f" label="Fleet number" name="f" hint="On the door" error={['Give it.']} />],
  ['select', <SelectField key="f" label="Fleet number" name="f" hint="On the door" error="Give it." options={[{ value: 'a', label: 'A' }]} />],
  ['checkbox', <CheckboxField key="f" label="Fleet number" name="f" hint="On the door" error="Give it." />],
  ['number', <NumberWithUnitField key="f" label="Fleet number" name="f" hint="On the door" error="Give it." units={[{ value: 'psi', label: 'psi' }]} />],
])('a %s field is named by its label and described by hint and error', (_, field) => {
  render(field);
  const control = screen.getByLabelText('Fleet number');
  expect(control.getAttribute('name')).toBe('f');
  expect(control.id).toBe('f');
  expect(control.getAttribute('aria-invalid')).toBe('true');
  expect(describedBy(control)).toEqual(['On the door', expect.stringContaining('Give it.')]);
});

test('a field without hint and error says nothing about either', () => {
  render(<TextField label="Fleet number" name="f" error={[]} />);
  const control = screen.getByLabelText('Fleet number');
  expect(control.hasAttribute('aria-describedby')).toBe(false);
  expect(control.hasAttribute('aria-invalid')).toBe(false);
});

test('a figure takes what people type, and its fixed unit is read with it', () => {
  render(<NumberWithUnitField label="Bore" name="bore" unit="in" defaultValue="5/8" hint="At the head" />);
  const control = screen.getByLabelText<HTMLInputElement>('Bore');
  expect(control.value).toBe('5/8');
  expect(describedBy(control)).toEqual(['in', 'At the head']);
});

test('a choice of units is sent under a name of its own', () => {
  render(<NumberWithUnitField label="Cut-out" name="cutOut" units={[{ value: 'psi', label: 'psi' }, { value: 'kPa', label: 'kPa' }]} defaultUnit="kPa" />);
  const unit = screen.getByLabelText<HTMLSelectElement>('Unit of Cut-out');
  expect([unit.name, unit.value]).toEqual(['cutOutUnit', 'kPa']);
});

test('a radio group is named by its question, and the summary leads to its first choice', () => {
  render(
    <>
      <FormErrorSummary errors={{ soft: 'Pick one.' }} />
      <RadioGroup label="Is it soft?" name="soft" error="Pick one." choices={[{ value: 'yes', label: 'Yes' }, { value: 'no', label: 'No' }]} defaultValue="no" />
    </>,
  );
  const group = screen.getByRole('radiogroup', { name: 'Is it soft?' });
  expect(describedBy(group)).toEqual([expect.stringContaining('Pick one.')]);
  expect(within(group).getByRole<HTMLInputElement>('radio', { name: 'No' }).checked).toBe(true);
  const link = screen.getByRole('link', { name: 'Pick one.' });
  expect(document.querySelector(link.getAttribute('href') ?? '')).toBe(within(group).getByRole('radio', { name: 'Yes' }));
});

test('the summary takes the focus each time a form comes back with errors', () => {
  const { rerender } = render(<FormErrorSummary />);
  expect(screen.queryByRole('alert')).toBeNull();
  rerender(<FormErrorSummary errors={{ f: ['Give it.'] }} formError="Not saved." />);
  expect(document.activeElement).toBe(screen.getByRole('alert'));
  (document.activeElement as HTMLElement).blur();
  rerender(<FormErrorSummary errors={{ f: ['Give it.'] }} formError="Not saved." />);
  expect(document.activeElement).toBe(screen.getByRole('alert'));
});

test('a form of all of them has no axe violation', async () => {
  const { container } = render(
    <form method="post">
      <FormErrorSummary errors={{ a: 'Give it.' }} />
      <TextField label="A" name="a" error="Give it." required />
      <TextareaField label="B" name="b" required={false} />
      <SelectField label="C" name="c" placeholder="Any" options={[{ label: 'Group', options: [{ value: '1', label: 'One' }] }]} />
      <NumberWithUnitField label="D" name="d" unit="mi" />
      <NumberWithUnitField label="E" name="e" units={[{ value: 'psi', label: 'psi' }]} />
      <CheckboxField label="F" name="f" hint="Ticked or not" />
      <RadioGroup label="G" name="g" required choices={[{ value: 'yes', label: 'Yes', hint: 'It is' }, { value: 'no', label: 'No' }]} />
    </form>,
  );
  // jsdom has no layout; contrast is computed from the tokens in contrast.test.ts.
  const { violations } = await axe.run(container, { rules: { 'color-contrast': { enabled: false }, region: { enabled: false } } });
  expect(violations.map(({ id, nodes }) => [id, nodes.map((node) => node.html)])).toEqual([]);
});
