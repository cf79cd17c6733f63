/** The media queries that match; jsdom lays nothing out and knows none. */
export const surroundings = {
  matching: [] as string[],
  matchMedia: (query: string) => ({
    matches: surroundings.matching.includes(query),
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }),
};

export const smallScreen = '(max-width: 640px)';
