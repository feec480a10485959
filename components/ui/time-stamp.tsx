export type TimeStyle = 'full' | 'short' | 'date' | 'clock';

const styles: Record<TimeStyle, Intl.DateTimeFormatOptions> = {
  full: { weekday: 'long', day: 'numeric', month: 'long', hour: '2-digit', minute: '2-digit' },
  short: { day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit' },
  date: { day: 'numeric', month: 'long', year: 'numeric' },
  clock: { hour: '2-digit', minute: '2-digit' },
};

/**
 * A moment in words, in the given zone: "Friday 4 December, 18:00".
 *
 * @param at the moment
 * @param zone an IANA name, e.g. the course's own "Europe/Oslo"
 */
export function formatTime(at: Date, zone: string, style: TimeStyle): string {
  return new Intl.DateTimeFormat('en-GB', { ...styles[style], hour12: false, timeZone: zone })
    .format(at)
    .replace(' at ', ', ');
}

export interface TimeStampProps {
  readonly at: Date | string;
  /** The course's zone; times of one course read the same for everyone in it. */
  readonly zone: string;
  readonly style?: TimeStyle;
}

/** A moment, written by the server in the course's zone; its title names the zone and the year. */
export function TimeStamp({ at, zone, style = 'full' }: TimeStampProps) {
  const moment = typeof at === 'string' ? new Date(at) : at;
  const exact = new Intl.DateTimeFormat('en-GB', {
    dateStyle: 'full',
    timeStyle: 'long',
    timeZone: zone,
  }).format(moment);
  return (
    <time dateTime={moment.toISOString()} title={exact} className="sm:whitespace-nowrap">
      {formatTime(moment, zone, style)}
    </time>
  );
}
