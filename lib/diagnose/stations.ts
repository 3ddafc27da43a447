/**
 * Places on the path that oil and air take, in the order in which they are drawn: the air line, the oil line,
 * the taps at the side, and the tag for what belongs to no part.
 */
export const STATIONS = [
  { id: 'intake', name: 'Intake' },
  { id: 'cylinder-and-head', name: 'Cylinder and head' },
  { id: 'discharge-line', name: 'Discharge line' },
  { id: 'dryer', name: 'Dryer' },
  { id: 'tanks-and-system', name: 'Tanks and system' },
  { id: 'oil-feed', name: 'Oil feed' },
  { id: 'crankcase-and-drain', name: 'Crankcase and drain' },
  { id: 'drive', name: 'Drive' },
  { id: 'unloader-and-governor', name: 'Unloader and governor' },
  { id: 'vehicle-and-history', name: 'Vehicle and history' },
] as const;

export type StationId = (typeof STATIONS)[number]['id'];

export const STATION_IDS = STATIONS.map((station) => station.id) as [StationId, ...StationId[]];
