/** RFC 3339 section 5.6: full date and time, `T`/`Z` in either case, any fraction, offset required. */
const RFC3339 =
  /^(\d{4})-(\d{2})-(\d{2})[Tt](\d{2}):(\d{2}):(\d{2})(\.\d+)?([Zz]|[+-](\d{2}):(\d{2}))$/;

/**
 * Reads an RFC 3339 instant as epoch milliseconds; null if the text is not one.
 * A leap second (`:60`, UTC 23:59:60 only) is the first instant of the next minute, as POSIX time has
 * none; fractions below a millisecond are cut off.
 *
 * Source: RFC 3339 sections 5.6 and 5.7.
 */
export function instantMs(text: string): number | null {
  const match = RFC3339.exec(text);
  if (!match) return null;
  const [year, month, day, hour, minute, second] = match.slice(1, 7).map(Number) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const [offsetHour, offsetMinute] = [Number(match[9] ?? 0), Number(match[10] ?? 0)];
  if (hour > 23 || minute > 59 || second > 60 || offsetHour > 23 || offsetMinute > 59) return null;
  if (month < 1 || month > 12 || day < 1 || day > daysIn(year, month)) return null;
  const offsetMs = (match[8]?.startsWith("-") ? -1 : 1) * (offsetHour * 60 + offsetMinute) * 60_000;
  const wholeMs = utcMs(year, month, day) + ((hour * 60 + minute) * 60 + second) * 1000 - offsetMs;
  if (second === 60 && wholeMs % DAY_MS !== 0) return null;
  return wholeMs + Number((match[7] ?? ".0").slice(1, 4).padEnd(3, "0"));
}

/** Says whether the text is an RFC 3339 instant. */
export function isInstant(text: string): boolean {
  return instantMs(text) !== null;
}

const DAY_MS = 86_400_000;

/** Midnight UTC of a day; unlike `Date.UTC` it takes years below 100 as they are. */
function utcMs(year: number, month: number, day: number): number {
  return new Date(0).setUTCFullYear(year, month - 1, day);
}

function daysIn(year: number, month: number): number {
  return new Date(utcMs(year, month + 1, 0)).getUTCDate();
}
