/** What a number field asks for; `percent` is shown in percent and kept as a proportion. */
export type NumberKind = 'number' | 'percent' | 'whole' | 'money';

const plain = new Intl.NumberFormat('en-GB', { maximumSignificantDigits: 12, useGrouping: false });
const grouped = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 2 });

const isGrouped = (kind: NumberKind): boolean => kind === 'whole' || kind === 'money';
const scaleOf = (kind: NumberKind): number => (kind === 'percent' ? 100 : 1);

/** What a number field holds: its number, its text while that is no number, nothing while it is empty. */
export type Held = number | string | undefined;

/** A kept value as the field shows it: 0.125 as “12.5” in a percent field, 800000 as “800,000” in one for money. */
export function textOf(value: Held | null, kind: NumberKind): string {
  if (value === null || value === undefined) return '';
  if (typeof value === 'string') return value;
  const format = isGrouped(kind) && Math.abs(value) < 1e15 ? grouped : plain;
  return format.format(value * scaleOf(kind));
}

/** The text as digits with a decimal point: without its unit, spaces and, where numbers are grouped, separators. */
export function bareText(text: string, kind: NumberKind, unit: string): string {
  const trimmed = text.trim().replaceAll('−', '-');
  const withoutUnit = unit && trimmed.endsWith(unit) ? trimmed.slice(0, -unit.length) : trimmed;
  const bare = withoutUnit.replaceAll(/[\s'’]/g, '');
  // Between groups of exactly three digits a comma or point separates thousands.
  if (isGrouped(kind) && /^-?\d{1,3}([.,]\d{3})(?:\1|[.,]\d{3})*$/.test(bare))
    return bare.replaceAll(/[.,]/g, '');
  if (isGrouped(kind) && /^-?\d{1,3}(,\d{3})+\.\d+$/.test(bare)) return bare.replaceAll(',', '');
  return bare.replaceAll(/(\d),(?=\d)/g, '$1.');
}

/** The value a bare text stands for when it is a plain number; undefined when it is something else. */
export function plainValue(bare: string, kind: NumberKind): number | undefined {
  return /^-?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i.test(bare) ? kept(Number(bare), kind) : undefined;
}

/** A number in the unit shown as it is kept; 12 % is 0.12, not 0.12 and a rounding error. */
export const kept = (shown: number, kind: NumberKind): number =>
  kind === 'percent' ? Number((shown / 100).toPrecision(15)) : shown;

/** The value one step up or down: by the last decimal shown, and by about a fiftieth for money. */
export function stepped(value: number, kind: NumberKind, direction: 1 | -1): number {
  const shown = value * scaleOf(kind);
  const decimals = textOf(value, kind).split('.')[1]?.length ?? 0;
  const step =
    kind === 'money' && shown !== 0
      ? 10 ** Math.max(0, Math.floor(Math.log10(Math.abs(shown))) - 1)
      : 10 ** -decimals;
  return kept(Number((shown + direction * step).toFixed(decimals)), kind);
}

/** A schema's message, which speaks of what is kept, in the unit the field shows. */
export const inUnitShown = (message: string, kind: NumberKind): string =>
  kind === 'percent'
    ? message.replaceAll(/\d+(?:\.\d+)?/g, (figure) => `${textOf(Number(figure), kind)}\u00a0%`)
    : message;
