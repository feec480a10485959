/**
 * Times as people of a course write them ("2026-12-04T18:00" in Europe/London) and instants. The rules of a zone are the
 * platform's own (IANA time zone database by Intl).
 */

const localPattern = /^(\d{4})-(\d{2})-(\d{2})T(\d{2}):(\d{2})$/;

/**
 * The instant of a local time in a zone; null for what is no date and time. A time that occurs twice (clocks go back) is
 * the earlier one; a time that does not occur (clocks go forward) is taken as if the clock had not moved yet.
 */
export function instantOf(local: string, zone: string): Date | null {
  const match = localPattern.exec(local.trim());
  if (match === null) return null;
  const [year, month, day, hour, minute] = match.slice(1).map(Number) as [number, number, number, number, number];
  const wall = Date.UTC(year, month - 1, day, hour, minute);
  const written = new Date(wall);
  const isReal = written.getUTCMonth() === month - 1 && written.getUTCDate() === day && hour < 24 && minute < 60;
  if (!isReal) return null;
  const dayBefore = wall - 86_400_000;
  const dayAfter = wall + 86_400_000;
  const candidates = [offsetAt(dayBefore, zone), offsetAt(dayAfter, zone)].map((offset) => wall - offset);
  const exact = candidates.filter((instant) => instant + offsetAt(instant, zone) === wall);
  return new Date(exact.length > 0 ? Math.min(...exact) : candidates[0]!);
}

/** A local time in a zone, as a form's date-and-time field holds it: "2026-12-04T18:00"; seconds are cut off. */
export function localOf(instant: Date, zone: string): string {
  const wall = new Date(instant.getTime() + offsetAt(instant.getTime(), zone));
  return wall.toISOString().slice(0, 16);
}

/** Whether the platform knows a zone by that name. */
export function isTimeZone(zone: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}

/** How far a zone's clocks are ahead of UTC at an instant, in milliseconds; whole seconds. */
function offsetAt(instant: number, zone: string): number {
  const parts = formatterOf(zone).formatToParts(new Date(instant));
  const field = (type: Intl.DateTimeFormatPartTypes) => Number(parts.find((part) => part.type === type)?.value);
  const wall = Date.UTC(
    field('year'),
    field('month') - 1,
    field('day'),
    field('hour'),
    field('minute'),
    field('second'),
  );
  return wall - Math.floor(instant / 1000) * 1000;
}

const formatters = new Map<string, Intl.DateTimeFormat>();

/** Making a formatter is slow, so there is one a zone; there are fewer than a thousand zones. */
function formatterOf(zone: string): Intl.DateTimeFormat {
  let formatter = formatters.get(zone);
  if (formatter === undefined) {
    formatter = new Intl.DateTimeFormat('en-GB', {
      timeZone: zone,
      hourCycle: 'h23',
      year: 'numeric',
      month: '2-digit',
      day: '2-digit',
      hour: '2-digit',
      minute: '2-digit',
      second: '2-digit',
    });
    formatters.set(zone, formatter);
  }
  return formatter;
}
