import { describe, expect, it } from 'vitest';
import { readLink, signLink } from '@/lib/auth/link-token';

const id = '3d5c1f0e-6a2b-4c7d-9e8f-0a1b2c3d4e5f';
const secret = 'a secret of the test, long enough';

describe('link tokens', () => {
  it('read back to the id they were signed for', () => {
    expect(readLink('invitation', signLink('invitation', id, secret), secret)).toBe(id);
  });

  it('are refused for another purpose, another secret and another id', () => {
    const token = signLink('reset', id, secret);
    expect(readLink('invitation', token, secret)).toBeNull();
    expect(readLink('reset', token, `${secret}.`)).toBeNull();
    expect(readLink('reset', token.replace(/^3/, '4'), secret)).toBeNull();
  });

  it('are refused when cut, lengthened or altered in any one character of the signature', () => {
    const token = signLink('reset', id, secret);
    expect(readLink('reset', token.slice(0, -1), secret)).toBeNull();
    expect(readLink('reset', `${token}a`, secret)).toBeNull();
    expect(readLink('reset', `${token}.x`, secret)).toBeNull();
    for (let at = id.length + 1; at < token.length; at += 1) {
      const other = token[at] === 'A' ? 'B' : 'A';
      expect(readLink('reset', token.slice(0, at) + other + token.slice(at + 1), secret)).toBeNull();
    }
  });

  it.each(['', '.', id, `${id}.`, 'not-an-id.abc'])('refuse %j', (token) => {
    expect(readLink('reset', token, secret)).toBeNull();
  });
});
