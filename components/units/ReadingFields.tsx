import type { FormHandle } from '@/components/forms/use-form';
import { CheckboxField } from '@/components/ui/CheckboxField';
import type { UnitPreferences } from '@/lib/units';
import { MeasureField } from './MeasureField';

interface Props {
  form: FormHandle;
  units: UnitPreferences;
  /** What the form calls the two figures. */
  names: { odometer: string; engineHours: string };
  stored?: Record<string, string>;
  /** Offer from the start to say that an instrument was replaced; otherwise only once a figure was refused. */
  askReplaced?: boolean;
}

/** Odometer and engine hours of a day. */
export function ReadingFields({ form, units, names, stored = {}, askReplaced = false }: Props) {
  const both = [
    { name: names.odometer, label: 'Odometer', measure: { quantity: 'distance' }, replaced: 'The odometer was replaced since the reading before' },
    { name: names.engineHours, label: 'Engine hours', measure: { quantity: 'engineHours' }, replaced: 'The hour meter was replaced since the reading before' },
  ] as const;
  return both.map(({ name, label, measure, replaced }) => {
    const flag = `${name}Replaced`;
    const wasTicked = form.isTicked(flag, 'on', false);
    const figure = <MeasureField key={name} label={label} required={false} units={units} measure={measure} {...form.field(name, stored[name])} />;
    if (!askReplaced && form.errors[name] === undefined && !wasTicked) return figure;
    return (
      <div key={name} className="grid gap-1">
        {figure}
        <CheckboxField label={replaced} name={flag} defaultChecked={wasTicked} />
      </div>
    );
  });
}
