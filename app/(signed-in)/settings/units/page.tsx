import type { Metadata } from 'next';
import { UnitsForm } from '@/components/settings/UnitsForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { METRIC_UNITS, QUANTITIES, QUANTITY_IDS, US_UNITS } from '@/lib/units';
import { saveUnits } from './actions';

export const metadata: Metadata = { title: 'Units of measure' };

/** Quantities that are written differently in the two systems; the others are the same everywhere. */
const ASKED = QUANTITY_IDS.filter((quantity) => US_UNITS[quantity] !== METRIC_UNITS[quantity]);

export default async function UnitsPage() {
  const { person } = await pageContext();
  const quantities = ASKED.map((quantity) => ({
    quantity,
    label: QUANTITIES[quantity].noun,
    unit: person.units[quantity],
    units: Object.entries(QUANTITIES[quantity].units).map(([value, { symbol, name }]) => ({ value, label: symbol && symbol !== name ? `${symbol}: ${name}` : name })),
  }));
  return (
    <>
      <PageHeader
        title="Units of measure"
        lead="What you see figures in, and what a figure is taken to be when you type no unit. What was typed stays as it was typed."
      />
      <UnitsForm action={saveUnits} quantities={quantities} />
    </>
  );
}
