import { MODEL_MEASURES } from '@/lib/schemas/measures';
import { readMeasures } from '@/lib/services/units-of-measure';
import { audited } from './audit-row';
import { MODELS } from './compressor-models';
import { DEMO_ENGINEER, ORGANISATION, WRITING } from './organisation';
import type { Random } from './random';
import type { DemoRows } from './rows';

/** The compressor models as an engineer entered them when the record began. */
export function modelRows(rows: DemoRows, createdAt: Date, random: Random): void {
  for (const { id, displacement, bore, stroke, driveRatio, portBore, lineSize, ...plain } of MODELS) {
    const { columns, asTyped } = readMeasures(WRITING, MODEL_MEASURES, { displacement, bore, stroke, driveRatio, portBore, lineSize });
    const facts = { ...plain, ...columns, asTyped };
    rows.compressorModel.push({ ...facts, organisationId: ORGANISATION.id, id, createdAt, createdBy: DEMO_ENGINEER.id });
    rows.audit.push(audited(random, createdAt, DEMO_ENGINEER.id, { action: 'create.compressor-model', entity: 'compressor-model', entityId: id, changed: facts }));
  }
}
