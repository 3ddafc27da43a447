/** The pattern of whatever contains the text: `%` and `_` that somebody typed are themselves. */
export const containing = (text: string) => `%${text.replace(/[\\%_]/g, '\\$&')}%`;
