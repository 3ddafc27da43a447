import { gaugePressure, toAbsolute } from '@/lib/units';
import { FREE_AIR_PRESSURE } from '../air';
import { delivery as sum, sweptVolume, volumetricEfficiency } from '../delivery';
import { frac, minus, number, pow, symbol, times } from '../formula/expression';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, clearance, driveRatio, index, otherLosses } from './inputs';
import { defineSum, input, output } from './sum';

export const delivery = defineSum({
  id: 'delivery',
  name: 'Delivery of a compressor',
  purpose: 'See how much air a compressor of this size should deliver at this speed and pressure.',
  cautions: [],
  inputs: {
    bore: input('Bore', 'b', 'length', 'in', { byDefault: 2.75, least: 0.5, most: 8, off: 0.002 }),
    stroke: input('Stroke', 's', 'length', 'in', { byDefault: 1.5, least: 0.3, most: 8, off: 0.01 }),
    cylinders: input('Cylinders', 'N', 'count', 'one', { byDefault: 2, least: 1, most: 8 }),
    engineSpeed: input('Engine speed', 'n_e', 'rotationalSpeed', 'rpm', { byDefault: 1600, least: 300, most: 5000, off: 25 }),
    driveRatio,
    dischargePressure: input('Gauge pressure delivered against', 'p', 'pressure', 'psi', { optional: true, byDefault: 120, least: 0, most: 300, off: 3 }),
    clearance,
    index: index(1.3),
    otherLosses,
    altitude,
  },
  outputs: {
    delivery: output('Delivery, free air', 'Q', 'flow', 'cfm'),
    seaLevelDelivery: output('The same air at sea level', 'Q_0', 'flow', 'cfm'),
    displaced: output('Swept by the pistons', 'Q_s', 'flow', 'cfm'),
    efficiency: output('Volumetric efficiency by clearance', 'E', 'ratio', 'percent'),
  },
  main: 'delivery',
  expression: times(
    frac(number(Math.PI), number(4)),
    pow(symbol('bore'), number(2)),
    symbol('stroke'),
    symbol('cylinders'),
    symbol('engineSpeed'),
    symbol('driveRatio'),
    symbol('efficiency'),
    minus(number(1), symbol('otherLosses')),
  ),
  terms: {
    inletAbsolute: output('Air around, absolute', 'p_1', 'absolutePressure', 'psia'),
    dischargeAbsolute: output('Pressure delivered against, absolute', 'p_2', 'absolutePressure', 'psia'),
    pressureRatio: output('Pressure ratio', 'r', 'ratio', 'one'),
  },
  assumptions: ['Delivery is counted as air lies around the vehicle: high up the same volume holds less.', 'The intake is at the pressure of the air around: suction takes some, boost gives some.', 'Volumetric efficiency E = 1 + c − c r^(1/n): air left in the clearance expands first.'],
  cannotTell: ['What a worn one still delivers: time a build-up for that.'],
  source: 'E. G. Harris, Compressed Air, formula 11; U.S. Standard Atmosphere 1976.',
  compute: (given) => {
    const inletPressurePa = standardAtmosphere(given.altitude);
    const dischargePressurePa = toAbsolute(gaugePressure(given.dischargePressure), inletPressurePa);
    const sweptVolumeM3 = sweptVolume({ boreM: given.bore, strokeM: given.stroke, cylinders: given.cylinders });
    const efficiency = volumetricEfficiency({ clearance: given.clearance, inletPressurePa, dischargePressurePa, index: given.index });
    if (efficiency === 0) return { kind: 'never', because: 'The air left in the clearance fills the cylinder as it expands: nothing is delivered against this pressure.' };
    const speedHz = given.engineSpeed * given.driveRatio;
    const delivered = sum({ sweptVolumeM3, speedHz, efficiency, otherLosses: given.otherLosses });
    return {
      values: {
        delivery: delivered,
        seaLevelDelivery: (delivered * inletPressurePa) / FREE_AIR_PRESSURE,
        displaced: sweptVolumeM3 * speedHz,
        efficiency,
        inletAbsolute: inletPressurePa,
        dischargeAbsolute: dischargePressurePa,
        pressureRatio: dischargePressurePa / inletPressurePa,
      },
    };
  },
});
