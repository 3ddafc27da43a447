import type { CompiledCheck, CompiledRulebook } from '@/lib/diagnose';
import { minutesToGo } from '@/lib/diagnose/set-up';
import type { Answer, AskedBecause, CaseDesk } from './case-desk';
import type { DemoPerson } from './organisation';
import type { Policy } from './policy';
import { randomFrom, type Random } from './random';
import type { Scene } from './scene';
import type { Truth } from './truth';
import { typedValue, valueWithin } from './values';
import { NOTES } from './words';

/** Shares of answers that are simply wrong, and of those given as "think so". */
export const WRONG_ANSWERS = 0.03;
const THINKS_SO = 0.12;
const WRONG_WHEN_UNSURE = 0.2;

/** How often people do what the product suggests rather than what they always do, or anything else. */
const TAKES_SUGGESTION = 0.72;
const GOES_BY_HABIT = 0.93;
const MOST_SUGGESTIONS = 8;

/** Everybody's habits begin with some of these. */
const HABITS = [
  'oil-at-purge', 'oil-amount', 'onset', 'build-up-time', 'leak-down-released', 'intake-filter-state', 'engine-oil-level', 'audible-leak',
  'intake-hose-state', 'discharge-line-look', 'noise', 'cut-out-pressure', 'flange-leak', 'oil-in-wet-tank', 'head-temperature', 'oil-look',
  'cycles-parked', 'coolant-level-falling', 'air-delivery', 'purge-at-cut-out', 'oil-service-age', 'work-oil-service',
];

export interface Shop {
  compiled: CompiledRulebook;
  truth: Truth;
  policy: Policy;
}

export interface Pace {
  /** So many answers at most, and sure enough to stop before. */
  answers: number;
  sureAt: number;
  /** Days that the case rests somewhere in between, waiting for a part or a bay. */
  restsUntilDay: number | null;
}

/** Works on a case: asks, answers (not always rightly), stops when sure enough or out of patience. */
export class Technician {
  constructor(
    private readonly shop: Shop,
    private readonly desk: CaseDesk,
    private readonly scene: Scene,
    private readonly random: Random,
    private readonly self: DemoPerson,
    /** Lends a hand now and then. */
    private readonly colleague: DemoPerson | undefined,
  ) {}

  diagnose({ answers, sureAt, restsUntilDay }: Pace): void {
    const { desk, random } = this;
    const restsAfter = restsUntilDay === null ? Infinity : random.whole(0, Math.max(0, answers - 1));
    if (random.chance(0.05)) desk.goOffline(random.whole(15, 50));
    let given = 0;
    while (given < answers) {
      if (given >= restsAfter && restsUntilDay !== null) desk.clock.goTo(restsUntilDay, 8 * 60 + random.whole(0, 300));
      const [leader] = desk.ranking.causes;
      if (given >= 4 && (leader?.p ?? 0) >= sureAt) return;
      const next = this.choose();
      if (!next || !this.takeTime(next.check)) return;
      given += this.ask(next.check, next.because);
      if (next.because === 'suggested') given += this.askRestOfPanel(next.check);
    }
  }

  /** Opens up what would show a cause most plainly. Returns whether it was seen. */
  lookFor(causeId: string): boolean {
    const { desk, shop } = this;
    const done = desk.dealtWith;
    const spoiled = desk.spoiled;
    const checks = [...shop.compiled.checks.values()].filter((check) => !check.check.fromRecord && !spoiled.has(check.id));
    const telling = shop.truth.mostTelling(causeId, checks);
    const check = telling && shop.compiled.checks.get(telling.checkId);
    if (!telling || !check) return false;
    if (!done.has(check.id)) {
      if (!this.takeTime(check)) return false;
      desk.answer(check, this.answerOf(check, true), this.self, 'choice');
    }
    return this.scene.answer(check) === telling.state;
  }

  private choose(): { check: CompiledCheck; because: AskedBecause } | undefined {
    const { desk, random, shop } = this;
    const closed = new Set([...desk.dealtWith, ...desk.spoiled]);
    const draw = random.unit();
    if (draw >= TAKES_SUGGESTION && draw < GOES_BY_HABIT) {
      const habits = randomFrom(`habits of ${this.self.name}`).shuffled(HABITS);
      const check = habits.map((id) => shop.compiled.checks.get(id)).find((each) => each && !closed.has(each.id));
      if (check) return { check, because: 'choice' };
    }
    const suggested = shop.policy({ ranking: desk.ranking, closed, vehicle: desk.vehicleState });
    if (draw >= GOES_BY_HABIT) {
      const open = suggested.filter(({ check }) => !check.check.setUp.access?.includes('compressor-off'));
      return open.length > 0 ? { check: random.pick(open).check, because: random.chance(0.3) ? 'random' : 'choice' } : undefined;
    }
    // The page shows eight; people rather take what settles something than what is merely quick.
    const [best] = suggested
      .slice(0, MOST_SUGGESTIONS)
      .map((each) => ({ ...each, appeal: each.bits * random.between(0.4, 1) }))
      .sort((a, b) => b.appeal - a.appeal);
    return best && best.bits > 0.015 ? { check: best.check, because: 'suggested' } : undefined;
  }

  /** A panel is one screen: its other checks are answered with the one that was suggested. */
  private askRestOfPanel(check: CompiledCheck): number {
    const { compiled } = this.shop;
    const panel = compiled.rulebook.panels.find(({ checks }) => checks.includes(check.id));
    if (!panel || panel.id === 'complaints') return 0;
    const done = this.desk.dealtWith;
    let given = 0;
    for (const id of panel.checks) {
      const other = compiled.checks.get(id);
      if (!other || done.has(id) || !this.random.chance(0.7)) continue;
      this.desk.clock.advance(this.random.between(0.1, 0.6));
      given += this.ask(other, 'panel');
    }
    return given;
  }

  private ask(check: CompiledCheck, because: AskedBecause): number {
    const { desk, random } = this;
    if (desk.clock.isOver) return 0;
    const by = this.colleague && random.chance(0.12) ? this.colleague : this.self;
    const findingId = desk.answer(check, this.answerOf(check), by, because);
    if (random.chance(0.06)) desk.note(findingId, random.pick(NOTES), by);
    if (random.chance(0.015)) this.takeBack(check, by);
    if (random.chance(0.012) && this.colleague) desk.answerLate(check, this.answerOf(check), this.colleague);
    return 1;
  }

  /** Tapped wrongly: undone, and answered once more. */
  private takeBack(check: CompiledCheck, by: DemoPerson): void {
    this.desk.clock.advance(this.random.between(0.1, 0.5));
    this.desk.answer(check, { kind: 'undo' }, by, 'choice');
    this.desk.clock.advance(this.random.between(0.1, 1));
    if (!this.desk.clock.isOver) this.desk.answer(check, this.answerOf(check), by, 'choice');
  }

  private takeTime({ check }: CompiledCheck): boolean {
    const { desk, random, shop } = this;
    const setUp = minutesToGo(desk.vehicleState, check.setUp, shop.compiled.settings.setUpMinutes);
    desk.clock.advance(Math.max(0.3, (check.minutes + setUp) * random.between(0.7, 1.6)));
    return !desk.clock.isOver;
  }

  private answerOf(check: CompiledCheck, looksClosely = false): Answer {
    const { random, scene } = this;
    if (!looksClosely) {
      if (random.chance(check.check.cannotTell * 0.8)) return { kind: 'cannot-tell' };
      if (random.chance(0.012)) return { kind: 'skip' };
    }
    const sureness = !looksClosely && random.chance(THINKS_SO) ? 'think-so' : 'sure';
    const isWrong = !looksClosely && random.chance(sureness === 'sure' ? WRONG_ANSWERS : WRONG_WHEN_UNSURE);
    const state = isWrong ? random.pick(check.stateIds.filter((id) => id !== scene.answer(check))) : scene.answer(check);
    if (check.check.kind === 'choice') return { kind: 'state', state, sureness };
    const si = isWrong ? valueWithin(check, state, random) : (scene.value(check) ?? valueWithin(check, state, random));
    return { kind: 'measured', ...typedValue(check, si, random), sureness };
  }
}
