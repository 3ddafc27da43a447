import { limit } from './limit';

const HANDBOOK = 'Ontario Ministry of Transportation, Official Truck Handbook';
const ontario = { country: 'Canada', region: 'Ontario', standing: "driver's check", source: HANDBOOK } as const;
const european = { country: 'European Union', standing: 'regulation' } as const;
const bar = { quantity: 'pressure', like: 'bar' } as const;

/** Figures of other countries. */
export const ELSEWHERE = [
  limit({ ...ontario, id: 'ca-on-build-up', what: 'Build-up from 85 to 100 psi', when: '600 to 900 rpm', quantity: 'duration', like: 'min', most: 2, vehicle: 'any' }),
  limit({
    ...ontario,
    id: 'ca-on-leak-applied-combination',
    what: 'Pressure drop in a minute, brakes fully applied',
    when: 'class A',
    quantity: 'pressureRate',
    like: 'psi/min',
    most: 4,
    vehicle: 'combination',
  }),
  limit({
    ...ontario,
    id: 'ca-on-leak-applied-single',
    what: 'Pressure drop in a minute, brakes fully applied',
    when: 'class D',
    quantity: 'pressureRate',
    like: 'psi/min',
    most: 3,
    vehicle: 'single vehicle',
  }),
  limit({ ...european, ...bar, id: 'eu-supply-coupling', what: 'Supply pressure at the coupling', when: 'at cut-in, no service application', least: 7, vehicle: 'truck', source: 'Directive 71/320/EEC, annex II, appendix, 3.1.2.2' }),
  limit({ ...european, ...bar, id: 'eu-coupling-full-application', what: 'Pressure at the coupling head, full application', when: 'between cut-in and cut-out, energy source stopped', least: 6.5, most: 8.5, vehicle: 'truck', source: 'Directive 71/320/EEC, annex II, appendix, 3.1.2.1' }),
  limit({ ...european, id: 'eu-reservoir-actuations', what: 'Full-stroke actuations out of the reservoirs', when: 'not replenished; secondary performance still met after them', quantity: 'count', like: 'one', least: 8, vehicle: 'any', source: 'Directive 71/320/EEC, annex IV, A 1.2.1' }),
  limit({
    id: 'un-r13-fill-time',
    what: 'Time of the compressor to the pressure p2',
    when: 'not coupling a trailer',
    quantity: 'duration',
    like: 'min',
    most: 6,
    country: 'countries that apply UN R13',
    vehicle: 'single vehicle',
    standing: 'regulation',
    source: 'UN Regulation 13, annex 7, part A, 2.4.2',
    fromMemory: true,
  }),
  limit({
    id: 'un-r13-fill-time-coupling',
    what: 'Time of the compressor to the pressure p2',
    when: 'coupling a trailer',
    quantity: 'duration',
    like: 'min',
    most: 9,
    country: 'countries that apply UN R13',
    vehicle: 'combination',
    standing: 'regulation',
    source: 'UN Regulation 13, annex 7, part A, 2.4.2',
    fromMemory: true,
  }),
];
