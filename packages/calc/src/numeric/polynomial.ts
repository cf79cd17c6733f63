/** The polynomial with these coefficients, lowest power first, at x. */
export function polynomial(x: number, coefficients: readonly number[]): number {
  let sum = 0;
  for (let power = coefficients.length - 1; power >= 0; power--) sum = sum * x + (coefficients[power] ?? 0);
  return sum;
}
