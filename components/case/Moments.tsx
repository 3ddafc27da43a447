import { Button, ButtonLink } from '@/components/ui/Button';
import { SelectField } from '@/components/ui/SelectField';
import type { CaseView } from '@/lib/schemas/case-view';
import { timeText } from './words';

/** Shows the case as it was at any instant at which something happened. */
export function Moments({ view, timeZone }: { view: CaseView; timeZone: string }) {
  const { moments, state } = view;
  return (
    <form method="get" action={`/cases/${state.caseId}`} className="flex flex-wrap items-end gap-4">
      <SelectField
        label="Show the case as it was after"
        name="at"
        className="min-w-0 flex-1 basis-72"
        defaultValue={state.at ?? moments.at(-1)?.at}
        options={[...moments].reverse().map(({ at, what }) => ({ value: at, label: `${timeText(at, timeZone)} · ${what}` }))}
      />
      <Button type="submit" variant="quiet">Show</Button>
      {state.at && <ButtonLink variant="quiet" href={`/cases/${state.caseId}`}>Back to now</ButtonLink>}
    </form>
  );
}
