const FIGURE_AND_UNIT = /(?<=\d) (?=(?:psi|kPa|bar|in|mm|ft|m|mi|km|h|min|s|°?[FC]|fl oz|mL|L|rpm|mph|dB|%)(?![\p{L}\p{N}]))/gu;

/**
 * A text in which no line breaks between a figure and its unit.
 * @example keepFigures('Build-up, 85 to 100 psi')
 */
export const keepFigures = (text: string): string => text.replace(FIGURE_AND_UNIT, '\u00a0');
