/** Limits that an organisation adopted: which one holds for a unit, and what it says of a measured value. */
export { judge, type Judgement } from './judge';
export type { AdoptedLimit, Limit, LimitFacts } from './limit';
export { limitsFor } from './limit-for';
export { CHECKS_WITH_FIGURES, limitOf, publishedFor } from './suggested';
export { judgementText, limitText } from './text';
