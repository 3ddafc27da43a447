/** Steps that several remedies share, so that a figure is written once. All of them: common practice, no source. */

/** Before a line, a gasket or a reservoir is opened: opening destroys evidence that can't be had again. */
const keepTheEvidence =
  'Take what you still need from a closed, warm system first: oil caught and weighed, temperatures along the line, photographs. Opening it destroys them.';

/** Engine off, air system left closed. */
export const makeSafe = [
  'Park on level ground, chock the wheels, take the key out and tag it. Let hot parts cool, or protect yourself from them.',
];

/** Readings that need the engine, before anything is opened. */
export const makeSafeToRun = [
  'Park on level ground and chock the wheels. Run the engine only outdoors or with the exhaust extraction on, and keep everybody away from fan and belts.',
];

/** From a chocked vehicle to an empty air system. */
export const letTheAirOut = [
  keepTheEvidence,
  'Engine off, key out and tagged. Get clear of frame, wheels and brake rods, then drain every reservoir and leave the drains open. Crack each fitting slowly: air stays trapped in the discharge line and before the dryer’s check valve.',
];

export const makeSafeAndDrain = ['Park on level ground and chock the wheels.', ...letTheAirOut];

/** Oil that is already downstream goes on appearing for weeks and would spoil the watch. */
export const cleanDownstream = [
  'Clean out the oil that is already downstream, or it keeps appearing for weeks. Engine off, every reservoir drained, fittings cracked slowly: then discharge line, dryer with a new cartridge, and every tank, until only dry air comes.',
  'Look for oil at the service tanks and valves. Where it got that far, don’t release the vehicle: a qualified person assesses or replaces every wetted rubber part and tests brake function, as the maker says.',
];

/** Old sealant off, a bare minimum of new sealant on. */
export const gasketAtTheMount = [
  'Clean every trace of old gasket and sealant off both faces. Let nothing fall into the engine, and look through the drain opening until you see it clear over its whole width.',
  'Hold the new gasket against the flange: its cut-out must leave the drain and the oil feed fully open. Use only enough sealant to hold it, or a spray adhesive; never a bead.',
  'Fit and tighten to the maker’s values in the maker’s order.',
];

/** What every run under load needs. */
export const breakInRun = [
  'Close every drain. Take the vehicle outdoors or put the exhaust extraction on. Run the engine at 1,000 rpm and bleed the wet tank so that it holds about 80 psi (5.5 bar) and the compressor never unloads, for 20 to 30 minutes.',
  'While it is hot, look for oil and coolant leaks at flange, feed, head and line. Stop the engine before you touch anything.',
];

/** The air side works again. */
export const proveTheAirSide = [
  'Close every drain and fill the system at governed speed. Time 85 to 100 psi, read cut-out and cut-in, and compare with the limits that your organisation adopted and with this unit’s healthy baseline.',
];

/** Air lost anywhere undoes the repair. */
export const proveNoLeak =
  'With the system full, the engine off and the chocks in place, let it settle, then measure the leak-down, brakes released and applied.';

/** The reading that the watch starts from. */
export const startTheWatch =
  'Start the watch from a clean system: note odometer and engine hours, and what you caught or saw today.';
