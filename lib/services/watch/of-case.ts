import type { Transaction } from '@/db/connect';
import { selectCameBackFrom, selectWatchesUnderWayOfUnit } from '@/db/queries/watch';
import { siteDay } from '@/lib/case/site-day';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { WatchingView } from '@/lib/schemas/case-view';
import { endOf } from '@/lib/watch';
import { dueOfWatch, watchedOf } from './standing';

interface Head {
  id: string;
  unitId: string;
  timeZone: string;
  openedAt: Date;
}

/** What a case has to do with watches: its own under way, others of its unit that it may be the end of, and what it came back from. */
export async function watchingOf(tx: Transaction, { organisationId, head, compiled, now }: { organisationId: string; head: Head; compiled: CompiledRulebook; now: Date }): Promise<WatchingView> {
  const underWay = await selectWatchesUnderWayOfUnit(tx, { organisationId, unitId: head.unitId });
  const own = underWay.find(({ row }) => row.caseId === head.id)?.row;
  const cameBackFrom = await selectCameBackFrom(tx, { organisationId, caseId: head.id });
  return {
    own: own ? await ownView() : null,
    others: cameBackFrom ? [] : underWay.filter(({ row }) => row.caseId !== head.id && row.startedAt <= head.openedAt).map(({ row, caseNumber }) => ({ caseId: row.caseId, number: caseNumber, since: row.startedAt.toISOString() })),
    cameBackFrom,
  };

  async function ownView(): Promise<WatchingView['own']> {
    if (!own) return null;
    const today = siteDay(now, head.timeZone);
    const until = endOf(watchedOf(own, head.timeZone)).on;
    const [next] = (await dueOfWatch(tx, own, { timeZone: head.timeZone, today })).sort((a, b) => (a.dueOn < b.dueOn ? -1 : 1));
    return { until, isOver: today > until, next: next ? { check: compiled.checks.get(next.checkId)?.check.name ?? next.checkId, dueOn: next.dueOn, state: next.state } : null };
  }
}
