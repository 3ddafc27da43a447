import { psi } from '../si';
import type { Check } from '../../types';
import { check } from './check';

/** What is measured before a release and says nothing of the cause: no rule weighs it. */
export const checks: Check[] = [
  check({
    id: 'low-air-warning',
    name: 'Low-air warning',
    station: 'tanks-and-system',
    kind: 'measured',
    quantity: 'pressure',
    unit: 'psi',
    usualError: psi(2),
    range: { min: 0, max: psi(150) },
    prompt: 'At what pressure does the low-air warning come on?',
    why: 'It is the last word to the driver before the spring brakes speak for themselves.',
    steps: [
      'Full pressure, engine off, ignition on, wheels chocked.',
      'Let the air down by short strokes of the pedal and note the pressure at which lamp or buzzer comes on.',
      'It must be on at any pressure below 60 psi. One that never came on counts as 0.',
    ],
    tools: ['test gauge', 'wheel chocks'],
    minutes: 4,
    setUp: { engine: 'off', air: 'full', access: ['wheels-chocked'] },
    cautions: ['vehicle-rolls', 'pressure-falls-suspension-brakes'],
    states: [
      { id: 'late', label: 'Under 60 psi, or never', background: 0.03, high: psi(60), holdsRelease: true },
      { id: 'in-time', label: '60 psi or more', background: 0.97, low: psi(60) },
    ],
    cannotTell: 0.02,
    basis: 'regulation',
    source: '49 CFR 571.121 S5.1.5: on whenever the pressure in a service reservoir is below 60 psi.',
  }),
  check({
    id: 'brake-function',
    name: 'Brake function after oil downstream',
    station: 'tanks-and-system',
    prompt: 'Do the brakes work as they should, with every wetted part assessed or replaced?',
    why: 'Oil swells and softens the rubber in valves and hoses. What looks dry today may stick tomorrow.',
    steps: [
      'A qualified person assesses or replaces every rubber part that oil has wetted, as the maker says.',
      'Then a brake function test, by the maker’s information and local rules, by somebody who may.',
    ],
    tools: ['as the maker says'],
    minutes: 30,
    setUp: { access: ['wheels-chocked'] },
    cautions: ['oil-in-brake-system', 'vehicle-rolls', 'pressure-falls-suspension-brakes'],
    states: [
      { id: 'works', label: 'They work; wetted parts were seen to', background: 0.95 },
      { id: 'in-doubt', label: 'They do not, or it is in doubt', background: 0.05, holdsRelease: true },
    ],
    cannotTell: 0.02,
    basis: 'common practice',
    source: 'Common practice, no source. Who may test and release is the organisation’s to say (in the United States: 49 CFR 396.25).',
  }),
];
