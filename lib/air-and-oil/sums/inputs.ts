import { SHARP_EDGED } from '../orifice-flow';
import { input } from './sum';

/** Inputs that several sums ask for alike. */

export const altitude = input('Altitude', 'h', 'length', 'ft', {
  optional: true,
  byDefault: 0,
  least: -1000,
  most: 15_000,
  off: 0,
  note: 'Air is thinner higher up. Left empty, it is the level of the sea.',
});

export const deliveryFlow = input('Delivery of the compressor', 'Q', 'flow', 'cfm', {
  byDefault: 12,
  least: 0.1,
  most: 200,
  share: 0.05,
  note: 'Free air, as it lies around the vehicle: from the sum for delivery, or from what its model should give at this speed.',
});

export const inletTemperature = input('Air at the intake', 'T_1', 'temperature', 'degF', { optional: true, byDefault: 70, least: -60, most: 250, off: 4 });

export const index = (byDefault: number) =>
  input('Index of compression', 'n', 'ratio', 'one', {
    optional: true,
    byDefault,
    least: 1.05,
    most: 1.6,
    off: 0.02,
    note: '1.3 to 1.4 is a reference for an uncooled compression. A cooled head behaves as if it were less.',
  });

export const reservoirVolume = input('Reservoirs together', 'V', 'volume', 'ft3', {
  byDefault: 3,
  least: 0.05,
  most: 100,
  share: 0.03,
  note: 'All that fills in this test, pipes included, by the plates on the tanks.',
});

export const edge = input('Discharge coefficient', 'C', 'ratio', 'one', {
  optional: true,
  byDefault: SHARP_EDGED,
  least: 0.3,
  most: 1,
  off: 0.05,
  note: '0.65 for a drilled hole with sharp edges, 0.97 for a well-rounded one.',
});

export const clearance = input('Clearance', 'c', 'ratio', 'percent', {
  optional: true,
  byDefault: 5,
  least: 0,
  most: 30,
  off: 1,
  note: 'Volume left above the piston, of what it sweeps.',
});

export const otherLosses = input('Lost past valves and rings', 'l', 'ratio', 'percent', { optional: true, byDefault: 10, least: 0, most: 90, off: 5 });

export const driveRatio = input('Compressor turns per engine turn', 'i', 'ratio', 'one', { optional: true, byDefault: 1, least: 0.2, most: 4 });

