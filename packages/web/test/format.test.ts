import { describe, expect, it } from 'vitest';
import { capitalised, counted, list } from '../src/shared/format/lists';
import { exactMoney, money } from '../src/shared/format/money';
import { count, figure, months, percent, power, withUnit } from '../src/shared/format/numbers';
import { ago } from '../src/shared/format/times';
import { initialsOf } from '../src/shared/ui/initials';

const thin = '\u00a0';

describe('Numbers', () => {
  it('are counted with a comma for the thousands', () => {
    expect(count(1760)).toBe('1,760');
    expect(count(40.92)).toBe('41');
  });

  it('become percentages with as many places as they have', () => {
    expect(percent(0.9)).toBe(`90${thin}%`);
    expect(percent(0.125, 2)).toBe(`12.5${thin}%`);
  });

  it('show power to one place and never as certain', () => {
    expect(power(0.81269)).toBe(`81.3${thin}%`);
    expect(power(0.8)).toBe(`80.0${thin}%`);
    expect(power(0.99996)).toBe(`99.9${thin}%`);
    expect(power(1)).toBe(`100.0${thin}%`);
  });

  it('keep six significant digits and a true minus', () => {
    expect(figure(0.29698484809834996)).toBe('0.296985');
    expect(figure(-1)).toBe('−1');
    expect(figure(332_789.39)).toBe('332,789');
  });

  it('stay with their unit', () => {
    expect(withUnit('13', 'g/L')).toBe(`13${thin}g/L`);
    expect(withUnit('0.04', '')).toBe('0.04');
  });

  it('give months to one place', () => {
    expect(months(40.924)).toBe('40.9');
    expect(months(18)).toBe('18');
  });
});

describe('Money', () => {
  it('is shown in thousands from ten thousand on', () => {
    expect(money(490_254.61, 'EUR')).toBe(`490${thin}k€`);
    expect(money(9_500, 'GBP')).toBe(`9,500${thin}£`);
  });

  it('is exact where asked, in any currency', () => {
    expect(exactMoney(490_254.61, 'EUR')).toBe(`490,255${thin}€`);
    expect(exactMoney(1_000, 'SEK')).toBe(`1,000${thin}SEK`);
  });
});

describe('Times', () => {
  const now = Date.parse('2026-12-01T12:00:00Z');

  it.each([
    ['2026-12-01T11:59:30Z', 'just now'],
    ['2026-12-01T12:05:00Z', 'just now'],
    ['2026-12-01T11:15:00Z', '45 minutes ago'],
    ['2026-12-01T09:00:00Z', '3 hours ago'],
    ['2026-11-30T11:00:00Z', 'yesterday'],
    ['2026-11-20T12:00:00Z', '11 days ago'],
    ['2026-11-01T12:00:00Z', '4 weeks ago'],
    ['2026-06-01T12:00:00Z', '6 months ago'],
    ['2023-11-30T12:00:00Z', '3 years ago'],
  ])('say how long ago %s was', (iso, words) => {
    expect(ago(iso, now)).toBe(words);
  });
});

describe('Words', () => {
  it('are listed with an and', () => {
    expect(list([])).toBe('');
    expect(list(['A'])).toBe('A');
    expect(list(['A', 'B', 'C'])).toBe('A, B and C');
  });

  it('are counted in words up to nine', () => {
    expect(counted(1, 'option', 'options')).toBe('one option');
    expect(counted(3, 'option', 'options')).toBe('three options');
    expect(counted(12, 'option', 'options')).toBe('12 options');
  });

  it('begin with a capital', () => {
    expect(capitalised('girls')).toBe('Girls');
  });

  it('shrink to initials', () => {
    expect(initialsOf('Amara Doss')).toBe('AD');
    expect(initialsOf('Jan van der Veen')).toBe('JV');
    expect(initialsOf('Émile')).toBe('É');
  });
});
