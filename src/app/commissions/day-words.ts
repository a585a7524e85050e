const MONTHS =
  'January February March April May June July August September October November December'.split(
    ' ',
  );
const WEEKDAYS = 'Sunday Monday Tuesday Wednesday Thursday Friday Saturday'.split(' ');
const DAY_MS = 86_400_000;

/** A calendar day as people say it: "14 March", and with the year when it is not this one. */
export function dayWords(day: Date, now: Date): string {
  const words = `${day.getDate()} ${MONTHS[day.getMonth()] ?? ''}`;
  return day.getFullYear() === now.getFullYear() ? words : `${words} ${day.getFullYear()}`;
}

/** A day in the past as people say it: "today", "yesterday", "Monday" within the last week, else the date. */
export function pastDayWords(day: Date, now: Date): string {
  const daysAgo = daysBetween(day, now);
  if (daysAgo === 0) return 'today';
  if (daysAgo === 1) return 'yesterday';
  if (daysAgo > 1 && daysAgo < 7) return WEEKDAYS[day.getDay()] ?? '';
  return dayWords(day, now);
}

/** Whole calendar days from one day to another, whatever the time of day; negative when `to` comes first. */
export function daysBetween(from: Date, to: Date): number {
  return Math.round((noonOf(to) - noonOf(from)) / DAY_MS);
}

/** "2027-03-14" as that day where the reader is, not as midnight in Greenwich. */
export function calendarDay(isoDate: string): Date {
  const [year, month, day] = isoDate.split('-').map(Number);
  return new Date(year ?? 0, (month ?? 1) - 1, day ?? 1, 12);
}

function noonOf(day: Date): number {
  return new Date(day.getFullYear(), day.getMonth(), day.getDate(), 12).getTime();
}
