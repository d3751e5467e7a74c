/** A moment [s] since 1970-01-01T00:00Z, leap seconds not counted. */
export type Instant = number;

const form = /^(\d{4})-(\d\d)-(\d\d)[Tt](\d\d):(\d\d):(\d\d)(?:\.(\d{1,9}))?(?:[Zz]|([+-])(\d\d):(\d\d))$/;
const [minute, hour] = [60, 3600];
export const day = 86_400;

/** The moment of an RFC 3339 time; undefined where the text is none. @see references.Rfc3339 */
export function readInstant(text: string): Instant | undefined {
  const found = form.exec(text);
  if (found === null) return undefined;
  const [years, months, days, hours, minutes, seconds] = found.slice(1, 7).map(Number) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const [aheadHours, aheadMinutes] = [Number(found[9] ?? 0), Number(found[10] ?? 0)];
  if (months < 1 || months > 12 || days < 1 || days > daysOfMonth(years, months)) return undefined;
  if (hours > 23 || minutes > 59 || seconds > 60 || aheadHours > 23 || aheadMinutes > 59) return undefined;
  const ahead = (found[8] === '-' ? -1 : 1) * (aheadHours * hour + aheadMinutes * minute);
  const clock = hours * hour + minutes * minute + seconds + Number(`0.${found[7] ?? 0}`);
  return daysSince1970(years, months, days) * day + clock - ahead;
}

/** A moment as RFC 3339 text in UTC, to the second. */
export function instantText(instant: Instant): string {
  const days = Math.floor(instant / day);
  const { years, months, days: ofMonth } = civilDate(days);
  const clock = Math.floor(instant - days * day);
  const [hours, minutes, seconds] = [Math.floor(clock / hour), Math.floor((clock % hour) / minute), clock % minute];
  return `${padded(years, 4)}-${padded(months)}-${padded(ofMonth)}T${padded(hours)}:${padded(minutes)}:${padded(seconds)}Z`;
}

export interface CivilDate {
  readonly years: number;
  readonly months: number;
  readonly days: number;
}

/** Days from 1970-01-01 to a date of the Gregorian calendar; years begin in March, so that the leap day is the last of its year. */
export function daysSince1970(years: number, months: number, days: number): number {
  const marchYear = months > 2 ? years : years - 1;
  const leapDays = Math.floor(marchYear / 4) - Math.floor(marchYear / 100) + Math.floor(marchYear / 400);
  const ofYear = Math.floor((153 * ((months + 9) % 12) + 2) / 5) + days - 1;
  return marchYear * 365 + leapDays + ofYear - 719_468;
}

/** The date so many days after 1970-01-01. */
export function civilDate(days: number): CivilDate {
  let years = 1970 + Math.floor(days / 365.2425);
  while (daysSince1970(years, 1, 1) > days) years--;
  while (daysSince1970(years + 1, 1, 1) <= days) years++;
  let months = 12;
  while (daysSince1970(years, months, 1) > days) months--;
  return { years, months, days: days - daysSince1970(years, months, 1) + 1 };
}

export function daysOfMonth(years: number, months: number): number {
  const next = months === 12 ? daysSince1970(years + 1, 1, 1) : daysSince1970(years, months + 1, 1);
  return next - daysSince1970(years, months, 1);
}

function padded(figure: number, length = 2): string {
  return String(figure).padStart(length, '0');
}
