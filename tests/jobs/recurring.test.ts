import { describe, expect, it } from 'vitest';
import { jobHandlers, recurringJobs } from '@/lib/jobs/registry';
import { parsePayload } from '@/lib/queue/jobs';

describe('jobs put in by the clock', () => {
  it.each(recurringJobs.map(({ name }) => name))('%s takes what the queue’s clock hands it', (name) => {
    expect(parsePayload(name, { _cron: { ts: '2026-12-01T06:30:00.000Z', backfilled: false } })).toEqual({});
    expect(jobHandlers[name]).toBeTypeOf('function');
  });
});
