import { limit } from './limit';

const COUNTRY = 'United States';
const MANUAL = "model commercial driver's licence manual, section 5.3, as states print it";
const regulation = { country: COUNTRY, standing: 'regulation' } as const;
const manual = { country: COUNTRY, standing: "driver's check", source: MANUAL } as const;
const psi = { quantity: 'pressure', like: 'psi' } as const;
const psiPerMinute = { quantity: 'pressureRate', like: 'psi/min' } as const;

/** Figures of the United States. The driver's manual is not the federal regulation, and each says which it is. */
export const UNITED_STATES = [
  limit({ ...regulation, ...psi, id: 'us-cut-in-bus', what: 'Governor cut-in', least: 85, vehicle: 'bus', source: '49 CFR 571.121 S5.1.1.1; 61 FR 60635, 29 November 1996' }),
  limit({
    ...regulation,
    ...psi,
    id: 'us-cut-in-truck',
    what: 'Governor cut-in',
    least: 100,
    vehicle: 'truck',
    builtFrom: '1997-03-01',
    source: '49 CFR 571.121 S5.1.1.1; 61 FR 60635, 29 November 1996',
  }),
  limit({ ...regulation, ...psi, id: 'us-low-air-warning', what: 'Low-air warning', when: 'on below it, in the service reservoir', least: 60, vehicle: 'any', source: '49 CFR 571.121 S5.1.5' }),
  limit({
    ...regulation,
    ...psi,
    id: 'us-supply-line-retention',
    what: 'Pressure kept in the supply line',
    when: 'one leak in the service system of a trailer',
    least: 70,
    vehicle: 'trailer',
    source: '49 CFR 571.121 S5.8.2',
  }),
  limit({ ...regulation, ...psi, id: 'us-cleaning-air', what: 'Air used for cleaning', most: 30, below: true, vehicle: 'not a vehicle', source: '29 CFR 1910.242(b)' }),

  limit({ ...manual, ...psiPerMinute, id: 'us-leak-released-single', what: 'Leak-down, brakes released', when: 'engine off', most: 2, below: true, vehicle: 'single vehicle' }),
  limit({ ...manual, ...psiPerMinute, id: 'us-leak-released-combination', what: 'Leak-down, brakes released', when: 'engine off', most: 3, below: true, vehicle: 'combination' }),
  limit({ ...manual, ...psiPerMinute, id: 'us-leak-applied-single', what: 'Leak-down, brakes applied', when: '90 psi or more applied, after the initial drop', most: 3, vehicle: 'single vehicle' }),
  limit({ ...manual, ...psiPerMinute, id: 'us-leak-applied-combination', what: 'Leak-down, brakes applied', when: '90 psi or more applied, after the initial drop', most: 4, vehicle: 'combination' }),
  limit({
    ...manual,
    id: 'us-build-up-dual',
    what: 'Build-up from 85 to 100 psi',
    when: 'dual air system, engine at operating speed; larger tanks may take longer',
    quantity: 'duration',
    like: 's',
    most: 45,
    vehicle: 'any',
  }),
  limit({
    ...manual,
    id: 'us-build-up-single',
    what: 'Build-up from 50 to 90 psi',
    when: 'single air system (before 1975), engine at 600 to 900 rpm',
    quantity: 'duration',
    like: 'min',
    most: 3,
    vehicle: 'any',
    fromMemory: true,
  }),
  limit({ ...manual, ...psi, id: 'us-low-air-warning-driver', what: 'Low-air warning', when: 'on before pressure drops below it', least: 60, vehicle: 'any' }),
  limit({ ...manual, ...psi, id: 'us-governor-section-5', what: 'Governor, cut-in and cut-out', when: 'about', least: 100, most: 125, vehicle: 'any', source: "model commercial driver's licence manual, section 5" }),
  limit({ ...manual, ...psi, id: 'us-cut-out-section-2', what: 'Governor cut-out', when: 'usually around', least: 120, most: 140, vehicle: 'any', source: "model commercial driver's licence manual, section 2" }),

  limit({ ...regulation, ...psi, id: 'us-ca-safety-valve', what: 'Safety valve opens', when: 'and closes again above the governor maximum', most: 150, region: 'California', vehicle: 'any', source: 'California Vehicle Code 26503' }),
  limit({ ...regulation, ...psi, id: 'us-ca-low-air-warning', what: 'Low-air warning, fixed pressure', least: 55, most: 75, region: 'California', vehicle: 'any', source: 'California Vehicle Code 26506(b)' }),
  limit({ ...regulation, id: 'us-nv-application-drop', what: 'Drop in the reservoirs by one full application', quantity: 'ratio', like: 'percent', most: 30, region: 'Nevada', vehicle: 'any', source: 'NRS 484D.275(1)' }),
  limit({
    ...regulation,
    id: 'us-tx-application-drop',
    what: 'Drop in the reservoirs by one full application',
    quantity: 'ratio',
    like: 'percent',
    most: 20,
    region: 'Texas',
    vehicle: 'any',
    source: 'Texas Transportation Code 547.406(a)',
  }),
];
