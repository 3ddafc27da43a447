/** The ranking core that runs anywhere, browser included. The run of record is in `record-run.ts`. */
export * from './types';
export * from './stations';
export { RulebookError, FindingError, lineOf, type Problem, type FindingErrorCode } from './errors';
export { RANKER_VERSION } from './ranker-version';
export { natsOf, decibansOf } from './decibans';
export { parseRulebook, type ParsedRulebook } from './schema';
export { compileRulebook } from './compile-rulebook';
export { compileTrusted } from './compile';
export type { CompiledRulebook, CompiledCheck, CompiledRule, CompiledGroup } from './compiled';
export { sharesOf } from './shares';
export { findingsFromRecord, overRecord } from './findings-from-record';
export { priorsFor } from './priors';
export { rank, type RankOptions } from './rank';
export { createWhatIf, type WhatIf } from './what-if';
export { explain, type Explanation, type ExplainedCause, type Reason, type ReasonRule } from './explain';
export { compareCauses, type CauseComparison } from './compare-causes';
export { strengthOf, STRENGTHS, type Strength, type StrengthWord } from './strength';
