import { describe, expect, it } from 'vitest';
import { contentSecurityPolicy } from '@/lib/auth/content-security-policy';
import { checkOrigin, refuseForeignOrigin } from '@/lib/auth/origin';

const request = (method: string, headers: Record<string, string>) => ({ method, headers: new Headers(headers) });
const allowed = (method: string, headers: Record<string, string>, appUrl: string | undefined) =>
  checkOrigin(request(method, headers), appUrl).allowed;

const cookie = 'session=x';
const site = 'https://marks.example.org';

describe('checkOrigin', () => {
  it('lets everything through that changes nothing or bears no cookie', () => {
    for (const method of ['GET', 'HEAD', 'OPTIONS', 'get'])
      expect(allowed(method, { cookie, origin: 'https://other.example' }, site)).toBe(true);
    expect(allowed('POST', { authorization: 'Bearer x' }, site)).toBe(true);
  });

  it('lets our own pages change things', () => {
    for (const method of ['POST', 'PUT', 'PATCH', 'DELETE'])
      expect(allowed(method, { cookie, origin: site, host: 'inner:3000' }, site)).toBe(true);
    expect(allowed('POST', { cookie, origin: 'https://marks.example.org:443' }, site)).toBe(true);
  });

  it('refuses another site, a hidden origin and a missing one', () => {
    for (const origin of [
      'https://other.example',
      'http://marks.example.org',
      'https://marks.example.org:8443',
      'https://marks.example.org.evil.example',
      'null',
      '',
      'not an address',
    ]) {
      expect(allowed('POST', { cookie, origin, host: 'marks.example.org' }, site), origin).toBe(false);
    }
    expect(allowed('POST', { cookie, host: 'marks.example.org' }, site)).toBe(false);
    expect(allowed('POST', { cookie, referer: `${site}/x`, host: 'marks.example.org' }, site)).toBe(false);
  });

  it('takes the host for ours only while the address is on loopback or missing', () => {
    const headers = { cookie, origin: 'http://127.0.0.1:3000', host: '127.0.0.1:3000' };
    expect(allowed('POST', headers, 'http://localhost:3000')).toBe(true);
    expect(allowed('POST', headers, '')).toBe(true);
    expect(allowed('POST', headers, site)).toBe(false);
    expect(allowed('POST', { ...headers, host: 'localhost:3000' }, 'http://localhost:3000')).toBe(false);
  });
});

describe('refuseForeignOrigin', () => {
  it('answers problem+json that says what to do', async () => {
    const refusal = refuseForeignOrigin(request('POST', { cookie, origin: 'https://other.example' }), site);
    expect(refusal?.status).toBe(403);
    expect(refusal?.headers.get('content-type')).toBe('application/problem+json');
    const problem: unknown = await refusal?.json();
    expect(problem).toMatchObject({ status: 403, code: 'cross-origin' });
    expect(refuseForeignOrigin(request('POST', { cookie, origin: site }), site)).toBeNull();
  });
});

describe('contentSecurityPolicy', () => {
  it('allows no inline script, no eval, no frame and no other host', () => {
    const policy = contentSecurityPolicy('bm9uY2U=', false);
    const directives = new Map(policy.split('; ').map((part) => [part.split(' ')[0], part.split(' ').slice(1)]));
    expect(directives.get('script-src')).toEqual(["'self'", "'nonce-bm9uY2U='", "'strict-dynamic'"]);
    expect(directives.get('frame-ancestors')).toEqual(["'none'"]);
    expect(directives.get('base-uri')).toEqual(["'none'"]);
    expect(directives.get('style-src-attr')).toEqual(["'unsafe-inline'"]);
    const unsafe = [...directives].filter(([, values]) => values.some((value) => value.startsWith("'unsafe")));
    expect(unsafe.map(([name]) => name)).toEqual(['style-src-attr']);
    expect(policy).not.toMatch(/https?:|\*/);
  });
});
