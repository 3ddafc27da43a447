'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { TextareaField } from '@/components/ui/TextareaField';
import { UNIT_MEASURES } from '@/lib/schemas/measures';
import { termOptions } from '@/lib/schemas/terms';
import type { UnitPreferences } from '@/lib/units';
import { FormSection } from './FormSection';
import { MeasureField } from './MeasureField';
import { ReadingFields } from './ReadingFields';

interface Props {
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
  sites: readonly { id: string; name: string }[];
  units: UnitPreferences;
  /** What the form begins with. */
  stored: Record<string, string>;
  /** A new unit gets this id; one that exists is changed from this version. */
  unit: { newId: string } | { unitId: string; version: string };
}

const [RESERVOIRS, REQUIRED] = UNIT_MEASURES;

export function UnitForm({ action, sites, units, stored, unit }: Props) {
  const form = useForm(action);
  const field = (name: string) => form.field(name, stored[name]);
  const kind = field('vehicleKind');
  return (
    <Form form={form} className="max-w-4xl!">
      {'newId' in unit ? (
        <input type="hidden" name="id" value={unit.newId} readOnly />
      ) : (
        <>
          <input type="hidden" name="unitId" value={unit.unitId} readOnly />
          <input type="hidden" name="version" value={unit.version} readOnly />
        </>
      )}
      <FormSection title="Which unit">
        <TextField label="Fleet number" hint="As it is painted on the door" autoComplete="off" autoCapitalize="characters" required {...field('fleetNumber')} />
        <SelectField label="Site" placeholder="Choose a site" required options={sites.map(({ id, name }) => ({ value: id, label: name }))} {...field('siteId')} />
        <RadioGroup label="Kind" choices={termOptions('vehicleKind')} columns={2} required name="vehicleKind" error={kind.error} defaultValue={kind.defaultValue} />
        <SelectField label="Work" hint="What it has done in the last months" placeholder="Not recorded" required={false} options={termOptions('vocation')} {...field('vocation')} />
      </FormSection>
      <FormSection title="What it is">
        <TextField label="Engine family" hint="As your workshop calls it" required={false} autoComplete="off" {...field('engineFamily')} />
        <TextField label="Built on" type="date" required={false} {...field('builtOn')} />
        <TextField label="Country" hint="Two letters; your organisation’s when left empty" maxLength={2} autoComplete="off" required={false} {...field('country')} />
      </FormSection>
      <FormSection title="Air reservoirs and dryer" hint="Build-up times are judged by the volume that has to be filled.">
        <MeasureField label="Volume of all reservoirs" required={false} units={units} measure={RESERVOIRS} {...field(RESERVOIRS.field)} />
        <MeasureField label="Volume that the rule asks for" required={false} units={units} measure={REQUIRED} {...field(REQUIRED.field)} />
        <TextField label="Number of reservoirs" inputMode="numeric" required={false} {...field('reservoirCount')} />
        <TextField label="Dryer cartridge last changed" hint="By itself; a change with a compressor stands with that" type="date" required={false} {...field('dryerCartridgeChangedOn')} />
      </FormSection>
      {'newId' in unit && (
        <FormSection title="Odometer and engine hours">
          <ReadingFields form={form} units={units} names={{ odometer: 'odometer', engineHours: 'engineHours' }} />
          <TextField label="Read on" hint="Today when left empty" type="date" required={false} {...field('readOn')} />
        </FormSection>
      )}
      <TextareaField label="Note" required={false} {...field('note')} />
      <div>
        <SubmitButton>{'newId' in unit ? 'Add the unit' : 'Save the unit'}</SubmitButton>
      </div>
    </Form>
  );
}
