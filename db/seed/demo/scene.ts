import { findingsFromRecord, type CompiledCheck, type CompiledRulebook, type RecordFacts } from '@/lib/diagnose';
import type { Random } from './random';
import type { TrueCause, Truth } from './truth';

/**
 * Share of evidence groups that don't show a case's cause at all: findings that tell the same story are right
 * together or wrong together, which is what attenuation is for.
 */
export const STORY_UNTOLD = 0.1;

const NO_AIR = 'complaint-no-air';
const AIR_AFTER_ALL = ['complaint-slow-air', 'complaint-cycling'];

/** What is so in a case, whether anybody looks or not. */
export class Scene {
  private readonly untold = new Map<string, boolean>();
  private readonly asOnRecord: ReadonlyMap<string, string>;
  private readonly drawn = new Map<string, string>();

  constructor(
    private readonly compiled: CompiledRulebook,
    private readonly truth: Truth,
    private readonly random: Random,
    /** One, or two at once. */
    private readonly causes: readonly TrueCause[],
    /** What a complete record of unit and fit would hold. */
    readonly facts: RecordFacts,
    private readonly outsideK: number,
  ) {
    this.asOnRecord = new Map(findingsFromRecord(compiled, facts).map(({ checkId, shares }) => [checkId, shares[0]?.state ?? '']));
  }

  /** The true answer of a check, the same however often somebody looks. */
  answer(check: CompiledCheck): string {
    const known = this.drawn.get(check.id);
    if (known !== undefined) return known;
    const state = this.draw(check);
    this.drawn.set(check.id, state);
    return state;
  }

  /** The true value of a measured check where it is a figure of the record or of the weather. */
  value(check: CompiledCheck): number | undefined {
    if (check.check.quantity === 'temperature') return this.outsideK;
    const fact = check.check.fromRecord && this.facts[check.check.fromRecord.fact];
    return typeof fact === 'number' ? fact : undefined;
  }

  private draw(check: CompiledCheck): string {
    const recorded = this.asOnRecord.get(check.id);
    if (recorded !== undefined) return recorded;
    if (check.check.quantity === 'temperature') return bandOf(check, this.outsideK);
    const answers = this.causes.map((cause) => this.drawFor(check, cause));
    const [first = 0, second] = answers;
    if (second === undefined) return check.stateIds[first] ?? '';
    // Two causes at once: a sign that either makes is there; of other answers one or the other is seen.
    const yes = check.stateIndex.get('yes');
    if (check.stateIds.length === 2 && yes !== undefined) return answers.includes(yes) ? 'yes' : 'no';
    return check.stateIds[this.random.pick([first, second])] ?? '';
  }

  private drawFor(check: CompiledCheck, cause: TrueCause): number {
    const chances = this.truth.chances(check, cause);
    if (this.isUntold(check.group.id)) return this.random.index(check.backgrounds);
    // Sharpened by as much as the untold stories take away, so that over many cases the share is the table's.
    return this.random.index(chances.map((p, v) => Math.max(0, p - STORY_UNTOLD * (check.backgrounds[v] ?? 0))));
  }

  private isUntold(group: string): boolean {
    const known = this.untold.get(group) ?? this.random.chance(STORY_UNTOLD);
    this.untold.set(group, known);
    return known;
  }

  /** The complaints that a driver brings: those that are so, or the likeliest when none is. */
  complaints(ids: readonly string[]): string[] {
    const checks = ids.flatMap((id) => this.compiled.checks.get(id) ?? []);
    const so = checks.filter((check) => this.answer(check) === 'yes').map(({ id }) => id);
    // What builds slowly or never rests does build air.
    if (so.includes(NO_AIR) && so.some((id) => AIR_AFTER_ALL.includes(id))) {
      this.drawn.set(NO_AIR, 'no');
      return so.filter((id) => id !== NO_AIR);
    }
    if (so.length > 0) return so;
    const [cause] = this.causes;
    const likely = (check: CompiledCheck) => (cause ? (this.truth.chances(check, cause)[check.stateIndex.get('yes') ?? 0] ?? 0) : 0);
    const [likeliest] = checks.toSorted((a, b) => likely(b) - likely(a));
    if (!likeliest) return [];
    this.drawn.set(likeliest.id, 'yes');
    return [likeliest.id];
  }

  /** The trouble that was there before is reported again. */
  reportAgain(complaints: readonly string[]): void {
    for (const id of complaints) this.drawn.set(id, 'yes');
  }
}

function bandOf(check: CompiledCheck, value: number): string {
  const band = check.check.states.find(({ low = -Infinity, high = Infinity }) => value >= low && value < high);
  return band?.id ?? '';
}
