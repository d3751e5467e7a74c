import { civilDate, day, daysOfMonth, daysSince1970, type Instant } from './instant.ts';
import { groupFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

/** A day of some month and a time of it, UTC; hour 24 is the end of the day. */
export interface DayTime {
  readonly day: number;
  readonly hour: number;
  readonly minute: number;
}

const issueForm = /^(\d{2})(\d{2})(\d{2})Z$/;
const meantAsIssue = /^\d{4}(?:\d{2})?Z?$|^\d{5}Z$/;

/** The day and time of a group such as 011250Z; undefined where the group is not one. */
export function readIssueTime(token: Token): DayTime | ReportFault | undefined {
  const found = issueForm.exec(token.text);
  if (found !== null) return checkedDayTime(token, Number(found[1]), Number(found[2]), Number(found[3]), 23);
  return meantAsIssue.test(token.text)
    ? groupFault(token, 'unreadable', 'cannot be read as a day and time', 'six figures and Z, such as 011250Z')
    : undefined;
}

/** A day and time that exist, or the fault of the group they stand in; the end of a day may be written as hour 24. */
export function checkedDayTime(
  token: Token,
  days: number,
  hour: number,
  minute: number,
  lastHour: 23 | 24 = 24,
): DayTime | ReportFault {
  if (days < 1 || days > 31) {
    return groupFault(token, 'out-of-range', `has a day ${days}`, 'days 01 to 31');
  }
  if (hour > lastHour || minute > 59 || (hour === 24 && minute > 0)) {
    const at = `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`;
    return groupFault(token, 'out-of-range', `has a time ${at}`, `hours 00 to ${lastHour}, minutes 00 to 59`);
  }
  return { day: days, hour, minute };
}

/**
 * The moment nearest to another that has this day of the month and this time; of two as near the earlier.
 *
 * Months without such a day are passed over: two moments with the same day are at most 62 days apart.
 */
export function instantNear(time: DayTime, near: Instant): Instant {
  return moments(time, near).reduce((best, one) => (Math.abs(one - near) < Math.abs(best - near) ? one : best));
}

/** The first moment with this day and time that is not before another. */
export function instantFrom(time: DayTime, from: Instant): Instant {
  return moments(time, from).find((one) => one >= from) as Instant;
}

/** The moments with this day and time in the months around another, in order. */
function moments({ day: ofMonth, hour, minute }: DayTime, around: Instant): readonly Instant[] {
  const { years, months } = civilDate(Math.floor(around / day));
  const found: Instant[] = [];
  for (let step = -3; step <= 3; step++) {
    const year = years + Math.floor((months - 1 + step) / 12);
    const month = ((months + 11 + step) % 12) + 1;
    if (ofMonth > daysOfMonth(year, month)) continue;
    found.push(daysSince1970(year, month, ofMonth) * day + hour * 3600 + minute * 60);
  }
  return found;
}

/** How old a report is [s]; below 0 where it is of a later time. */
export function reportAge(issued: DayTime, asOf: Instant): number {
  return asOf - instantNear(issued, asOf);
}
