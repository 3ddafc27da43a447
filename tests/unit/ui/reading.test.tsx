// @vitest-environment jsdom
import { afterEach, describe, expect, test } from 'vitest';
import { cleanup, render, screen } from '@testing-library/react';
import axe from 'axe-core';
import { OilPathDrawing } from '@/components/oil-path/OilPathDrawing';
import { themeFrom } from '@/components/shell/theme';
import { DataTable } from '@/components/ui/DataTable';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { Pager } from '@/components/ui/Pager';
import { percent, SightGlass } from '@/components/ui/SightGlass';

afterEach(cleanup);

describe('DataTable', () => {
  const table = (
    <DataTable
      caption="Units"
      columns={[
        { key: 'number', header: 'Number', cell: (unit) => unit.number, rowHeader: true, sortable: true },
        { key: 'miles', header: 'Odometer', cell: (unit) => unit.miles, numeric: true, sortable: true },
        { key: 'site', header: 'Site', cell: () => 'Eastgate' },
      ]}
      rows={[{ number: 'K-104', miles: '412 300' }]}
      rowKey={(unit) => unit.number}
      sort={{ key: 'number', direction: 'asc' }}
      sortHref={({ key, direction }) => `/units?sort=${key}&direction=${direction}`}
    />
  );

  test('says how it is sorted, and each head leads to the next order', () => {
    render(table);
    const [number, odometer, site] = screen.getAllByRole('columnheader');
    expect(number?.getAttribute('aria-sort')).toBe('ascending');
    expect(odometer?.hasAttribute('aria-sort')).toBe(false);
    expect(site?.querySelector('a')).toBeNull();
    expect(screen.getByRole('link', { name: 'Number' }).getAttribute('href')).toBe('/units?sort=number&direction=desc');
    expect(screen.getByRole('link', { name: 'Odometer' }).getAttribute('href')).toBe('/units?sort=miles&direction=asc');
  });

  test('is a named region that the keyboard can scroll, with a named row', () => {
    render(table);
    expect(screen.getByRole('region', { name: 'Units' }).tabIndex).toBe(0);
    expect(screen.getByRole('rowheader', { name: 'K-104' })).toBeTruthy();
  });

  test('without rows shows what to do instead', () => {
    render(<DataTable caption="Units" columns={[]} rows={[]} rowKey={() => ''} empty={<p>Add a unit.</p>} />);
    expect(screen.queryByRole('table')).toBeNull();
    expect(screen.getByText('Add a unit.')).toBeTruthy();
  });
});

describe('SightGlass', () => {
  test('is a meter with name, number and movement, and prints the number', () => {
    render(<SightGlass label="Drain choked by sealant" value={0.416} previous={0.17} />);
    const meter = screen.getByRole('meter', { name: 'Drain choked by sealant' });
    expect(meter.getAttribute('aria-valuenow')).toBe('42');
    expect(meter.getAttribute('aria-valuetext')).toBe('42%, was 17%');
    expect(screen.getByText('42%')).toBeTruthy();
  });

  test.each([
    [0, '0%'],
    [0.004, '<1%'],
    [0.5, '50%'],
    [0.996, '>99%'],
    [1, '100%'],
    [-0.1, '0%'],
    [1.2, '100%'],
  ])('a share of %s reads %s', (value, words) => expect(percent(value)).toBe(words));
});

test('a caution and a danger say their kind in a heading', () => {
  render(
    <>
      <Notice kind="caution" title="Air under pressure">Drain it.</Notice>
      <Notice kind="danger">Stand clear.</Notice>
      <Notice kind="saved">Kept.</Notice>
    </>,
  );
  expect(screen.getByRole('group', { name: 'Caution Air under pressure' })).toBeTruthy();
  expect(screen.getByRole('group', { name: 'Danger' })).toBeTruthy();
  expect(screen.getByRole('status').textContent).toContain('Kept.');
});

test('the pager has no way back from the first page and none on from the last', () => {
  const hrefFor = (page: number) => `/units?page=${page}`;
  render(<Pager label="Pages of units" page={1} pageCount={2} total={30} hrefFor={hrefFor} />);
  expect(screen.getAllByRole('link').map((link) => link.getAttribute('href'))).toEqual(['/units?page=2']);
  cleanup();
  render(<Pager label="Pages of units" page={2} pageCount={2} hrefFor={hrefFor} />);
  expect(screen.getAllByRole('link').map((link) => link.getAttribute('href'))).toEqual(['/units?page=1']);
});

test('the drawing of the oil path has a name and says the path in words', () => {
  render(<OilPathDrawing />);
  const drawing = screen.getByRole('img', { name: /path that oil takes/ });
  expect(document.getElementById(drawing.getAttribute('aria-describedby') ?? '')?.textContent).toMatch(/meet, at the cylinder/);
});

test('a theme cookie that nobody set means the device decides', () => {
  expect([undefined, 'dark', 'light', 'sepia'].map(themeFrom)).toEqual(['device', 'dark', 'light', 'device']);
});

test('a page of reading parts has no axe violation', async () => {
  const { container } = render(
    <main>
      <PageHeader title="Unit K-104" breadcrumbs={[{ label: 'Units', href: '/units' }]} />
      <h2>Facts</h2>
      <DefinitionList items={[{ term: 'Odometer', value: '412 300 mi', figure: true }, { term: 'Build date', value: null }]} />
      <Notice kind="caution" title="Air under pressure">Drain it.</Notice>
      <SightGlass label="Rings worn" value={0.2} />
      <OilPathDrawing />
    </main>,
  );
  const { violations } = await axe.run(container, { rules: { 'color-contrast': { enabled: false } } });
  expect(violations.map(({ id, nodes }) => [id, nodes.map((node) => node.html)])).toEqual([]);
});
