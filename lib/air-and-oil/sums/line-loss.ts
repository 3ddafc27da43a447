import { gaugePressure, temperature, toAbsolute } from '@/lib/units';
import { FREE_AIR_PRESSURE, FREE_AIR_TEMPERATURE, airDensity } from '../air';
import { frac, number, plus, pow, symbol, times, type Expression } from '../formula/expression';
import { harrisLoss } from '../harris-loss';
import { darcyWeisbachLoss, lineFrictionFactor, massFlowOf, massFlux } from '../line-friction';
import { requireWithin } from '../out-of-range';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, deliveryFlow } from './inputs';
import { LINE_CAUTIONS, SMOOTH_WALL, lineInputs } from './line';
import { defineSum, input, output } from './sum';

/** Past this share of the pressure the density is no longer one. */
const MUCH = 0.1;

/** f (L / d) G2 / (2 rho) of one part. */
const partLost = (factor: string, length: string, bore: string, flux: string): Expression =>
  frac(times(symbol(factor), symbol(length), pow(symbol(flux), number(2))), times(number(2), symbol('density'), symbol(bore)));

export const lineLoss = defineSum({
  id: 'line-loss',
  name: 'Loss along the discharge line',
  purpose: 'See what a line that has lost bore to carbon takes, against the same line when it was new.',
  cautions: LINE_CAUTIONS,
  inputs: {
    ...lineInputs,
    delivery: deliveryFlow,
    linePressure: input('Gauge pressure in the line', 'p_line', 'pressure', 'psi', { byDefault: 120, least: 0, most: 300, off: 3 }),
    airTemperature: input('Air in the line', 'T', 'temperature', 'degF', { optional: true, byDefault: 250, least: -40, most: 800, off: 20 }),
    altitude,
  },
  outputs: {
    loss: output('Loss, smooth wall', 'Δp', 'pressure', 'psi'),
    nominalLoss: output('The same with the full bore', 'Δp_0', 'pressure', 'psi'),
    ratio: output('Times the loss of the full bore', 'Δp/Δp_0', 'ratio', 'one'),
    harrisLoss: output('Loss after Harris, iron pipe', 'Δp_H', 'pressure', 'psi'),
    nominalHarrisLoss: output('The same with the full bore', 'Δp_H0', 'pressure', 'psi'),
  },
  main: 'loss',
  expression: plus(partLost('narrowedFactor', 'narrowedLength', 'narrowedBore', 'narrowedFlux'), partLost('nominalFactor', 'soundLength', 'nominalBore', 'nominalFlux')),
  terms: {
    narrowedFactor: output('Friction factor where narrowed', 'f_1', 'ratio', 'one'),
    nominalFactor: output('Friction factor of the rest', 'f_2', 'ratio', 'one'),
    narrowedFlux: output('Mass flow by area where narrowed, kg/(s m²)', 'G_1', 'ratio', 'one'),
    nominalFlux: output('Mass flow by area of the rest, kg/(s m²)', 'G_2', 'ratio', 'one'),
    soundLength: output('Length with its bore', 'L_2', 'length', 'ft'),
    density: output('Density of the air in the line', 'ρ', 'density', 'kg/m3'),
  },
  assumptions: ['Air of one density and temperature flows steadily.', SMOOTH_WALL, 'The line is straight: each bend adds some.'],
  cannotTell: [
    'How far the pressure at the head swings: a piston sends its air in pulses.',
    'The true loss by Harris: it is a fit to long iron pipes, good for comparing one line with another.',
  ],
  source: 'Darcy and Weisbach with the friction factor of Churchill (1977) and the viscosity of air after Sutherland; E. G. Harris, Compressed Air, formula 28.',
  compute: (given) => {
    requireWithin('narrowedLength', 'length', given.narrowedLength, { least: 0, most: given.length });
    requireWithin('narrowedBore', 'length', given.narrowedBore, { least: 0, most: given.nominalBore });
    const atmosphere = standardAtmosphere(given.altitude);
    const linePressurePa = toAbsolute(gaugePressure(given.linePressure), atmosphere);
    const air = { massFlowKgPerS: massFlowOf(given.delivery, airDensity(atmosphere, FREE_AIR_TEMPERATURE)), airTemperatureK: temperature(given.airTemperature) };
    // The formula of Harris counts free air at the level of the sea.
    const seaLevelFlow = given.delivery * (atmosphere / FREE_AIR_PRESSURE);
    const narrowed = { lengthM: given.narrowedLength, boreM: given.narrowedBore };
    const sound = { lengthM: given.length - given.narrowedLength, boreM: given.nominalBore };
    const whole = { lengthM: given.length, boreM: given.nominalBore };

    const darcy = (...parts: (typeof whole)[]) => parts.reduce((sum, part) => sum + darcyWeisbachLoss({ ...part, ...air, linePressurePa }), 0);
    const harris = (...parts: (typeof whole)[]) => parts.reduce((sum, part) => sum + harrisLoss({ ...part, freeAirFlowM3PerS: seaLevelFlow, linePressurePa }), 0);
    const [loss, nominalLoss] = [darcy(narrowed, sound), darcy(whole)];
    return {
      values: {
        loss,
        nominalLoss,
        ratio: nominalLoss > 0 ? loss / nominalLoss : 1,
        harrisLoss: harris(narrowed, sound),
        nominalHarrisLoss: harris(whole),
        narrowedFactor: lineFrictionFactor({ boreM: narrowed.boreM, ...air }),
        nominalFactor: lineFrictionFactor({ boreM: sound.boreM, ...air }),
        narrowedFlux: massFlux(air.massFlowKgPerS, narrowed.boreM),
        nominalFlux: massFlux(air.massFlowKgPerS, sound.boreM),
        soundLength: sound.lengthM,
        density: airDensity(linePressurePa, air.airTemperatureK),
      },
      notes: loss > MUCH * linePressurePa ? ['So large a loss changes the density of the air: see the sum for the pressure at the head instead.'] : [],
    };
  },
});
