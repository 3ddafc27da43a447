import type { FindingView, RulebookView } from '@/lib/schemas/case-view';

interface Event {
  kind: string;
  at: Date;
}

const WORDS: Record<string, string> = { opened: 'Case opened', called: 'Cause called', reopened: 'Case reopened', closed: 'Case closed', assigned: 'Assigned' };

/** The instants at which a case changed, oldest first: any of them can be shown as it was. */
export function momentsOf(rulebook: RulebookView, findings: readonly FindingView[], events: readonly Event[]) {
  const answered = findings
    .filter((finding) => finding.source !== 'record')
    .map((finding) => ({ at: finding.receivedAt, what: `${rulebook.checks[finding.checkId]?.name ?? finding.checkId}: ${finding.answer}` }));
  const happened = events.map((event) => ({ at: event.at.toISOString(), what: WORDS[event.kind] ?? event.kind }));
  return [...answered, ...happened].sort((a, b) => (a.at < b.at ? -1 : a.at > b.at ? 1 : 0));
}
