/**
 * The text with U+FFFD for every half of a surrogate pair that stands alone, as no address can hold such a half. The
 * built-in method of this name is missing in browsers that the handbook is for.
 */
export const wellFormed = (text: string): string => text.replace(/\p{Surrogate}/gu, '\ufffd');
