/** How sure somebody was of a cause, and how far it is proved, as pages and documents say it. */
export const SURENESS_WORDS: Readonly<Record<string, string>> = { sure: 'sure', 'fairly-sure': 'fairly sure', guess: 'a guess' };
export const PROOF_WORDS: Readonly<Record<string, string>> = {
  none: 'not proved yet',
  seen: 'seen',
  isolated: 'isolated: one remedy alone, and it held',
  'held-with-others': 'held with others',
};
