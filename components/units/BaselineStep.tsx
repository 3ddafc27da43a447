import type { FormHandle } from '@/components/forms/use-form';
import { keepFigures } from '@/components/ui/figures';
import { NumberWithUnitField } from '@/components/ui/NumberWithUnitField';
import { Notice } from '@/components/ui/Notice';
import type { ConditionId, Figure } from '@/lib/baseline/figures';
import { CONDITION_MEASURES } from '@/lib/schemas/baseline';
import { measureUnit } from '@/lib/schemas/measures';
import { differenceOf, formatValue, unitDefinition, type Quantity, type UnitPreferences } from '@/lib/units';
import { MeasureField } from './MeasureField';

const CONDITION_LABELS: Readonly<Record<ConditionId, string>> = { ambient: 'Outside temperature', engineSpeed: 'Engine speed', loadedFor: 'Ran loaded for' };

interface Props {
  figure: Figure;
  number: number;
  form: FormHandle;
  units: UnitPreferences;
}

/** One figure of the set: its caution, how it is measured, and where it goes. */
export function BaselineStep({ figure, number, form, units }: Props) {
  const { field, name, caution, steps, conditions, quantity, usualError } = figure;
  const unit = measureUnit(units, figure);
  const { symbol } = unitDefinition<Quantity>(quantity, unit);
  const difference = differenceOf(quantity);
  const off = form.field(`${field}Error`, formatValue<Quantity>(usualError, { quantity: difference, unit }));
  return (
    // A field that gets the focus comes to rest below the bar that counts.
    <fieldset className="grid min-w-0 gap-4 [&_input]:scroll-mt-20">
      <legend className="float-left mb-1 w-full"><h2 className="text-xl">{number}. {keepFigures(name)}</h2></legend>
      <Notice kind="caution">{caution}</Notice>
      <ol className="ml-5 grid max-w-prose list-decimal gap-1">
        {steps.map((step) => <li key={step}>{keepFigures(step)}</li>)}
      </ol>
      <div className="flex flex-wrap gap-x-8 gap-y-4">
        <NumberWithUnitField label="You measured" unit={symbol} required={false} {...form.field(field)} />
        <NumberWithUnitField label="Give or take" unit={unitDefinition<Quantity>(difference, unit).symbol} required={false} {...off} />
      </div>
      {conditions.length > 0 && (
        <div className="flex flex-wrap gap-x-8 gap-y-4">
          {CONDITION_MEASURES.filter((measure) => conditions.includes(measure.field)).map((measure) => (
            <MeasureField key={measure.field} label={CONDITION_LABELS[measure.field]} measure={measure} units={units} required={false} {...form.field(measure.field)} />
          ))}
        </div>
      )}
    </fieldset>
  );
}
