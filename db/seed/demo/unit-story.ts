import { NORMAL_CARRYOVER, SOMETHING_ELSE } from '@/lib/diagnose';
import { measureBaselines } from './baseline-sets';
import { DAYS_OF_RECORD } from './calendar';
import type { World } from './world';
import { idOf, tellCase } from './case-story';
import { ratesOn, type Condition } from './hazards';
import { Mileage } from './mileage';
import { AS_BUILT, earlyFates, practiceAt, type Fate } from './practice';
import { repair } from './repair';
import type { Random } from './random';
import type { Shop } from './technician';
import type { TrueCause } from './truth';
import { UnitRecord, type Fitted } from './unit-record';
import { UNLISTED_KEYS } from './unlisted';
import type { Vehicle } from './vehicles';

/** Share of cases with two causes at once. */
export const TWO_CAUSES_SHARE = 0.08;
/** Share of cases that could have two: not those that come back, nor those with nothing to repair or nothing listed. */
const MAY_HAVE_TWO = 0.6;
/** Compressors changed with no case at all, a year: engine overhauls, mostly. */
const CHANGED_WITHOUT_A_CASE = 0.05;
const COMES_BACK = 0.75;
const COMES_BACK_AFTER_DAYS = 32;
const OTHER_MODEL = 0.12;
/** Wear and seasons move slowly; a new compressor changes the rates at once. */
const RATES_HOLD_DAYS = 7;

interface Pending {
  day: number;
  causeIds: string[];
  /** Complaints of the case that left it. */
  again: string[] | null;
}

/** Lives one unit through the three years: miles, wear, compressors, cases and what they came to. */
export class UnitStory {
  private readonly mileage: Mileage;
  private readonly record: UnitRecord;
  private fitted: Fitted;
  private lineNewAtMiles = 0;
  private cartridgeDay: number;
  private cartridgeLasts: number;
  private rates: Float64Array = new Float64Array();
  private ratesUntil = 0;
  private pending: Pending[] = [];
  private busyUntil = -1;
  private cases = 0;

  constructor(
    private readonly world: World,
    private readonly shop: Shop,
    private readonly vehicle: Vehicle,
    private readonly random: Random,
  ) {
    this.mileage = new Mileage(random.fork('mileage'), vehicle);
    this.cartridgeDay = Math.max(vehicle.builtDay, -random.whole(20, 900));
    this.cartridgeLasts = random.whole(420, 1250);
    this.record = new UnitRecord(world, vehicle, this.mileage, random.fork('record'), this.cartridgeDay > vehicle.builtDay ? this.cartridgeDay : null);
    this.fitted = this.firstFit();
  }

  tell(): void {
    const { vehicle, random, record } = this;
    for (let day = vehicle.firstDay; day < DAYS_OF_RECORD; day += 1) {
      record.dayPasses(day);
      if (day - this.cartridgeDay >= this.cartridgeLasts) this.changeCartridge(day);
      if (day <= this.busyUntil) continue;
      const trouble = this.troubleOn(day);
      if (trouble) this.openCase(day, trouble.causes, trouble.again);
      else if (random.chance(CHANGED_WITHOUT_A_CASE / 365)) this.fitAnother(day, 'precaution');
    }
    record.finish();
    measureBaselines(this.world, vehicle, record.compressors, random.fork('baselines'));
  }

  /** What was on it when the record begins: what it was built with, or another that came on since. */
  private firstFit(): Fitted {
    const { vehicle, random, record } = this;
    const miles = this.mileage.milesAt(vehicle.firstDay);
    const day = vehicle.firstDay - random.whole(40, 700);
    if (miles < 250_000 || day < vehicle.builtDay + 300 || random.chance(0.35)) return record.fit(vehicle.builtDay, this.model(0), AS_BUILT, random);
    const practice = practiceAt(vehicle.site, random);
    if (practice.dischargeLine === 'changed') this.lineNewAtMiles = this.mileage.milesAt(day);
    return record.fit(day, this.model(OTHER_MODEL), practice, random);
  }

  private model(otherChance: number): string {
    const [own = '', ...others] = this.vehicle.models;
    return others.length > 0 && this.random.chance(otherChance) ? this.random.pick(others) : own;
  }

  private condition(day: number): Condition {
    const { vehicle, fitted, mileage } = this;
    const since = (at: number) => Math.max(mileage.milesAt(day) - mileage.milesAt(at), 40 * (mileage.hoursAt(day) - mileage.hoursAt(at)));
    return {
      vehicle,
      model: fitted.model,
      practice: fitted.practice,
      miles: since(fitted.day),
      lineMiles: mileage.milesAt(day) - this.lineNewAtMiles,
      cartridgeYears: (day - this.cartridgeDay) / 365,
      month: this.world.calendar.month(day),
    };
  }

  private troubleOn(day: number): { causes: TrueCause[]; again: string[] | null } | undefined {
    const { random } = this;
    const { causes } = this.world.compiled.rulebook;
    const due = this.pending.find((one) => one.day <= day);
    if (due) {
      this.pending = this.pending.filter((one) => one !== due);
      return { causes: due.causeIds.map((listed) => ({ listed })), again: due.again };
    }
    if (day >= this.ratesUntil) {
      this.rates = ratesOn(day, this.condition(day), causes);
      this.ratesUntil = day + RATES_HOLD_DAYS;
    }
    const { rates } = this;
    if (!random.chance(rates.reduce((sum, rate) => sum + rate, 0))) return undefined;
    const first = causes[random.index(rates)]?.id ?? SOMETHING_ELSE;
    if (first === SOMETHING_ELSE) return { causes: [{ unlisted: random.pick(UNLISTED_KEYS) }], again: null };
    return { causes: [{ listed: first }, ...this.secondCause(first, rates)], again: null };
  }

  private secondCause(first: string, rates: Float64Array): TrueCause[] {
    if (first === NORMAL_CARRYOVER || !this.random.chance(TWO_CAUSES_SHARE / MAY_HAVE_TWO)) return [];
    const { causes } = this.world.compiled.rulebook;
    const never = new Set([first, NORMAL_CARRYOVER, SOMETHING_ELSE]);
    const second = causes[this.random.index(rates.map((rate, c) => (never.has(causes[c]?.id ?? '') ? 0 : rate)))];
    return second ? [{ listed: second.id }] : [];
  }

  private openCase(day: number, causes: TrueCause[], again: string[] | null): void {
    const { record, fitted, mileage, vehicle } = this;
    this.cases += 1;
    const random = this.random.fork(`case ${this.cases}`);
    const isRead = random.chance(0.96);
    const facts = record.factsOn(day, isRead);
    const outcome = tellCase(
      this.world,
      this.shop,
      { day, causes, vehicle, mileage: isRead ? mileage : null, fitId: fitted.id, recordFacts: facts.recorded, trueFacts: facts.complete, outsideK: this.outsideK(day, random), again },
      random,
    );
    if (!outcome) return;
    const { called, complaints } = outcome;
    if (!called) {
      this.busyUntil = DAYS_OF_RECORD;
      return;
    }
    this.busyUntil = called.day;
    const trueIds = causes.flatMap((cause) => ('listed' in cause ? [idOf(cause)] : []));
    const { replaced, whyOut, left } = repair(called.named, trueIds, random);
    if (called.main === 'discharge-line-carboned') this.lineNewAtMiles = mileage.milesAt(called.day);
    if (called.main === 'dryer-overdue') this.changeCartridge(called.day);
    const repairedOn = called.day + random.whole(0, 4);
    if (replaced && repairedOn < DAYS_OF_RECORD) {
      this.busyUntil = repairedOn;
      this.fitAnother(repairedOn, whyOut);
    }
    if (left.length > 0 && random.chance(COMES_BACK)) {
      this.pending.push({ day: repairedOn + 3 + Math.round(random.waiting(COMES_BACK_AFTER_DAYS)), causeIds: left, again: random.chance(0.8) ? complaints : null });
    }
  }

  private fitAnother(day: number, whyOut: 'failed-seen' | 'not-the-cause' | 'precaution' | 'unknown'): void {
    const { vehicle, random } = this;
    const practice = practiceAt(vehicle.site, random);
    const lineMiles = this.mileage.milesAt(day) - this.lineNewAtMiles;
    this.record.takeOut(this.fitted, day, whyOut);
    this.fitted = this.record.fit(day, this.model(OTHER_MODEL), practice, random);
    if (practice.dischargeLine === 'changed') this.lineNewAtMiles = this.mileage.milesAt(day);
    if (practice.dryerCartridge === 'changed') this.cartridgeDay = day;
    // Troubles of the fit before went with it, unless they were left behind by a repair.
    this.pending = this.pending.filter((one) => one.again !== null);
    this.ratesUntil = day;
    const fates: Fate[] = earlyFates(practice, this.fitted.model, lineMiles, random);
    for (const { causeId, after } of fates) this.pending.push({ day: day + 1 + after, causeIds: [causeId], again: null });
    this.pending.sort((a, b) => a.day - b.day);
  }

  private changeCartridge(day: number): void {
    this.cartridgeDay = day;
    this.cartridgeLasts = this.random.whole(420, 1250);
    this.record.cartridgeChanged(day);
  }

  /** Of the season where the site is, with the day's own whim. */
  private outsideK(day: number, random: Random): number {
    const { january, july } = this.vehicle.site.climate;
    const season = Math.cos((2 * Math.PI * (this.world.calendar.month(day) - 0.5)) / 12);
    return Math.round(273.15 + (january + july) / 2 + ((january - july) / 2) * season + 5 * random.normal());
  }
}

