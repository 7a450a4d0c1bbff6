const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
const MOMENT = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
});

/** The day on which a moment falls where the reader is: `12 October 2026`. What is no moment is shown as it is. */
export function printMomentDay(iso: string): string {
  return print(DAY, iso);
}

/** A moment where the reader is, to the minute: `12 October 2026 at 14:05`. What is no moment is shown as it is. */
export function printMoment(iso: string): string {
  return print(MOMENT, iso);
}

function print(format: Intl.DateTimeFormat, iso: string): string {
  const moment = new Date(iso);
  return Number.isNaN(moment.getTime()) ? iso : format.format(moment);
}
