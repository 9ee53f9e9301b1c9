const weekdays = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday'];
const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

/** A calendar day, YYYY-MM-DD, as "Friday 2 October 2027". Text that is no day is answered unchanged. */
export function writeDay(day: string): string {
  const found = /^(\d{4})-(\d\d)-(\d\d)$/.exec(day);
  const [year, month, date] = (found?.slice(1) ?? []).map(Number);
  if (year === undefined || month === undefined || date === undefined) return day;
  // Reckoned in UTC on purpose: a calendar day has no zone.
  const weekday = weekdays[new Date(Date.UTC(year, month - 1, date)).getUTCDay()];
  return `${weekday} ${date} ${months[month - 1]} ${year}`;
}

/**
 * An instant (ISO 8601) as day and time in a time zone, "Friday 18 September 2027 at 09:12". A zone this machine does
 * not know is taken as UTC and said so. The words are our own, since those of a locale differ between machines.
 */
export function writeMoment(instant: string, timeZone: string): string {
  const zone = isKnownZone(timeZone) ? timeZone : 'UTC';
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone: zone,
    calendar: 'gregory',
    numberingSystem: 'latn',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).formatToParts(new Date(instant));
  const part = (type: string): string => parts.find((entry) => entry.type === type)?.value ?? '';
  const day = writeDay(`${part('year').padStart(4, '0')}-${part('month')}-${part('day')}`);
  return `${day} at ${part('hour')}:${part('minute')}${zone === timeZone ? '' : ' UTC'}`;
}

function isKnownZone(timeZone: string): boolean {
  try {
    new Intl.DateTimeFormat('en-GB', { timeZone });
    return true;
  } catch {
    return false;
  }
}
