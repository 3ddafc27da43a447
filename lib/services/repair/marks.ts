/** What was last said of each step, by its place. @param said oldest first */
export const lastMarks = <Said extends { step: number }>(said: readonly Said[]): Map<number, Said> => new Map(said.map((one) => [one.step, one]));
