import type { Metadata } from 'next';
import { FitForm } from '@/components/fits/FitForm';
import { practiceFacts, spanFacts } from '@/components/fits/fit-facts';
import { TakeOutForm } from '@/components/fits/TakeOutForm';
import { ButtonLink } from '@/components/ui/Button';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { PageHeader } from '@/components/ui/PageHeader';
import { Tag } from '@/components/ui/Tag';
import { HideForm } from '@/components/units/ReasonForms';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { readFit } from '@/lib/services/fit/read';
import { changeFit, strikeFit, takeOutFit } from '../../../actions';

export const metadata: Metadata = { title: 'Fit' };

interface Props {
  params: Promise<{ id: string; fitId: string }>;
  /** `do`: what the page is open for; nothing shows what is recorded. */
  searchParams: Promise<{ do?: string | string[] }>;
}

export default async function FitPage({ params, searchParams }: Props) {
  const ctx = await pageContext(PERMITTED['unit.see']);
  const { id, fitId } = await params;
  const { do: asked } = await searchParams;
  const { fit, fleetNumber, today, version, values, models } = await orNotFound(readFit({ ctx, input: { unitId: id, fitId } }));
  const { units } = ctx.person;
  const mayEdit = may(ctx.roles, 'unit.edit');
  const isOn = fit.removedOn === null;
  const here = `/units/${id}/fits/${fitId}`;
  const doing = !mayEdit ? 'read' : asked === 'correct' ? 'correct' : asked === 'take-out' && isOn ? 'take-out' : 'read';
  const heading = { read: `${fit.modelName} on unit ${fleetNumber}`, correct: 'Correct a fit', 'take-out': `Take the ${fit.modelName} out` }[doing];

  return (
    <>
      <PageHeader
        title={heading}
        breadcrumbs={[{ label: 'Units', href: '/units' }, { label: fleetNumber, href: `/units/${id}` }, ...(doing === 'read' ? [] : [{ label: fit.modelName, href: here }])]}
        tags={isOn && <Tag tone="strong">on it now</Tag>}
        actions={
          mayEdit &&
          doing === 'read' && (
            <>
              <ButtonLink variant="quiet" href={`${here}?do=correct`}>Correct this</ButtonLink>
              {isOn && <ButtonLink href={`${here}?do=take-out`}>Take it out</ButtonLink>}
            </>
          )
        }
      />
      {doing === 'take-out' && <TakeOutForm action={takeOutFit} fitId={fitId} version={version} today={today} units={units} />}
      {doing === 'correct' && <FitForm action={changeFit} models={models} units={units} today={today} stored={values} fit={{ fitId, version }} />}
      {doing === 'read' && (
        <div className="grid gap-10">
          <div className="grid gap-x-14 gap-y-10 lg:grid-cols-2">
            <section aria-labelledby="span">
              <h2 id="span" className="mb-4">When it was on</h2>
              <DefinitionList items={spanFacts(fit, units)} />
            </section>
            <section aria-labelledby="practice">
              <h2 id="practice" className="mb-4">How it was fitted</h2>
              <DefinitionList items={practiceFacts(fit)} />
            </section>
          </div>
          {mayEdit && (
            <HideForm action={strikeFit} id={{ name: 'fitId', value: fitId }} title="Strike out this fit" explains="For a fit that never was, or was entered on the wrong unit. Its readings go with it. A compressor that was really on this unit is taken out instead." />
          )}
        </div>
      )}
    </>
  );
}
