import { beforeAll, describe, expect, test } from 'vitest';
import { makeDemo, type Demo } from '@/db/seed/demo';
import { SMALL_HOLE } from '@/db/seed/demo/compressor-models';
import { PEOPLE, SITES } from '@/db/seed/demo/organisation';
import type { Row } from '@/db/seed/demo/rows';
import { idOf } from '@/db/seed/demo/case-story';
import { makeVehicles } from '@/db/seed/demo/vehicles';
import { baselineFor } from '@/lib/baseline/baseline-for';
import { pool } from '@/lib/baseline/pool';
import type { BaselineSet } from '@/lib/baseline/set';
import { compileRulebook, rank } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';

const TODAY = new Date('2026-03-12T00:00:00Z');
/** The whole demo takes some ten seconds of one core. */
const PATIENCE_MS = 240_000;

let demo: Demo;
beforeAll(() => {
  demo = makeDemo(TODAY, defaultRulebook);
}, PATIENCE_MS);

const times = (row: Record<string, unknown>) => Object.values(row).filter((value): value is Date => value instanceof Date);
const trueIds = (caseId: string) => (demo.truths.get(caseId) ?? []).map(idOf);
const lastRuns = () => new Map(demo.rows.run.map((run) => [run.caseId, run]));
function groupedBy<T>(items: readonly T[], key: (item: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const item of items) groups.set(key(item), [...(groups.get(key(item)) ?? []), item]);
  return groups;
}
const share = (part: number, whole: number) => part / Math.max(1, whole);

describe('the demo', () => {
  test('comes out the same to the last byte for the same day', () => {
    const some = makeVehicles().filter((_, i) => i % 15 === 0);
    const text = () => JSON.stringify(makeDemo(TODAY, defaultRulebook, some).rows);
    expect(text()).toBe(text());
  }, PATIENCE_MS);

  test('moves with today: the same cases, as far back from it', () => {
    const some = makeVehicles().filter((_, i) => i % 15 === 0);
    const opened = (today: Date) => makeDemo(today, defaultRulebook, some).rows.cases.length;
    const [now, later] = [opened(TODAY), opened(new Date('2027-08-01T00:00:00Z'))];
    expect(Math.abs(now - later)).toBeLessThan(0.35 * now);
  }, PATIENCE_MS);

  test('is as large as it was asked for', () => {
    const { rows } = demo;
    expect(rows.unit.length).toBeGreaterThanOrEqual(115);
    expect(rows.unit.length).toBeLessThanOrEqual(125);
    expect(rows.compressorModel).toHaveLength(8);
    expect(rows.cases.length).toBeGreaterThan(400);
    expect(rows.cases.length).toBeLessThan(500);
    expect(rows.fit.length).toBeGreaterThan(200);
    expect(PEOPLE.length).toBeGreaterThanOrEqual(12);
    const withStatus = (status: string) => rows.cases.filter((row) => row.status === status).length;
    expect(withStatus('open')).toBeGreaterThanOrEqual(15);
    expect(withStatus('open')).toBeLessThanOrEqual(36);
    expect(withStatus('called')).toBeGreaterThan(5);
    expect(rows.caseEvent.filter(({ kind }) => kind === 'reopened').length).toBeGreaterThan(10);
  });

  test('happens before today, and what is open is recent', () => {
    for (const rows of Object.values(demo.rows)) {
      for (const row of rows) for (const at of times(row)) expect(at.getTime()).toBeLessThan(TODAY.getTime());
    }
    const open = demo.rows.cases.filter(({ status }) => status === 'open').map(({ openedAt }) => (TODAY.getTime() - openedAt.getTime()) / 86_400_000);
    expect(share(open.filter((days) => days <= 60).length, open.length)).toBeGreaterThan(0.85);
  });

  test('numbers its cases from 1 in the order in which they were opened', () => {
    expect(demo.rows.cases.map(({ number }) => number)).toEqual(demo.rows.cases.map((_, i) => i + 1));
    const opened = demo.rows.cases.map(({ openedAt }) => openedAt.getTime());
    expect(opened).toEqual([...opened].sort((a, b) => a - b));
  });

  test('gives every row its own id and refers only to rows that are there', () => {
    const { rows } = demo;
    const ids = Object.fromEntries(Object.entries(rows).map(([name, all]) => [name, new Set<string>(all.map((row) => ('id' in row ? row.id : `${row.setId} ${row.figure}`)))]));
    for (const [name, all] of Object.entries(rows)) expect(ids[name]?.size, name).toBe(all.length);
    const people = new Set(PEOPLE.map(({ id }) => id));
    const missing = <T>(all: readonly T[], key: (row: T) => string | null | undefined, known?: ReadonlySet<string>) =>
      all.filter((row) => (key(row) ?? null) !== null && !known?.has(key(row) ?? '')).length;
    expect(missing(rows.unitReading, (row) => row.unitId, ids.unit)).toBe(0);
    expect(missing(rows.fit, (row) => row.unitId, ids.unit)).toBe(0);
    expect(missing(rows.fit, (row) => row.modelId, ids.compressorModel)).toBe(0);
    expect(missing(rows.baselineSet, (row) => row.fitId, ids.fit)).toBe(0);
    expect(missing(rows.baselineFigure, (row) => row.setId, ids.baselineSet)).toBe(0);
    expect(missing(rows.cases, (row) => row.unitId, ids.unit)).toBe(0);
    expect(missing(rows.cases, (row) => row.fitId, ids.fit)).toBe(0);
    expect(missing(rows.cases, (row) => row.siteId, new Set(Object.values(SITES).map(({ id }) => id)))).toBe(0);
    expect(missing(rows.finding, (row) => row.caseId, ids.cases)).toBe(0);
    expect(missing(rows.finding, (row) => row.supersedes, ids.finding)).toBe(0);
    expect(missing(rows.finding, (row) => row.personId, people)).toBe(0);
    expect(missing(rows.findingNote, (row) => row.findingId, ids.finding)).toBe(0);
    expect(missing(rows.run, (row) => row.becauseOf, ids.finding)).toBe(0);
    expect(missing(rows.call, (row) => row.runId, ids.run)).toBe(0);
    expect(missing(rows.call, (row) => row.supersedes, ids.call)).toBe(0);
    expect(missing(rows.caseEvent, (row) => row.callId, ids.call)).toBe(0);
    const audited = new Set(rows.audit.map(({ entityId }) => entityId));
    // What a case is opened with is audited as its opening.
    const answers = rows.finding.filter(({ askedBecause }) => askedBecause !== 'always');
    const written = [rows.unit, rows.compressorModel, rows.fit, rows.cases, rows.findingNote, rows.call, rows.unitReading, rows.baselineSet, answers];
    expect(written.map((all) => all.filter(({ id }) => !audited.has(id)).length)).toEqual(written.map(() => 0));
  });
});

describe('units of the demo', () => {
  test('have instruments that never run backwards, but where one was replaced', () => {
    const byUnit = groupedBy(demo.rows.unitReading, ({ unitId }) => unitId);
    let replaced = 0;
    for (const readings of byUnit.values()) {
      const inOrder = readings.toSorted((a, b) => a.readOn.localeCompare(b.readOn) || (a.createdAt?.getTime() ?? 0) - (b.createdAt?.getTime() ?? 0));
      inOrder.forEach((reading, i) => {
        const before = inOrder[i - 1];
        if (!before) return;
        if (reading.odometerReplaced) replaced += 1;
        else expect(reading.odometerM ?? 0, reading.unitId).toBeGreaterThanOrEqual(before.odometerM ?? 0);
        expect(reading.engineS ?? 0).toBeGreaterThanOrEqual(before.engineS ?? 0);
      });
    }
    expect(replaced).toBe(3);
  });

  test('carry one compressor at a time, from one day to the next one’s', () => {
    for (const fits of groupedBy(demo.rows.fit, ({ unitId }) => unitId).values()) {
      const inOrder = fits.toSorted((a, b) => a.installedOn.localeCompare(b.installedOn));
      inOrder.forEach((fit, i) => {
        expect(fit.removedOn ?? null).toBe(inOrder[i + 1]?.installedOn ?? null);
        expect(fit.whyOut === null).toBe(i === inOrder.length - 1);
      });
    }
  });
});

describe('healthy baselines of the demo', () => {
  test('leave units with sets of their own, with their model’s and with none', () => {
    const setOf = (set: Row<'baselineSet'>) => {
      const figures = demo.rows.baselineFigure.filter(({ setId }) => setId === set.id).map(({ figure, valueSi, errorSi }) => [figure, { si: valueSi, errorSi }]);
      return { ...set, figures: Object.fromEntries(figures) as BaselineSet['figures'] };
    };
    const sets = demo.rows.baselineSet.map(setOf);
    const from = demo.rows.fit.filter(({ removedOn }) => !removedOn).map(({ unitId, modelId, installedOn }) => {
      const own = sets.filter((set) => set.unitId === unitId);
      const pooled = pool(sets.filter((set) => set.modelId === modelId));
      return baselineFor({ own, since: installedOn, pooled })['build-up-time']?.from ?? 'none';
    });
    for (const kind of ['own', 'model', 'none']) expect(from.filter((one) => one === kind).length, kind).toBeGreaterThanOrEqual(5);
  });

  test('are measured while no case is open', () => {
    for (const { unitId, createdAt } of demo.rows.baselineSet) {
      const open = demo.rows.cases.filter((one) => one.unitId === unitId && createdAt && one.openedAt <= createdAt && (!one.closedAt || one.closedAt > createdAt));
      expect(open).toEqual([]);
    }
  });
});

describe('cases of the demo', () => {
  test('keep runs that come out the same to the last bit', () => {
    const compiled = compileRulebook(defaultRulebook);
    for (const { inputs, result } of demo.rows.run.filter((_, i) => i % 20 === 0)) {
      const again = rank(compiled, inputs.findings, { facts: inputs.recordFacts });
      expect(again.causes.map(({ causeId, p, scoreNats }) => ({ causeId, p, scoreNats }))).toEqual(result.causes);
    }
  });

  test('hold answers of every kind', () => {
    const asked = demo.rows.finding.filter(({ source }) => source === 'asked');
    expect(new Set(asked.map(({ kind }) => kind))).toEqual(new Set(['state', 'measured', 'cannot-tell', 'skip', 'undo']));
    expect(new Set(asked.map(({ askedBecause }) => askedBecause))).toEqual(new Set(['always', 'suggested', 'choice', 'panel', 'random']));
    expect(asked.some(({ late }) => late)).toBe(true);
    expect(asked.some(({ reliability }) => reliability < 1)).toBe(true);
    expect(new Set(demo.rows.call.map(({ proof }) => proof))).toEqual(new Set(['none', 'seen', 'isolated', 'held-with-others']));
    const leaders = new Map(demo.rows.run.map((run) => [run.id, run.result.causes[0]?.causeId]));
    for (const call of demo.rows.call) {
      if (leaders.get(call.runId ?? '') !== call.mainCause) expect(call.whyNotLeading).toBeTruthy();
      if (call.mainCause === 'something-else') expect(call.unlistedCause).toBeTruthy();
    }
  });

  test('have two causes in about 8 of a hundred, and an unlisted one in about 5', () => {
    const all = [...demo.truths.values()];
    expect(share(all.filter((causes) => causes.length > 1).length, all.length)).toBeCloseTo(0.08, 1);
    expect(share(all.filter(([cause]) => cause && 'unlisted' in cause).length, all.length)).toBeGreaterThan(0.025);
    expect(share(all.filter(([cause]) => cause && 'unlisted' in cause).length, all.length)).toBeLessThan(0.09);
  });

  test('are ranked well, and not too well', () => {
    const runs = lastRuns();
    const called = demo.rows.cases.filter(({ status }) => status !== 'open');
    const ranked = called.map(({ id }) => ({ truth: trueIds(id), causes: runs.get(id)?.result.causes.map(({ causeId }) => causeId) ?? [] }));
    const inFirst = (n: number) => share(ranked.filter(({ truth, causes }) => causes.slice(0, n).some((id) => truth.includes(id))).length, ranked.length);
    expect(inFirst(1)).toBeGreaterThan(0.35);
    expect(inFirst(1)).toBeLessThan(0.8);
    expect(inFirst(3)).toBeGreaterThan(0.55);
  });
});

describe('what was planted', () => {
  const unitsAt = (siteId: string) => new Set(demo.rows.unit.filter((unit) => unit.siteId === siteId).map(({ id }) => id));
  const casesOf = (causeId: string) => demo.rows.cases.filter(({ id }) => trueIds(id).includes(causeId));
  const keeps = (fits: readonly Row<'fit'>[]) => share(fits.filter(({ dischargeLine }) => dischargeLine === 'kept').length, fits.filter(({ dischargeLine }) => dischargeLine).length);

  test('one site keeps old discharge lines, and has more cases of carboned ones', () => {
    const there = unitsAt(SITES.saltmarsh.id);
    const fitsThere = demo.rows.fit.filter(({ unitId }) => there.has(unitId));
    const fitsElsewhere = demo.rows.fit.filter(({ unitId }) => !there.has(unitId));
    expect(keeps(fitsThere)).toBeGreaterThan(0.6);
    expect(keeps(fitsElsewhere)).toBeLessThan(0.4);
    const carboned = casesOf('discharge-line-carboned');
    const casesThere = carboned.filter(({ unitId }) => there.has(unitId)).length;
    const perUnit = (cases: number, units: number) => cases / units;
    expect(perUnit(casesThere, there.size)).toBeGreaterThan(1.4 * perUnit(carboned.length - casesThere, demo.rows.unit.length - there.size));
  });

  test('the model with the small drain hole is choked by heavy beads', () => {
    const small = demo.rows.compressorModel.find(({ name }) => name === SMALL_HOLE);
    expect(demo.rows.compressorModel.filter(({ drainOpening }) => drainOpening === 'small-hole')).toEqual([small]);
    const choked = new Set(casesOf('drain-choked-by-sealant').map(({ fitId }) => fitId));
    const beads = demo.rows.fit.filter(({ sealant }) => sealant === 'heavy-bead');
    const rate = (fits: readonly Row<'fit'>[]) => share(fits.filter(({ id }) => choked.has(id)).length, fits.length);
    expect(rate(beads.filter(({ modelId }) => modelId === small?.id))).toBeGreaterThan(0.35);
    expect(rate(beads.filter(({ modelId }) => modelId !== small?.id))).toBeLessThan(0.25);
  });

  test('rings don’t seat where nobody ran the compressor in', () => {
    const unseated = new Set(casesOf('rings-not-seated').map(({ fitId }) => fitId));
    const rate = (ranIn: string) => {
      const fits = demo.rows.fit.filter(({ breakInRun }) => breakInRun === ranIn);
      return share(fits.filter(({ id }) => unseated.has(id)).length, fits.length);
    };
    expect(rate('no')).toBeGreaterThan(2 * rate('yes'));
  });

  test('worn rings come late in a compressor’s life', () => {
    const milesOf = (cases: readonly Row<'cases'>[]) => {
      const runs = lastRuns();
      const miles = cases.flatMap(({ id }) => runs.get(id)?.inputs.recordFacts.milesSinceFit ?? []).map(Number);
      return miles.toSorted((a, b) => a - b)[Math.floor(miles.length / 2)] ?? 0;
    };
    expect(milesOf(casesOf('rings-worn'))).toBeGreaterThan(1.4 * milesOf(demo.rows.cases));
  });

  test('some units have far more cases than others', () => {
    const counts = [...groupedBy(demo.rows.cases, ({ unitId }) => unitId).values()].map(({ length }) => length).sort((a, b) => b - a);
    expect(counts[0]).toBeGreaterThanOrEqual(9);
    expect(demo.rows.unit.length - counts.length).toBeGreaterThan(0);
  });
});
