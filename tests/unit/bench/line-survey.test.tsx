// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import axe from 'axe-core';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { SurveyDesk } from '@/components/bench/SurveyDesk';
import { GROUPS } from '@/lib/bench/groups';
import { LINE_SURVEY, survey, SURVEY_FIELDS, surveySummary, surveyText } from '@/lib/bench/line-survey';
import { searchOfTexts, textsOfSearch } from '@/lib/bench/texts-in-url';
import { METRIC_UNITS, US_UNITS } from '@/lib/units';

const US = { units: US_UNITS };
const METRIC = { units: METRIC_UNITS, decimal: ',' as const };
const texts = (...points: [distance: string, temperature: string][]) => Object.fromEntries(points.flatMap(([x, t], index) => [[`distance${index + 1}`, { value: x }], [`temperature${index + 1}`, { value: t }]]));
const STEP = texts(['0', '390'], ['2', '375'], ['4', '270'], ['8', '240']);
const read = (...given: Parameters<typeof survey>) => {
  const surveyed = survey(...given);
  return surveyed.kind === 'read' ? surveyed : expect.fail(JSON.stringify(surveyed.errors));
};
const errors = (...given: Parameters<typeof survey>) => {
  const surveyed = survey(...given);
  return surveyed.kind === 'refused' ? surveyed.errors : {};
};

describe('a survey as it was typed', () => {
  test('says where it falls suddenly, in the person’s units', () => {
    expect(surveyText(read(STEP, US), US)).toMatchObject({ headline: 'A sudden fall', sentences: [expect.stringMatching(/^Between 2 ft and 4 ft it falls 53 °F per ft; beside it 7\.5 °F per ft at most\.$/), expect.any(String)] });
    const metric = textsOfSearch(SURVEY_FIELDS, searchOfTexts(SURVEY_FIELDS, STEP, US), METRIC);
    expect(surveyText(read(metric, METRIC), METRIC).sentences[0]).toMatch(/^Between 0,61 m and 1,219 m it falls 96 °C per m; beside it 14 °C per m at most\.$/);
    expect(surveySummary(read(STEP, US), US)).toBe('Temperature of the line: from 390 °F at 0 ft to 240 °F at 8 ft, read at 4 points.');
  });

  test('says nothing of two points, and waits for the temperature of a third', () => {
    expect(surveyText(read(texts(['0', '390'], ['2', '200'], ['4', '']), US), US).headline).toBe('—');
    expect(surveyText(read(texts(['0', '390'], ['2', '380'], ['4', '372']), US), US).headline).toBe('No sudden fall');
  });

  test('is refused beside its field', () => {
    expect(errors(texts(['0', '390'], ['', '380']), US)).toEqual({ distance2: 'Give the distance of this point too.' });
    expect(errors(texts(['1', '390'], ['12 in', '380']), US)).toEqual({ distance2: 'Another point is at this distance. Keep one of them.' });
    expect(Object.keys(errors(texts(['0', 'hot'], ['90', '2000']), US))).toEqual(['temperature1', 'distance2', 'temperature2']);
    expect(errors(texts(['90', '300']), METRIC).distance1).toBe('Distance of point 1 must be from 0 m to 18.288 m.');
  });

  test('stands on the bench, and is no sum', () => {
    expect(GROUPS.flatMap(({ others = [] }) => others)).toEqual([LINE_SURVEY]);
  });
});

describe('its page', () => {
  beforeEach(() => void Object.assign(window, { matchMedia: () => ({ matches: false, addEventListener: () => undefined, removeEventListener: () => undefined }) }));
  afterEach(cleanup);

  test('answers as one types, and marks the field that can’t be used', async () => {
    const { container } = render(<SurveyDesk search={{}} writing={US} />);
    const type = (id: string, value: string) => fireEvent.change(document.getElementById(id) as HTMLInputElement, { target: { value } });
    for (const [id, text] of Object.entries(STEP)) type(id, text.value);
    expect(screen.getByTestId('result').textContent).toBe('A sudden fall');
    expect(screen.getAllByRole('row', { hidden: true })).toHaveLength(4);
    const { violations } = await axe.run(container, { rules: { 'color-contrast': { enabled: false }, region: { enabled: false } } });
    expect(violations.map(({ id }) => id)).toEqual([]);
    type('temperature2', 'warm');
    expect(document.getElementById('temperature2')?.getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByTestId('result').textContent).toBe('—');
  });
});
