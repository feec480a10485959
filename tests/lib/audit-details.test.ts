import { describe, expect, it } from 'vitest';
import { inWords, presentAuditDetails } from '@/lib/presenters/audit-details';

describe('details of an audit event', () => {
  it.each([
    [{ role: { from: 'ta', to: 'head-ta' } }, ['role: ta → head-ta']],
    [{ sections: { from: [], to: ['A', 'B'] } }, ['sections: none → A, B']],
    [{ title: { from: 'Same', to: 'Same' }, invited: true, count: 3 }, ['invited: yes', 'count: 3']],
    [{ expiresAt: '2027-03-01T06:49:00.057Z' }, ['expires at: 2027-03-01 06:49 UTC']],
    [{ of: '3d5c1f0e-6a2b-4c7d-9e8f-0a1b2c3d4e5f' }, ['of: 3d5c1f0e…']],
    [{ by: 'send mail', note: null, nested: { deep: 1 } }, ['note: none']],
  ])('%j', (details, lines) => {
    expect(presentAuditDetails(details)).toEqual(lines);
  });

  it('have names in words', () => {
    expect(inWords('tasSeeOwnSectionsOnly')).toBe('tas see own sections only');
    expect(inWords('rule-on-answer')).toBe('rule on answer');
  });
});
