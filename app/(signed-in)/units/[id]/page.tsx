import type { Metadata } from 'next';
import Link from 'next/link';
import { practiceFacts, spanFacts } from '@/components/fits/fit-facts';
import { ButtonLink } from '@/components/ui/Button';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { Tag } from '@/components/ui/Tag';
import { Baseline } from '@/components/units/Baseline';
import { History } from '@/components/units/History';
import { LiftedHolds, UnitHolds } from '@/components/units/UnitHolds';
import { measureText } from '@/components/units/MeasureField';
import { HideBaselineForm, HideForm, ShowForm, StrikeReadingForm } from '@/components/units/ReasonForms';
import { readingLabel, ReadingTable } from '@/components/units/ReadingTable';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { dayText } from '@/lib/schemas/day-text';
import { OCCASION_WORDS } from '@/lib/baseline/words';
import { UNIT_MEASURES } from '@/lib/schemas/measures';
import { termLabel } from '@/lib/schemas/terms';
import { readBaseline } from '@/lib/services/baseline/read';
import { readUnit, type UnitPage as UnitRecord } from '@/lib/services/unit/read';
import type { UnitPreferences } from '@/lib/units';
import { hideBaseline, hideUnit, liftHold, showUnit, strikeReading } from '../actions';

export const metadata: Metadata = { title: 'Unit' };

export default async function UnitPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['unit.see']);
  const { id } = await params;
  const input = { unitId: id };
  const [record, baseline] = await orNotFound(Promise.all([readUnit({ ctx, input }), readBaseline({ ctx, input })]));
  const { unit, currentFit, fits, cases, readings, today, hidden } = record;
  const { units } = ctx.person;
  const mayEdit = may(ctx.roles, 'unit.edit');
  const mayWork = may(ctx.roles, 'case.work');
  const linksToCases = may(ctx.roles, 'case.see');
  const work = termLabel('vocation', unit.vocation)?.toLowerCase();
  const vehicle = `${termLabel('vehicleKind', unit.vehicleKind)}${work ? `, ${work},` : ''}`;

  return (
    <>
      <PageHeader
        title={`Unit ${unit.fleetNumber}`}
        lead={`${vehicle} at ${unit.siteName}. ${currentFit ? `${currentFit.modelName} on it since ${dayText(currentFit.installedOn)}.` : 'No compressor recorded on it.'}`}
        breadcrumbs={[{ label: 'Units', href: '/units' }]}
        tags={unit.hiddenAt && <Tag>hidden</Tag>}
        actions={
          <>
            {mayEdit && <ButtonLink variant="quiet" href={`/units/${id}/edit`}>Edit</ButtonLink>}
            {mayEdit && <ButtonLink variant="quiet" href={`/units/${id}/readings/new`}>Enter a reading</ButtonLink>}
            {mayEdit && <ButtonLink variant="quiet" href={`/units/${id}/fits/new`}>Record a fit</ButtonLink>}
            {mayWork && !unit.hiddenAt && <ButtonLink href={`/cases/new?unit=${id}`}>Open a case</ButtonLink>}
          </>
        }
      />
      {hidden && (
        <Notice title={`Hidden by ${hidden.by}`} className="mb-8" actions={mayEdit && <ShowForm action={showUnit} id={{ name: 'unitId', value: id }} />}>
          {hidden.reason}. It stands in no list and no search; its history stays.
        </Notice>
      )}
      <UnitHolds unitId={id} holds={record.holds} linksToCases={linksToCases} lift={ctx.mayRelease && mayWork ? liftHold : null} />
      <div className="grid gap-x-14 gap-y-12 lg:grid-cols-[3fr_2fr]">
        <div className="grid min-w-0 content-start gap-12">
          <section aria-labelledby="history" className="min-w-0">
            <h2 id="history" className="mb-4">History</h2>
            <History unitId={id} fits={fits} cases={cases} today={today} units={units} />
          </section>
          <section aria-labelledby="readings" className="grid min-w-0 gap-4">
            <h2 id="readings">Odometer and engine hours</h2>
            <ReadingTable readings={readings} units={units} />
          </section>
          <LiftedHolds lifted={record.lifted} linksToCases={linksToCases} />
        </div>
        <div className="grid content-start gap-12">
          <section aria-labelledby="facts">
            <h2 id="facts" className="mb-4">The unit</h2>
            <DefinitionList items={unitFacts(unit, units)} />
          </section>
          <section aria-labelledby="baseline">
            <h2 id="baseline" className="mb-4">Healthy baseline</h2>
            <Baseline baseline={baseline} units={units} measureHref={mayWork ? `/units/${id}/baseline` : undefined} />
          </section>
          {currentFit && (
            <section aria-labelledby="on-it">
              <h2 id="on-it" className="mb-4">On it now</h2>
              <DefinitionList items={[...spanFacts(currentFit, units), ...practiceFacts(currentFit)]} />
              <p className="mt-3"><Link href={`/units/${id}/fits/${currentFit.id}`} className="inline-flex min-h-touch items-center underline underline-offset-4">{mayEdit ? 'Take it out, or correct this' : 'This fit by itself'}</Link></p>
            </section>
          )}
        </div>
      </div>
      {mayEdit && (
        <div className="mt-10 grid gap-2">
          {readings.length > 0 && (
            <StrikeReadingForm action={strikeReading} unitId={id} readings={readings.toReversed().map((row) => ({ value: row.id, label: readingLabel(row, units) }))} />
          )}
          {mayWork && baseline.sets.length > 0 && (
            <HideBaselineForm action={hideBaseline} unitId={id} sets={baseline.sets.map((set) => ({ value: set.id, label: `${dayText(set.measuredOn)}, ${OCCASION_WORDS[set.occasion].toLowerCase()}` }))} />
          )}
          {!unit.hiddenAt && (
            <HideForm action={hideUnit} id={{ name: 'unitId', value: id }} title="Hide this unit" explains="For a unit that was sold or entered twice. It leaves the lists and searches; its cases and its history stay, and it can be shown again." />
          )}
        </div>
      )}
    </>
  );
}

const unitFacts = (unit: UnitRecord['unit'], units: UnitPreferences) => [
  { term: 'Site', value: unit.siteName },
  { term: 'Kind', value: termLabel('vehicleKind', unit.vehicleKind) },
  { term: 'Work', value: termLabel('vocation', unit.vocation) },
  { term: 'Engine family', value: unit.engineFamily },
  { term: 'Built on', value: unit.builtOn && dayText(unit.builtOn) },
  { term: 'Country', value: unit.country },
  { term: 'All reservoirs', value: measureText(unit.reservoirM3, UNIT_MEASURES[0], units), figure: true },
  { term: 'The rule asks for', value: measureText(unit.requiredReservoirM3, UNIT_MEASURES[1], units), figure: true },
  { term: 'Number of reservoirs', value: unit.reservoirCount, figure: true },
  { term: 'Dryer cartridge changed', value: unit.dryerCartridgeChangedOn && dayText(unit.dryerCartridgeChangedOn) },
  { term: 'Note', value: unit.note },
];
