const relative = new Intl.RelativeTimeFormat('en-GB', { numeric: 'auto' });
const dateAndTime = new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeStyle: 'short' });
const dateOnly = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', second: '2-digit' });

const minute = 60;
const hour = 60 * minute;
const day = 24 * hour;
const steps: [unit: Intl.RelativeTimeFormatUnit, seconds: number, below: number][] = [
  ['minute', minute, hour],
  ['hour', hour, day],
  ['day', day, 14 * day],
  ['week', 7 * day, 60 * day],
  ['month', 30.44 * day, 730 * day],
  ['year', 365.25 * day, Number.POSITIVE_INFINITY],
];

/** “3 days ago”, as seen at `now`. */
export function ago(iso: string, now: number): string {
  const seconds = Math.max(0, (now - Date.parse(iso)) / 1000);
  if (seconds < minute) return 'just now';
  const [unit, length] = steps.find(([, , below]) => seconds < below) as (typeof steps)[number];
  return relative.format(-Math.floor(seconds / length), unit);
}

/** “Thursday 12 November 2026 at 14:05”. */
export const fullDate = (iso: string): string => dateAndTime.format(new Date(iso));

/** “12 Nov 2026”. */
export const shortDate = (iso: string): string => dateOnly.format(new Date(iso));

/** “14:05:30”. */
export const timeOfDay = (at: number): string => clock.format(at);
