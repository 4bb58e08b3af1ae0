/** The shop's own date, ISO: expiry is judged by its calendar, wherever the reader is. */
export function shopDay(timeZone: string, now: Date = new Date()): string {
  return new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).format(now);
}

const DAY: Intl.DateTimeFormatOptions = { day: 'numeric', month: 'short', year: 'numeric' };

/** "31 Mar 2027", from an ISO date. */
export function dayWords(isoDate: string): string {
  return new Intl.DateTimeFormat('en-GB', { ...DAY, timeZone: 'UTC' }).format(
    new Date(`${isoDate}T00:00:00Z`),
  );
}

/** "today 10:42" or "31 Mar 2027", in the shop's own time. */
export function whenWords(isoTime: string, timeZone: string, now: Date = new Date()): string {
  const time = new Date(isoTime);
  if (shopDay(timeZone, time) !== shopDay(timeZone, now))
    return new Intl.DateTimeFormat('en-GB', { ...DAY, timeZone }).format(time);
  const clock = { timeZone, hour: '2-digit', minute: '2-digit' } as const;
  return `today ${new Intl.DateTimeFormat('en-GB', clock).format(time)}`;
}
