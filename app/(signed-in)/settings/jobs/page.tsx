import type { Metadata } from 'next';
import { RetryJobButton } from '@/components/settings/RetryJobButton';
import { Breakable } from '@/components/ui/Breakable';
import { DataTable } from '@/components/ui/DataTable';
import { EmptyState } from '@/components/ui/EmptyState';
import { FilterBar } from '@/components/ui/FilterBar';
import { PageHeader } from '@/components/ui/PageHeader';
import { Pager } from '@/components/ui/Pager';
import { SelectField } from '@/components/ui/SelectField';
import { Tag } from '@/components/ui/Tag';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { JOB_STATES, listJobsInput, SEEN_JOB_NAMES, SEEN_JOBS, type JobState } from '@/lib/schemas/job';
import { firstOfEach, listHref } from '@/lib/schemas/list';
import { listJobs } from '@/lib/services/job/list';
import type { SeenJobRow } from '@/lib/services/job/seen';
import { tryAgain } from './actions';

export const metadata: Metadata = { title: 'Jobs' };

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const HERE = '/settings/jobs';
const STATE_WORDS: Record<JobState, string> = { waiting: 'Waiting', running: 'Running', failed: 'Failed', done: 'Done' };
const MAIL_WORDS = { waiting: 'not sent yet', sent: 'sent', 'given-up': 'given up' } as const;

const instant = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'medium', timeZone: 'UTC' });
const Instant = ({ at }: { at: string }) => <time dateTime={at} className="figure whitespace-nowrap">{instant.format(new Date(at))}</time>;

export default async function JobsPage({ searchParams }: Props) {
  const ctx = await pageContext(PERMITTED['job.see']);
  const asked = firstOfEach(await searchParams);
  const { kind, state } = listJobsInput.parse(asked);
  const { rows, total, page, pageCount } = await orNotFound(listJobs({ ctx, input: asked }));
  const isFiltered = kind !== undefined || state !== undefined;
  return (
    <>
      <PageHeader title="Jobs" lead="What Carryover does by itself for your organisation, and the nightly work. Jobs that failed stay here for a month, those that were done for a day. Times are universal time." />
      <div className="grid gap-6">
        <FilterBar action={HERE} label="Filter jobs" resetHref={isFiltered ? HERE : undefined}>
          <SelectField label="Kind" name="kind" placeholder="Any kind" options={SEEN_JOB_NAMES.map((name) => ({ value: name, label: SEEN_JOBS[name].name }))} defaultValue={kind ?? ''} />
          <SelectField label="State" name="state" placeholder="Any state" options={JOB_STATES.map((one) => ({ value: one, label: STATE_WORDS[one] }))} defaultValue={state ?? ''} />
        </FilterBar>
        <DataTable
          caption="Jobs"
          captionHidden
          rows={rows}
          rowKey={({ id }) => id}
          empty={isFiltered ? <EmptyState title="No job matches">Clear the filter to see all.</EmptyState> : <EmptyState title="No jobs">Mail that is sent and pictures that are made small stand here.</EmptyState>}
          columns={[
            { key: 'name', header: 'Job', rowHeader: true, cell: (job) => <What job={job} /> },
            { key: 'state', header: 'State', cell: ({ state: now }) => <Tag tone={now === 'failed' ? 'danger' : now === 'running' ? 'strong' : 'plain'}>{STATE_WORDS[now]}</Tag> },
            { key: 'made', header: 'Since', cell: ({ createdAt }) => <Instant at={createdAt} /> },
            { key: 'when', header: 'Then', cell: (job) => <Then job={job} /> },
            { key: 'attempts', header: 'Tries', numeric: true, cell: ({ attempts }) => attempts },
            { key: 'error', header: 'What went wrong', cell: ({ error }) => error && <Breakable>{error}</Breakable> },
            {
              key: 'do',
              header: <span className="sr-only">What to do</span>,
              cell: (job) => job.canRetry && may(ctx.roles, 'job.retry') && <RetryJobButton jobId={job.id} what={job.mail ? `${job.name}, ${job.mail.subject}` : job.name} action={tryAgain} />,
            },
          ]}
        />
        <Pager label="Pages of jobs" page={page} pageCount={pageCount} total={total} hrefFor={(to) => listHref(HERE, { kind, state }, { page: to })} />
      </div>
    </>
  );
}

function What({ job: { name, mail } }: { job: SeenJobRow }) {
  if (!mail) return name;
  return (
    <>
      {name}: {mail.subject}
      <span className="block font-normal text-ink-soft">
        to {mail.to === null ? 'an address that was forgotten' : <Breakable>{mail.to}</Breakable>}, {MAIL_WORDS[mail.state]}
      </span>
    </>
  );
}

/** The instant that tells most about where it stands. */
function Then({ job: { state, attempts, startedAt, finishedAt, nextTryAt } }: { job: SeenJobRow }) {
  if (state === 'waiting') return attempts > 0 && nextTryAt ? <>tried again <Instant at={nextTryAt} /></> : 'its turn comes next';
  if (state === 'running') return startedAt && <>begun <Instant at={startedAt} /></>;
  return finishedAt && <>{state === 'done' ? 'done' : 'given up'} <Instant at={finishedAt} /></>;
}
