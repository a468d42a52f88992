import type { IncomingMessage } from 'node:http';
import { describe, expect, it } from 'vitest';
import { rewriteForwarded, trustProxies } from '@/lib/cli/forwarded';

const origin = new URL('https://polls.courier.example');

/** The part of a request that is read and rewritten. */
function request(remoteAddress: string, headers: Record<string, string>): IncomingMessage {
  return {
    socket: { remoteAddress },
    headers: { host: 'evil.example', ...headers },
  } as unknown as IncomingMessage;
}

function rewritten(remoteAddress: string, headers: Record<string, string>, trusted: string[] = []) {
  const message = request(remoteAddress, headers);
  rewriteForwarded(message, origin, trustProxies(trusted));
  return message.headers;
}

describe('what a client says about itself', () => {
  it('is replaced by what the front knows', () => {
    const headers = rewritten('203.0.113.9', {
      'x-forwarded-for': '10.0.0.1',
      'x-forwarded-host': 'evil.example',
      'x-forwarded-proto': 'http',
    });
    expect(headers).toEqual({
      host: 'polls.courier.example',
      'x-forwarded-host': 'polls.courier.example',
      'x-forwarded-proto': 'https',
      'x-forwarded-for': '203.0.113.9',
    });
  });

  it('never carries a nonce, a policy or a word of the framework’s own', () => {
    const headers = rewritten('203.0.113.9', {
      'x-nonce': 'known',
      'content-security-policy': "script-src 'nonce-known'",
      'x-middleware-subrequest': 'proxy',
      forwarded: 'for=10.0.0.1',
      'x-real-ip': '10.0.0.1',
      accept: 'text/html',
    });
    expect(Object.keys(headers).sort()).toEqual([
      'accept',
      'host',
      'x-forwarded-for',
      'x-forwarded-host',
      'x-forwarded-proto',
    ]);
  });

  it('is written plainly for an IPv4 client on a socket of both families', () => {
    expect(rewritten('::ffff:203.0.113.9', {})['x-forwarded-for']).toBe('203.0.113.9');
  });
});

describe('a trusted proxy', () => {
  const trusted = ['192.0.2.7', '10.0.0.0/8', '2001:db8::/32'];
  const clientOf = (peer: string, chain: string) =>
    rewritten(peer, { 'x-forwarded-for': chain }, trusted)['x-forwarded-for'];

  it('is believed about the client it speaks for', () => {
    expect(clientOf('192.0.2.7', '203.0.113.9')).toBe('203.0.113.9');
    expect(clientOf('::ffff:10.2.3.4', '203.0.113.9')).toBe('203.0.113.9');
    expect(clientOf('2001:db8::1', '203.0.113.9')).toBe('203.0.113.9');
  });

  it('is not believed about what the client itself wrote before', () => {
    expect(clientOf('192.0.2.7', '198.51.100.1, 203.0.113.9')).toBe('203.0.113.9');
    expect(clientOf('192.0.2.7', '203.0.113.9, 10.0.0.5')).toBe('203.0.113.9');
  });

  it('counts itself as the client when it names none', () => {
    expect(clientOf('192.0.2.7', '')).toBe('192.0.2.7');
    expect(clientOf('192.0.2.7', 'unknown')).toBe('192.0.2.7');
  });

  it('must be named by an address or a network', () => {
    for (const entry of ['proxy.example', '10.0.0.0/33', '10.0.0.0/', '10.0.0.0/8x']) {
      const expected = `trustProxies requires addresses or networks, not "${entry}"`;
      expect(() => trustProxies([entry])).toThrow(new RangeError(expected));
    }
  });
});
