import type { Metadata } from 'next';
import Link from 'next/link';
import { BREAK_IN_FIELDS, MODEL_MEASURE_FIELDS } from '@/components/models/model-measures';
import { ButtonLink } from '@/components/ui/Button';
import { DataTable } from '@/components/ui/DataTable';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { Tag } from '@/components/ui/Tag';
import { measureText } from '@/components/units/MeasureField';
import { HideForm, ShowForm } from '@/components/units/ReasonForms';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { dayText } from '@/lib/schemas/day-text';
import { termLabel } from '@/lib/schemas/terms';
import { readModel } from '@/lib/services/compressor-model/read';
import { hideModel, showModel } from '../actions';

export const metadata: Metadata = { title: 'Compressor model' };

export default async function ModelPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['model.see']);
  const { id } = await params;
  const { model, units, hidden } = await orNotFound(readModel({ ctx, input: { modelId: id } }));
  const mayEdit = may(ctx.roles, 'model.edit');
  return (
    <>
      <PageHeader
        title={model.name}
        lead={units.length === 0 ? 'On no unit now.' : `On ${units.length} ${units.length === 1 ? 'unit' : 'units'} now.`}
        breadcrumbs={[{ label: 'Compressor models', href: '/models' }]}
        tags={model.hiddenAt && <Tag>hidden</Tag>}
        actions={mayEdit && <ButtonLink variant="quiet" href={`/models/${id}/edit`}>Edit</ButtonLink>}
      />
      {hidden && (
        <Notice title={`Hidden by ${hidden.by}`} className="mb-8" actions={mayEdit && <ShowForm action={showModel} id={{ name: 'modelId', value: id }} />}>
          {hidden.reason}. It can’t be chosen for a new fit; fits that name it stay as they are.
        </Notice>
      )}
      <div className="grid gap-x-14 gap-y-12 lg:grid-cols-2">
        <section aria-labelledby="facts">
          <h2 id="facts" className="mb-4">What a case need not ask</h2>
          <DefinitionList
            items={[
              { term: 'Oil drain', value: termLabel('drainOpening', model.drainOpening) },
              { term: 'Oil feed', value: termLabel('oilFeedPlace', model.oilFeedPlace) },
              { term: 'Breathes from', value: termLabel('intakeType', model.intakeType) },
              { term: 'Head cooled by', value: termLabel('cooling', model.cooling) },
              { term: 'Drive gear of', value: termLabel('driveGear', model.driveGear) },
              { term: 'Unloads by', value: termLabel('unloading', model.unloading) },
              { term: 'Note', value: model.note },
            ]}
          />
        </section>
        <section aria-labelledby="sizes">
          <h2 id="sizes" className="mb-4">Sizes</h2>
          <DefinitionList
            items={[
              ...MODEL_MEASURE_FIELDS.map(({ measure, label }) => ({ term: label, value: measureText(model[measure.column], measure, ctx.person.units), figure: true })),
              { term: 'Cylinders', value: model.cylinders, figure: true },
            ]}
          />
        </section>
        {model.breakInSource && (
          <section aria-labelledby="break-in">
            <h2 id="break-in" className="mb-4">Break-in run</h2>
            <DefinitionList
              items={[
                { term: 'Engine speed', value: model.breakInEngineRpm && `${model.breakInEngineRpm} rpm`, figure: true },
                ...BREAK_IN_FIELDS.map(({ measure, label }) => ({ term: label, value: measureText(model[measure.column], measure, ctx.person.units), figure: true })),
                { term: 'Where this is from', value: model.breakInSource },
              ]}
            />
          </section>
        )}
      </div>
      {units.length > 0 && (
        <section aria-labelledby="on-units" className="mt-12 grid gap-4">
          <h2 id="on-units">On these units now</h2>
          <DataTable
            caption="Units with this compressor"
            captionHidden
            rows={units}
            rowKey={(row) => row.fitId}
            columns={[
              { key: 'unit', header: 'Unit', rowHeader: true, cell: (row) => <Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/units/${row.unitId}`}>{row.fleetNumber}</Link> },
              { key: 'site', header: 'Site', cell: (row) => row.siteName },
              { key: 'condition', header: 'New or rebuilt', cell: (row) => termLabel('condition', row.condition) },
              { key: 'since', header: 'Fitted', cell: (row) => <Link href={`/units/${row.unitId}/fits/${row.fitId}`}>{dayText(row.installedOn)}</Link> },
            ]}
          />
        </section>
      )}
      {mayEdit && !model.hiddenAt && (
        <div className="mt-10">
          <HideForm action={hideModel} id={{ name: 'modelId', value: id }} title="Hide this model" explains="For a model that is out of use or was entered twice. It can’t be chosen for new fits then; it can be shown again." />
        </div>
      )}
    </>
  );
}
