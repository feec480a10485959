import { describe, expect, it } from 'vitest';
import { clientAddress } from '@/lib/auth/client-address';
import { safeNext } from '@/lib/auth/safe-next';

describe('where to go after signing in', () => {
  it.each(['/courses', '/work/abc?part=b', '/courses/1/roster?sort=name'])('keeps our own %j', (path) => {
    expect(safeNext(path)).toBe(path);
  });

  it.each([
    'https://elsewhere.example/',
    '//elsewhere.example/',
    '/\\elsewhere.example',
    '/\t/elsewhere.example',
    '/..//elsewhere.example',
    'courses',
    'javascript:alert(1)',
    '/sign-in?next=/courses',
    '/api/auth/signout',
    '',
    null,
    undefined,
    ['/courses'],
  ])('turns %j into the front door', (value) => {
    expect(safeNext(value)).toBe('/');
  });
});

describe('the address of a request', () => {
  it('is what the nearest proxy wrote, not what the client claimed', () => {
    expect(clientAddress(new Headers({ 'x-forwarded-for': '10.0.0.1, 198.51.100.7' }))).toBe('198.51.100.7');
    expect(clientAddress({ 'x-forwarded-for': ['203.0.113.9'] })).toBe('203.0.113.9');
    expect(clientAddress(new Headers())).toBe('unknown');
  });
});
