/**
 * The thin space that holds a number and its unit together. Lato draws U+202F a tenth of an em wide, hardly to be
 * seen, and its no-break space a fifth, which is what a thin space is elsewhere.
 */
export const thin = '\u00a0';

/** Text that was made elsewhere, with our thin space. */
export const thinly = (text: string): string => text.replaceAll('\u202f', thin);
