import { and, eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { compressorModel } from '@/db/schema';

interface Of {
  organisationId: string;
  modelId: string;
}

const WHOLE = {
  id: compressorModel.id,
  name: compressorModel.name,
  displacementM3: compressorModel.displacementM3,
  boreM: compressorModel.boreM,
  strokeM: compressorModel.strokeM,
  cylinders: compressorModel.cylinders,
  driveRatio: compressorModel.driveRatio,
  cooling: compressorModel.cooling,
  unloading: compressorModel.unloading,
  intakeType: compressorModel.intakeType,
  drainOpening: compressorModel.drainOpening,
  oilFeedPlace: compressorModel.oilFeedPlace,
  driveGear: compressorModel.driveGear,
  portBoreM: compressorModel.portBoreM,
  lineSizeM: compressorModel.lineSizeM,
  asTyped: compressorModel.asTyped,
  note: compressorModel.note,
  createdAt: compressorModel.createdAt,
  updatedAt: compressorModel.updatedAt,
  hiddenAt: compressorModel.hiddenAt,
};

const thisModel = ({ organisationId, modelId }: Of) => and(eq(compressorModel.organisationId, organisationId), eq(compressorModel.id, modelId));

/** Hidden ones too, because fits name them. */
export async function selectModel(db: Executor, of: Of) {
  const [row] = await db.select(WHOLE).from(compressorModel).where(thisModel(of));
  return row;
}

export type ModelRow = NonNullable<Awaited<ReturnType<typeof selectModel>>>;
