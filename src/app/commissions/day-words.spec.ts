import { describe, expect, it } from 'vitest';
import { calendarDay, daysBetween, dayWords, pastDayWords } from './day-words';

const NOW = new Date(2027, 2, 10, 9, 30);

describe('days in words', () => {
  it('a day of this year needs no year', () => {
    expect(dayWords(calendarDay('2027-04-02'), NOW)).toBe('2 April');
    expect(dayWords(calendarDay('2028-01-31'), NOW)).toBe('31 January 2028');
  });

  it('late last night is yesterday, not today', () => {
    expect(pastDayWords(new Date(2027, 2, 9, 23, 59), NOW)).toBe('yesterday');
    expect(pastDayWords(new Date(2027, 2, 10, 0, 1), NOW)).toBe('today');
  });

  it('within the last week a day has its name, before that its date', () => {
    expect(pastDayWords(new Date(2027, 2, 5), NOW)).toBe('Friday');
    expect(pastDayWords(new Date(2027, 2, 3), NOW)).toBe('3 March');
  });

  it('a due date three days back is three days away whatever the hour', () => {
    expect(daysBetween(calendarDay('2027-03-07'), NOW)).toBe(3);
    expect(daysBetween(NOW, calendarDay('2027-03-07'))).toBe(-3);
  });
});
