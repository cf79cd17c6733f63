import { money as inThousands } from '@steelyard/calc';
import { thin, thinly } from './spaces';

const symbols: Record<string, string> = { EUR: '€', GBP: '£', USD: '$' };

const wholeNumbers = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 0 });

/** Every unit of the currency counted, none in thousands: 490,255 €. */
export const exactMoney = (amount: number, currency: string): string =>
  `${wholeNumbers.format(amount)}${thin}${symbols[currency] ?? currency}`;

/** Thousands of the currency, as in 490 k€; whole units below ten thousand. */
export const money = (amount: number, currency: string): string => thinly(inThousands(amount, currency));
