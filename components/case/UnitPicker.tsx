'use client';

import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { TextField } from '@/components/ui/TextField';
import { api } from '@/lib/query/problem';
import { queryKeys } from '@/lib/query/keys';

interface FoundUnit {
  id: string;
  fleetNumber: string;
  siteName: string;
}

interface Props {
  /** Chosen already, from the unit's own page. */
  unit: FoundUnit | null;
  sites: readonly { id: string; name: string }[];
  errors: Readonly<Record<string, string>>;
  values: Readonly<Record<string, string | undefined>>;
}

const NEW = 'new';

/** Finds a unit by part of its number, or takes what is needed to make one on the spot. */
export function UnitPicker({ unit, sites, errors, values }: Props) {
  const [text, setText] = useState(values.fleetNumber ?? unit?.fleetNumber ?? '');
  const wanted = text.trim();
  const { data, isFetching } = useQuery({
    queryKey: queryKeys.unitSearch(wanted),
    queryFn: () => api<{ units: FoundUnit[] }>(`/api/v1/units?limit=10&q=${encodeURIComponent(wanted)}`),
    enabled: wanted.length > 0,
    placeholderData: (held) => held,
  });
  const found = wanted === '' ? [] : (data?.units ?? (unit ? [unit] : []));
  const exact = found.find(({ fleetNumber }) => fleetNumber.toLowerCase() === wanted.toLowerCase());
  const [picked, setPicked] = useState<string | null>(values.unitId ?? unit?.id ?? null);
  const chosen = found.some(({ id }) => id === picked) ? picked : (exact?.id ?? (found.length === 0 && !isFetching ? NEW : picked === NEW ? NEW : null));

  return (
    <div className="grid gap-4">
      <TextField
        label="Unit"
        name="fleetNumber"
        hint="Part of its number is enough"
        autoComplete="off"
        autoCapitalize="characters"
        value={text}
        onChange={(event) => setText(event.target.value)}
        error={errors.fleetNumber ?? errors['unit.fleetNumber'] ?? errors.unit}
        required
      />
      {wanted !== '' && (
        <div onChange={(event) => event.target instanceof HTMLInputElement && setPicked(event.target.value)}>
          <RadioGroup
            key={`${found.map(({ id }) => id).join()}/${chosen}`}
            label="Which one?"
            name="unitId"
            defaultValue={chosen ?? undefined}
            columns={2}
            choices={[
              ...found.map(({ id, fleetNumber, siteName }) => ({ value: id, label: fleetNumber, hint: siteName })),
              ...(exact ? [] : [{ value: NEW, label: `Add unit ${wanted}`, hint: 'Not on the list yet' }]),
            ]}
          />
        </div>
      )}
      {wanted !== '' && chosen === NEW && !exact && (
        <div className="grid gap-4 border-l-4 border-rule pl-4 sm:grid-cols-2">
          <SelectField label="Site" name="siteId" options={sites.map(({ id, name }) => ({ value: id, label: name }))} defaultValue={values.siteId} error={errors['unit.siteId'] ?? errors.siteId} />
          <RadioGroup
            label="Kind"
            name="vehicleKind"
            defaultValue={values.vehicleKind ?? 'truck'}
            columns={2}
            choices={[{ value: 'truck', label: 'Truck' }, { value: 'bus', label: 'Bus' }]}
          />
        </div>
      )}
    </div>
  );
}
