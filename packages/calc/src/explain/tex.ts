/** A number as TeX to six significant digits. */
export function tex(value: number): string {
  if (!Number.isFinite(value)) return value > 0 ? '\\infty' : '-\\infty';
  const [digits = '0', exponent] = Number(value.toPrecision(6)).toString().split('e');
  return exponent === undefined ? digits : `${digits}\\times10^{${Number(exponent)}}`;
}
