import { describe, expect, it } from 'vitest';
import { causes } from '@/lib/diagnose/default-rulebook/causes';
import { cautions } from '@/lib/diagnose/default-rulebook/cautions';
import { remedies } from '@/lib/diagnose/default-rulebook/remedies';
import * as common from '@/lib/diagnose/default-rulebook/remedies/common-steps';
import { causesWithoutRemedy } from '@/lib/diagnose/default-rulebook/remedies/no-part';
import { settings } from '@/lib/diagnose/default-rulebook/settings';
import { repairOrder } from '@/lib/diagnose/repair-order';
import { repairProblem } from '@/lib/diagnose/repair-order-costs';
import type { Remedy } from '@/lib/diagnose/types';
import { NORMAL_CARRYOVER } from '@/lib/diagnose/types';

const byId = new Map(remedies.map((remedy) => [remedy.id, remedy]));
const has = (remedy: Remedy, steps: string | readonly string[]) =>
  [steps].flat().every((step) => remedy.steps.includes(step));

/** Money of a remedy carried through to its end. */
const wholeCost = ({ look, fix, parts }: Remedy) =>
  ((look.minutes + fix.minutes) / 60) * settings.labourRatePerHour + parts.reduce((sum, { cost }) => sum + cost, 0);

describe('remedies of the default rulebook', () => {
  it('have ids of their own', () => {
    expect(byId.size).toBe(remedies.length);
  });

  it.each(causes.map(({ id }) => id))('%s has a remedy, or a reason why none', (id) => {
    const removing = remedies.filter((remedy) => remedy.causes.includes(id));
    if (removing.length === 0) expect(causesWithoutRemedy[id]).toMatch(/\.$/);
    else expect(causesWithoutRemedy[id]).toBeUndefined();
  });

  it('name only causes and cautions that exist, none twice', () => {
    const causeIds = new Set(causes.map(({ id }) => id));
    const cautionIds = new Set(cautions.map(({ id }) => id));
    for (const remedy of remedies) {
      expect(remedy.causes.length, remedy.id).toBeGreaterThan(0);
      expect(new Set(remedy.causes).size, remedy.id).toBe(remedy.causes.length);
      expect(new Set(remedy.cautions).size, remedy.id).toBe(remedy.cautions.length);
      for (const cause of remedy.causes) expect(causeIds, remedy.id).toContain(cause);
      for (const caution of remedy.cautions) expect(cautionIds, remedy.id).toContain(caution);
    }
  });

  it('stand at the station of a cause that they remove', () => {
    for (const remedy of remedies) {
      const stations = causes.filter(({ id }) => remedy.causes.includes(id)).map(({ station }) => station);
      expect(stations, remedy.id).toContain(remedy.station);
    }
  });

  it('begin with the wheels chocked, and never repeat a step', () => {
    for (const { id, steps } of remedies) {
      expect(steps[0], id).toMatch(/chock the wheels/);
      expect(new Set(steps).size, id).toBe(steps.length);
    }
  });

  it.each<[string, string | readonly string[], string[]]>([
    ['let the air out', common.letTheAirOut, ['vehicle-rolls', 'pressure-falls-suspension-brakes', 'stored-air']],
    ['clean out old oil', common.cleanDownstream, ['pressure-falls-suspension-brakes', 'stored-air', 'oil-in-brake-system']],
    ['run in under load', common.breakInRun, ['exhaust-fumes', 'oil-mist-and-noise', 'hot-parts', 'belts-fan-gears']],
    ['prove the air side', common.proveTheAirSide, ['exhaust-fumes', 'belts-fan-gears']],
    ['read with the engine running', common.makeSafeToRun, ['vehicle-rolls', 'exhaust-fumes', 'belts-fan-gears']],
  ])('that %s carry its cautions', (_, steps, needed) => {
    const concerned = remedies.filter((remedy) => has(remedy, steps));
    expect(concerned.length).toBeGreaterThan(0);
    for (const remedy of concerned) expect(remedy.cautions, remedy.id).toEqual(expect.arrayContaining(needed));
  });

  it('look at brake function wherever the repair is about oil', () => {
    const aboutOil = ['clear-sealant-from-drain', 'replace-intake-filter', 'replace-compressor', 'replace-discharge-line'];
    for (const id of aboutOil) expect(has(byId.get(id)!, common.cleanDownstream), id).toBe(true);
  });

  it('start a watch wherever it is about oil, or the bay can’t tell', () => {
    for (const remedy of remedies)
      if (!remedy.seenInBay || has(remedy, common.cleanDownstream)) expect(has(remedy, common.startTheWatch), remedy.id).toBe(true);
  });

  it('change line and governor, spare the drain, run in and prove with every compressor', () => {
    const compressor = byId.get('replace-compressor')!;
    for (const steps of [common.gasketAtTheMount, common.cleanDownstream, common.breakInRun, common.proveTheAirSide])
      expect(has(compressor, steps)).toBe(true);
    const text = compressor.steps.join(' ');
    for (const word of ['Change the discharge line', 'Change the governor', 'oil feed line', 'a fibre gear never', '250 psi'])
      expect(text).toContain(word);
  });

  it('name no tightening torque: that is the maker’s value', () => {
    for (const { id, steps } of remedies) expect(steps.join(' '), id).not.toMatch(/\d\s*(Nm|N·m|lb[- ]?ft|ft[- ]?lb)\b/i);
  });

  it('make a compressor the dearest single repair but for those that contain one', () => {
    const containsOne = ['replace-compressor', 'replace-failed-compressor', 'seal-intake-and-renew-compressor', 'match-demand'];
    const compressor = wholeCost(byId.get('replace-compressor')!);
    for (const remedy of remedies)
      if (!containsOne.includes(remedy.id)) expect(wholeCost(remedy), remedy.id).toBeLessThan(compressor);
    expect(compressor).toBeLessThan(settings.serviceCost);
  });
});

describe('the order of repairs over the default remedies', () => {
  const problem = repairProblem(remedies, causes, settings);
  const withLeader = (id: string, p: number) => {
    const prior = causes.find((cause) => cause.id === id)!.prior;
    return causes.map((cause) => (cause.id === id ? p : (cause.prior * (1 - p)) / (1 - prior)));
  };

  it.each(causes.map(({ id }) => id).filter((id) => !(id in causesWithoutRemedy) && id !== NORMAL_CARRYOVER))(
    'begins, when fairly sure of %s, with a remedy that removes it',
    (id) => {
      expect(repairOrder(problem, withLeader(id, 0.8)).steps[0]?.causeIds).toContain(id);
    },
  );

  it('does not begin with a compressor while a choked drain leads', () => {
    for (const p of [0.3, 0.5, 0.7])
      expect(repairOrder(problem, withLeader('drain-choked-by-sealant', p)).steps[0]?.remedyId).not.toBe('replace-compressor');
  });

  it('buys no compressor for normal carryover', () => {
    const { steps, expectedCost } = repairOrder(problem, withLeader(NORMAL_CARRYOVER, 0.95));
    expect(steps.slice(0, 1).map(({ remedyId }) => remedyId)).not.toContain('replace-compressor');
    expect(expectedCost).toBeLessThan(500);
  });
});
