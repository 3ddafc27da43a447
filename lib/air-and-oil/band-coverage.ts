export const BAND_COVERAGE: Readonly<Record<string, number>> = {};
