/**
 * Version of the ranking arithmetic, stored with every run of record. It changes whenever the same rulebook and the
 * same findings could give a different number, be it in the last bit.
 */
export const RANKER_VERSION = '1';
