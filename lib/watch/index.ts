export { addDays, daysOf } from './days';
export { planFor } from './plan-for';
export { dueReadings, lastOf, odometerOf, type Read, type ReadingDue, type Today, type Watched } from './readings';
export { endOf, whyNotHeld, type End } from './may-hold';
export { isSeen, OUTCOMES, proofOf, PROOFS, type Outcome, type ProofLevel } from './proof-of';
