const LONG = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});

/** A day as people write it: `2026-10-12` → `12 October 2026`. What is no day is shown as it is. */
export function printDay(isoDay: string): string {
  const day = new Date(`${isoDay}T00:00:00Z`);
  return Number.isNaN(day.getTime()) ? isoDay : LONG.format(day);
}

/** The day it is where the person is, as `2026-10-12`. */
export function todayHere(now: Date = new Date()): string {
  const two = (part: number) => String(part).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
