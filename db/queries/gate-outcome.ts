import { sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';

export interface GateOutcomeRow extends Record<string, unknown> {
  /** Of the last passage before the fit; null: it was fitted past the gate. */
  verdict: 'fit' | 'not-yet' | null;
  /** Fits that the calendar lets follow for the whole horizon. */
  of: number;
  cameBack: number;
  /** Of these, the unit left the record before the horizon without having come back. */
  lost: number;
  tooRecent: number;
  /** Of `of`, those with a claim that was paid, in part too. */
  claimPaid: number;
  paidAmount: number;
}

interface Asked {
  organisationId: string;
  /** YYYY-MM-DD */
  today: string;
  horizonDays: number;
  /** Between passage and fit, at most. */
  daysToFit: number;
}

/**
 * Fits since the first gate was made, by what the gate had said of their unit. Came back: a case was opened on the unit in the
 * days after the fit. The same for both groups, whatever was complained of: a fit past the gate often has no case before it
 * whose complaint could be compared.
 */
export async function selectGateOutcome(db: Executor, { organisationId, today, horizonDays, daysToFit }: Asked): Promise<GateOutcomeRow[]> {
  const { rows } = await db.execute<GateOutcomeRow>(sql`
    with begun as (select min(created_at)::date as day from gate where organisation_id = ${organisationId}),
    followed as (
      select f.organisation_id, f.id, f.installed_on, f.installed_on + ${horizonDays}::int <= ${today}::date as is_followed, u.hidden_at,
        (select p.verdict from gate_passage p
          where p.organisation_id = f.organisation_id and p.unit_id = f.unit_id and p.ended_at is not null
            and (p.ended_at at time zone s.time_zone)::date between f.installed_on - ${daysToFit}::int and f.installed_on
          order by p.ended_at desc, p.id desc limit 1) as verdict,
        exists (select 1 from "case" c where c.organisation_id = f.organisation_id and c.unit_id = f.unit_id
          and (c.opened_at at time zone s.time_zone)::date > f.installed_on
          and (c.opened_at at time zone s.time_zone)::date <= f.installed_on + ${horizonDays}::int) as came_back,
        settled.paid, settled.claims > 0 as claim_paid
      from fit f
      join unit u on u.organisation_id = f.organisation_id and u.id = f.unit_id
      join site s on s.organisation_id = u.organisation_id and s.id = u.site_id
      cross join lateral (select count(*) as claims, coalesce(sum(cl.settled_amount), 0) as paid
        from claim cl join "case" c on c.organisation_id = cl.organisation_id and c.id = cl.case_id
        where c.organisation_id = f.organisation_id and c.fit_id = f.id and cl.state in ('paid', 'part-paid')) settled
      where f.organisation_id = ${organisationId} and f.hidden_at is null
        and f.installed_on >= (select day from begun) and f.installed_on <= ${today}::date)
    select verdict,
      count(*) filter (where is_followed)::int as "of",
      count(*) filter (where is_followed and came_back)::int as "cameBack",
      count(*) filter (where is_followed and not came_back and hidden_at::date < installed_on + ${horizonDays}::int)::int as lost,
      count(*) filter (where not is_followed)::int as "tooRecent",
      count(*) filter (where is_followed and claim_paid)::int as "claimPaid",
      coalesce(sum(paid) filter (where is_followed), 0)::double precision as "paidAmount"
    from followed group by verdict order by verdict`);
  return rows;
}
