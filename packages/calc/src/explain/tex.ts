/** A number as TeX: whole ones in full, others to six significant digits. */
export function tex(value: number): string {
  if (!Number.isFinite(value)) return value > 0 ? '\\infty' : '-\\infty';
  if (Number.isInteger(value) && Math.abs(value) < 1e15) return String(value);
  const [digits = '0', exponent] = Number(value.toPrecision(6)).toString().split('e');
  return exponent === undefined ? digits : `${digits}\\times10^{${Number(exponent)}}`;
}

/** A number as a factor, a base or a term after a sign: in brackets where it has a sign or a power of its own. */
export function texFactor(value: number): string {
  const plain = tex(value);
  return value < 0 || plain.includes('^') ? `(${plain})` : plain;
}

/** Money or months as TeX, to the hundredth. */
export function texAmount(value: number): string {
  return String(Number(value.toFixed(2)));
}
