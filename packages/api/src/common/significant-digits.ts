/** Rounds every real in a JSON value to 12 significant digits, as far as two engines are sure to agree. */
export function roundedReals<T>(value: T): T {
  if (typeof value === 'number')
    return (Number.isInteger(value) ? value : Number(value.toPrecision(12))) as T;
  if (Array.isArray(value)) return value.map(roundedReals) as T;
  if (value !== null && typeof value === 'object') {
    return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, roundedReals(inner)])) as T;
  }
  return value;
}
