export interface Difference {
  label: string;
  mine: string;
  theirs: string;
}

/** Where two versions of one thing differ, leaf by leaf, in words a person can compare. */
export function differencesOf(
  mine: unknown,
  theirs: unknown,
  labelOf: (path: string) => string,
): Difference[] {
  const [own, other] = [leaves(mine), leaves(theirs)];
  return [...new Set([...own.keys(), ...other.keys()])].flatMap((path) => {
    const [a, b] = [own.get(path) ?? 'not stated', other.get(path) ?? 'not stated'];
    return a === b ? [] : [{ label: labelOf(path), mine: a, theirs: b }];
  });
}

/** The paths of every leaf, empty ones too. */
export function leafPaths(value: unknown, path = ''): string[] {
  if (typeof value !== 'object' || value === null) return [path];
  return Object.entries(value).flatMap(([key, part]) => leafPaths(part, path ? `${path}.${key}` : key));
}

function leaves(value: unknown): Map<string, string> {
  const at = (path: string) =>
    path
      .split('.')
      .reduce<unknown>((part, key) => (part as Record<string, unknown> | undefined)?.[key], value);
  return new Map(
    leafPaths(value).flatMap((path) => {
      const leaf = at(path);
      const absent = leaf === undefined || leaf === null || leaf === '';
      return absent ? [] : [[path, String(leaf)] as const];
    }),
  );
}
