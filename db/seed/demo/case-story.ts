import { SOMETHING_ELSE, type RecordFacts } from '@/lib/diagnose';
import { complaintIds } from '@/lib/services/case/complaints';
import { DAYS_OF_RECORD, WorkClock } from './calendar';
import { CaseDesk } from './case-desk';
import type { Mileage } from './mileage';
import { DEMO_ENGINEER, DEMO_MANAGER, techniciansAt, type DemoPerson } from './organisation';
import type { Random } from './random';
import { Scene } from './scene';
import { Technician, type Pace, type Shop } from './technician';
import type { TrueCause } from './truth';
import { UNLISTED } from './unlisted';
import type { Vehicle } from './vehicles';
import { CLOSED, COMPLAINT_WORDS, REOPENED, WHY_NOT_LEADING, WHY_NOT_LEADING_GUESS } from './words';
import type { World } from './world';

export interface Trouble {
  day: number;
  /** One, or two at once. */
  causes: readonly TrueCause[];
  vehicle: Vehicle;
  /** Null: nobody read the instruments. */
  mileage: Mileage | null;
  fitId: string;
  recordFacts: RecordFacts;
  /** What the record would hold were it complete. */
  trueFacts: RecordFacts;
  outsideK: number;
  /** Complaints of the case that this is a comeback of. */
  again: readonly string[] | null;
}

export interface Outcome {
  complaints: string[];
  /** Null while the case is open. */
  called: { main: string; named: string[]; right: boolean; day: number } | null;
}

/** Share of wrong calls that are found out while the case is still at hand. */
const FOUND_OUT = 0.22;
const JUST_IN_DAYS = 28;
const LATELY_DAYS = 56;

export const idOf = (cause: TrueCause) => ('listed' in cause ? cause.listed : SOMETHING_ELSE);

/** Tells one case from the complaint to where it stands today; undefined when the day is past before it is opened. */
export function tellCase(world: World, shop: Shop, trouble: Trouble, random: Random): Outcome | undefined {
  const { day, vehicle, causes } = trouble;
  const clock = new WorkClock(world.calendar, vehicle.site.timeZone, day, random.between(7 * 60 + 5, 14 * 60 + 30));
  const [self, colleague] = random.shuffled(techniciansAt(vehicle.site.key, day));
  if (clock.isOver || !self) return undefined;
  const scene = new Scene(world.compiled, shop.truth, random.fork('scene'), causes, trouble.trueFacts, trouble.outsideK);
  if (trouble.again) scene.reportAgain(trouble.again);
  const complaints = scene.complaints(complaintIds(world.compiled));
  const opener = random.chance(0.08) ? DEMO_MANAGER : self;
  const desk = new CaseDesk(world, clock, random.fork('desk'), {
    vehicle,
    fitId: trouble.fitId,
    recordFacts: trouble.recordFacts,
    complaints,
    complaintWords: random.chance(0.5) ? random.pick(COMPLAINT_WORDS[complaints[0] ?? ''] ?? ['See the driver.']) : null,
    mileage: trouble.mileage,
    by: opener,
  });
  clock.advance(random.between(2, 25));
  if (opener !== self && !clock.isOver) desk.assign(self, opener);
  const technician = new Technician(shop, desk, scene, random.fork('technician'), self, colleague);

  const staysOpen = random.chance(chanceToBeOpen(DAYS_OF_RECORD - day));
  technician.diagnose(staysOpen ? unfinished(day, random) : finished(day, random));
  const outcome: Outcome = { complaints, called: null };
  if (!staysOpen && !clock.isOver) outcome.called = conclude({ desk, technician, causes, self, random });
  desk.finish();
  world.truths.set(desk.id, causes);
  return outcome;
}

const chanceToBeOpen = (age: number) => (age <= JUST_IN_DAYS ? 0.92 : age <= LATELY_DAYS ? 0.3 : 0.006);

/** Cases that are still open stand anywhere between the complaint and being ready to call. */
const unfinished = (day: number, random: Random): Pace => ({
  answers: random.pick([0, 1, 3, 5, 7, 9, 12]),
  sureAt: 0.97,
  restsUntilDay: random.chance(0.6) ? random.whole(day + 1, DAYS_OF_RECORD - 1) : null,
});

const finished = (day: number, random: Random): Pace => ({
  answers: random.whole(5, 14),
  sureAt: random.between(0.7, 0.95),
  restsUntilDay: random.chance(0.2) ? day + random.whole(1, 5) : null,
});

interface Working {
  desk: CaseDesk;
  technician: Technician;
  causes: readonly TrueCause[];
  self: DemoPerson;
  random: Random;
}

/** Looks, names a cause, and what the weeks after make of it: closed, still watched, or found out and named anew. */
function conclude(working: Working, isSecondTry = false): Outcome['called'] {
  const { desk, causes, self, random } = working;
  const { clock } = desk;
  const seen = look(working, isSecondTry);
  clock.advance(random.between(3, 90));
  if (clock.isOver) return null;
  const main = seen ?? judge(working, isSecondTry);
  const right = causes.some((cause) => idOf(cause) === main);
  const watchedDays = random.whole(14, 45);
  const isWatched = clock.day + watchedDays < DAYS_OF_RECORD;
  const backAfter = !right && !isSecondTry && random.chance(FOUND_OUT) ? random.whole(4, 24) : Infinity;
  const isFoundOut = clock.day + backAfter < DAYS_OF_RECORD - 1;
  const contributing = others(working, main);
  desk.call(
    {
      mainCause: main,
      contributingCauses: contributing,
      ...wordsFor(working, main, seen !== null),
      sureness: surenessOf(desk, main, seen !== null),
      proof: seen === null ? proofLater(right, isWatched && !isFoundOut, random) : 'seen',
    },
    random.chance(0.15) ? DEMO_ENGINEER : self,
  );
  const called = { main, named: [main, ...contributing], right, day: clock.day };
  if (isFoundOut) return takeBack(working, backAfter);
  if (isWatched && !random.chance(0.03)) {
    clock.goTo(clock.day + watchedDays, 8 * 60 + random.whole(0, 400));
    if (!clock.isOver) desk.close(random.pick(CLOSED).replace('{days}', String(watchedDays)), random.chance(0.3) ? DEMO_MANAGER : self);
  }
  return called;
}

/** The trouble is back while the case is still at hand: it is reopened, and goes on from there. */
function takeBack(working: Working, days: number): Outcome['called'] {
  const { desk, technician, self, random } = working;
  desk.clock.goTo(desk.clock.day + days, 7 * 60 + random.whole(10, 300));
  if (desk.clock.isOver) return null;
  desk.reopen(random.pick(REOPENED).replace('{days}', String(days)), self);
  desk.clock.advance(random.between(4, 30));
  technician.diagnose({ answers: random.whole(2, 6), sureAt: 0.98, restsUntilDay: null });
  return conclude(working, true);
}

/** Opens what would show the leading causes, one after the other; the cause that was seen, if one was. */
function look({ desk, technician, causes, random }: Working, again: boolean): string | null {
  // Whoever sees it come back looks where it really is more often than not.
  const suspects = desk.ranking.causes.slice(0, 3).map(({ causeId }) => causeId);
  const [cause] = causes;
  if (again && cause && random.chance(0.7)) suspects.unshift(idOf(cause));
  for (const suspect of suspects) {
    if (!random.chance(again ? 0.85 : 0.65)) return null;
    if (suspect !== SOMETHING_ELSE && technician.lookFor(suspect)) return suspect;
  }
  return null;
}

/** What somebody names who has not seen it: mostly what leads. */
function judge({ desk, causes, random }: Working, again: boolean): string {
  const ranked = desk.ranking.causes.map(({ causeId }) => causeId);
  const [cause] = causes;
  if (cause && 'unlisted' in cause && random.chance(again ? 0.9 : 0.55)) return SOMETHING_ELSE;
  const truth = cause ? idOf(cause) : '';
  if (truth !== SOMETHING_ELSE && ranked.slice(0, 6).includes(truth) && random.chance(0.55)) return truth;
  return ranked.find((id) => id !== SOMETHING_ELSE) ?? SOMETHING_ELSE;
}

function others({ desk, causes, random }: Working, main: string): string[] {
  const second = causes.map(idOf).find((id) => id !== main && id !== SOMETHING_ELSE);
  if (causes.length > 1 && second && random.chance(0.6)) return [second];
  const runnerUp = desk.ranking.causes.find(({ causeId }) => causeId !== main && causeId !== SOMETHING_ELSE);
  return runnerUp && runnerUp.p > 0.1 && random.chance(0.07) ? [runnerUp.causeId] : [];
}

function wordsFor({ desk, causes, random }: Working, main: string, wasSeen: boolean) {
  const leads = desk.ranking.causes[0]?.causeId === main;
  const unlisted = causes.map((cause) => ('unlisted' in cause ? UNLISTED[cause.unlisted] : undefined)).find(Boolean);
  return {
    whyNotLeading: leads ? null : random.pick(wasSeen || main === SOMETHING_ELSE ? WHY_NOT_LEADING : WHY_NOT_LEADING_GUESS),
    unlistedCause: main === SOMETHING_ELSE ? (unlisted ?? 'Not found out; it stopped by itself.') : null,
  };
}

function surenessOf(desk: CaseDesk, main: string, wasSeen: boolean): 'sure' | 'fairly-sure' | 'guess' {
  const p = desk.ranking.causes.find(({ causeId }) => causeId === main)?.p ?? 0;
  if (wasSeen || p > 0.8) return 'sure';
  return p > 0.35 ? 'fairly-sure' : 'guess';
}

/** What the weeks after prove of a cause that nobody saw; until they are over, nothing. */
function proofLater(right: boolean, isOver: boolean, random: Random): 'none' | 'isolated' | 'held-with-others' {
  if (!isOver) return 'none';
  return random.weighted(right ? { isolated: 25, 'held-with-others': 35, none: 40 } : { isolated: 0, 'held-with-others': 22, none: 78 });
}
