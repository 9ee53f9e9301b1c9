import { NextRequest } from 'next/server';
import { describe, expect, it } from 'vitest';
import { config, proxy } from '@/proxy';

const ask = (path: string, headers: Record<string, string> = {}) =>
  proxy(new NextRequest(`http://league.example${path}`, { headers }));
/** Next carries changed request headers to the page under this prefix. */
const onRequest = (response: Response, name: string) => response.headers.get(`x-middleware-request-${name}`);

describe('what every request is given', () => {
  it('a page gets a policy with a nonce of its own, the same on request and response', () => {
    const [first, second] = [ask('/'), ask('/')];
    const policy = first.headers.get('content-security-policy') ?? '';
    const nonce = onRequest(first, 'x-nonce');
    expect(policy).toContain(`script-src 'self' 'nonce-${nonce}' 'strict-dynamic'`);
    expect(policy).toContain(`style-src 'self' 'nonce-${nonce}'`);
    expect(onRequest(first, 'content-security-policy')).toBe(policy);
    expect(onRequest(second, 'x-nonce')).not.toBe(nonce);
  });

  it('the policy lets no inline script, frame, plug-in or foreign form through', () => {
    const policy = ask('/').headers.get('content-security-policy') ?? '';
    expect(policy).not.toMatch(/script-src[^;]*unsafe/);
    for (const rule of [
      "frame-ancestors 'none'",
      "object-src 'none'",
      "base-uri 'none'",
      "form-action 'self'",
    ]) {
      expect(policy).toContain(rule);
    }
  });

  it('an id, on page and API alike, that a caller cannot choose', () => {
    for (const path of ['/', '/api/v1/roster-checks']) {
      const response = ask(path, { 'x-request-id': 'mine', 'x-nonce': 'mine' });
      const id = response.headers.get('x-request-id');
      expect(id).toMatch(/^[0-9a-f-]{36}$/);
      expect(onRequest(response, 'x-request-id')).toBe(id);
      if (path === '/') expect(onRequest(response, 'x-nonce')).not.toBe('mine');
    }
  });

  it('answers of the API carry no page policy', () => {
    expect(ask('/api/v1/rule-catalogue').headers.get('content-security-policy')).toBeNull();
  });

  it('covers pages and API, and leaves the built files alone', () => {
    const covers = new RegExp(`^${config.matcher[0]}$`);
    for (const path of ['/', '/tern/autumn/teams', '/api/v1/openapi.json', '/fontsmith']) {
      expect(covers.test(path), path).toBe(true);
    }
    for (const path of ['/_next/static/a.js', '/fonts/licences/archivo.txt', '/samples/a.csv', '/icon.svg']) {
      expect(covers.test(path), path).toBe(false);
    }
  });
});
