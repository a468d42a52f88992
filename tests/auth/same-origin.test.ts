import { describe, expect, it } from 'vitest';
import { sameOrigin } from '@/lib/auth/same-origin';
import { refusal } from '@/tests/support/refusal';

const OURS = 'http://localhost:3000';
const guard = (headers: Record<string, string>) => () => sameOrigin(new Headers(headers));

describe('the same-origin guard', () => {
  it.each([
    ['a browser that says so', { 'sec-fetch-site': 'same-origin' }],
    ['an older browser, by the Origin', { origin: OURS }],
  ])('lets our own pages through: %s', (_, headers) => {
    expect(guard(headers)).not.toThrow();
  });

  it.each([
    ['another site', { 'sec-fetch-site': 'cross-site', origin: OURS }],
    ['a neighbour under our domain', { 'sec-fetch-site': 'same-site', origin: OURS }],
    ['an address typed or a link', { 'sec-fetch-site': 'none' }],
    ['a value in capitals', { 'sec-fetch-site': 'SAME-ORIGIN' }],
    ['two values', { 'sec-fetch-site': 'same-origin, cross-site' }],
    ['an empty value', { 'sec-fetch-site': '', origin: OURS }],
    ['another origin', { origin: 'https://evil.example' }],
    ['our origin on another port', { origin: 'http://localhost:3001' }],
    ['our origin over another scheme', { origin: 'https://localhost:3000' }],
    ['an opaque origin', { origin: 'null' }],
    ['an origin that begins like ours', { origin: `${OURS}.evil.example` }],
    ['neither header', {}],
  ])('refuses %s', (_, headers) => {
    expect(refusal(guard(headers as Record<string, string>))[0]).toBe('forbidden');
  });
});
