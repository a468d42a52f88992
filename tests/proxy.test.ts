import { NextRequest } from 'next/server';
import { describe, expect, it } from 'vitest';
import { config, contentPolicy, proxy } from '@/proxy';

const answer = (headers: Record<string, string> = {}) =>
  proxy(new NextRequest('http://localhost:3000/releases', { headers }));
const nonceOf = (policy: string | null) => /'nonce-([^']+)'/.exec(policy ?? '')?.[1];
const matched = (path: string) => config.matcher.some((pattern) => new RegExp(`^${pattern}$`).test(path));

describe('the headers of a desk page', () => {
  it('carry a new nonce each time, the same one for the page and the browser', () => {
    const [first, second] = [answer(), answer()];
    const nonce = nonceOf(first.headers.get('content-security-policy'));
    expect(nonce).toMatch(/^[A-Za-z0-9+/]{22}==$/);
    expect(first.headers.get('x-middleware-request-x-nonce')).toBe(nonce);
    expect(nonceOf(second.headers.get('content-security-policy'))).not.toBe(nonce);
  });

  it('are the same for a request that claims to be a prefetch', () => {
    const prefetch = answer({ 'next-router-prefetch': '1', purpose: 'prefetch' });
    expect(prefetch.headers.get('content-security-policy')).toContain("frame-ancestors 'none'");
  });

  it('replace a nonce that a client brought along', () => {
    expect(answer({ 'x-nonce': 'known' }).headers.get('x-middleware-request-x-nonce')).not.toBe('known');
  });

  it('keep the page out of every cache', () => {
    expect(answer().headers.get('cache-control')).toBe('private, no-store');
  });
});

describe('the policy', () => {
  it('allows no script and no style sheet without the nonce', () => {
    const policy = contentPolicy('abc', false);
    expect(policy).toContain("script-src 'self' 'nonce-abc' 'strict-dynamic';");
    expect(policy).toContain("style-src 'self' 'nonce-abc';");
    expect(policy.replace("style-src-attr 'unsafe-inline'", '')).not.toContain('unsafe');
  });

  it('lets the overlay of the development server in, and only there', () => {
    expect(contentPolicy('abc', true)).toContain("'unsafe-eval'");
    expect(contentPolicy('abc', false)).not.toContain("'unsafe-eval'");
  });
});

describe('the paths it covers', () => {
  it('are all but public charts and files that never change', () => {
    expect(
      ['/', '/embeds', '/releases/abc', '/sign-in', '/api/v1/check'].filter((path) => !matched(path)),
    ).toEqual([]);
    const open = ['/embed/abc', '/embed/abc/chart.svg', '/oembed', '/_next/static/a.js', '/favicon.svg'];
    expect(open.filter(matched)).toEqual([]);
  });
});
