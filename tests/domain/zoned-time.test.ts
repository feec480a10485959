import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { instantOf, isTimeZone, localOf } from '@/lib/domain/zoned-time';

const iso = (local: string, zone: string) => instantOf(local, zone)?.toISOString();

describe('instantOf', () => {
  it.each([
    // Local time, zone, instant: offsets as published for these zones in 2026.
    ['2026-12-04T18:00', 'UTC', '2026-12-04T18:00:00.000Z'],
    ['2026-12-04T18:00', 'Europe/London', '2026-12-04T18:00:00.000Z'],
    ['2026-06-04T18:00', 'Europe/London', '2026-06-04T17:00:00.000Z'],
    ['2026-12-04T18:00', 'America/New_York', '2026-12-04T23:00:00.000Z'],
    ['2026-12-04T18:00', 'Asia/Kolkata', '2026-12-04T12:30:00.000Z'],
    ['2026-12-04T18:00', 'Pacific/Auckland', '2026-12-04T05:00:00.000Z'],
  ])('reads %s in %s as %s', (local, zone, instant) => {
    expect(iso(local, zone)).toBe(instant);
  });

  it('takes the earlier of a time that occurs twice', () => {
    // Clocks in London go back from 02:00 to 01:00 on 25 October 2026.
    expect(iso('2026-10-25T01:30', 'Europe/London')).toBe('2026-10-25T00:30:00.000Z');
    expect(iso('2026-10-25T02:30', 'Europe/London')).toBe('2026-10-25T02:30:00.000Z');
  });

  it('takes a time that does not occur as if the clock had not moved', () => {
    // Clocks in London go forward from 01:00 to 02:00 on 29 March 2026.
    expect(iso('2026-03-29T01:30', 'Europe/London')).toBe('2026-03-29T01:30:00.000Z');
  });

  it.each(['', 'tomorrow', '2026-02-30T10:00', '2026-12-04T24:00', '2026-12-04T10:60', '2026-12-04'])(
    'refuses %j',
    (local) => {
      expect(instantOf(local, 'UTC')).toBeNull();
    },
  );

  it('gives an instant of whole minutes back from its local time, but for the hour that occurs twice', () => {
    const zones = fc.constantFrom('UTC', 'Europe/Oslo', 'America/Los_Angeles', 'Asia/Kathmandu', 'Australia/Lord_Howe');
    const minutes = fc.integer({ min: Date.UTC(2025, 0) / 60_000, max: Date.UTC(2030, 0) / 60_000 });
    fc.assert(
      fc.property(minutes, zones, (minute, zone) => {
        const instant = new Date(minute * 60_000);
        const local = localOf(instant, zone);
        const back = instantOf(local, zone);
        return back !== null && localOf(back, zone) === local && back <= instant;
      }),
    );
  });

  it('knows a zone from a name that is none', () => {
    expect(isTimeZone('Europe/Oslo')).toBe(true);
    expect(isTimeZone('Middle/Earth')).toBe(false);
  });
});
