/** Where a study’s first guesses come from, until somebody replaces them. */
export const toReplace = 'assumed, replace';
