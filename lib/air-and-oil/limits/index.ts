/** Published figures, each with its country, its vehicle and its source: what an organisation can adopt as a limit. */
import { ELSEWHERE } from './elsewhere';
import type { PublishedLimit } from './limit';
import { UNITED_STATES } from './united-states';

export { CHAMBER_VOLUMES, chamberVolume, type ChamberType } from './brake-chambers';
export { earlyVehicleWarning, reliefAccumulation, reservoirTestPressure, westernAustraliaBuildUp } from './depending';
export type { PublishedLimit, Standing } from './limit';
export { ISO_8573_OIL, J300_AT_100_C, J300_CRANKING, J300_HIGH_SHEAR } from './oil';

export const PUBLISHED_LIMITS: readonly PublishedLimit[] = [...UNITED_STATES, ...ELSEWHERE];

const byId = new Map(PUBLISHED_LIMITS.map((limit) => [limit.id, limit]));

/** The published figure of an id, if there is one. */
export function publishedLimit(id: string): PublishedLimit | undefined {
  return byId.get(id);
}
