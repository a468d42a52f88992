import type { IncomingMessage } from 'node:http';
import { BlockList, isIP } from 'node:net';

/** @throws RangeError `trustProxies requires addresses or networks, not "…"` */
export function trustProxies(entries: readonly string[]): (address: string) => boolean {
  const list = new BlockList();
  for (const entry of entries) {
    const [address = '', bits] = entry.split('/');
    const family = isIP(address) === 6 ? 'ipv6' : 'ipv4';
    const length = bits !== undefined && /^\d{1,3}$/.test(bits) ? Number(bits) : NaN;
    const isNetwork = length <= (family === 'ipv6' ? 128 : 32);
    if (isIP(address) === 0 || (bits !== undefined && !isNetwork)) {
      throw new RangeError(`trustProxies requires addresses or networks, not "${entry}"`);
    }
    if (bits === undefined) list.addAddress(address, family);
    else list.addSubnet(address, length, family);
  }
  return (address) => isIP(address) !== 0 && list.check(address, isIP(address) === 6 ? 'ipv6' : 'ipv4');
}

/**
 * What a client says about itself is thrown away and written anew, so that whoever reads these headers
 * later (throttling, the same-origin guard of actions) reads only what the front knows.
 */
export function rewriteForwarded(
  request: IncomingMessage,
  origin: URL,
  isTrusted: (address: string) => boolean,
): void {
  const peer = plainAddress(request.socket.remoteAddress ?? '');
  const client = isTrusted(peer) ? clientBehind(request.headers['x-forwarded-for'], peer, isTrusted) : peer;
  for (const name of Object.keys(request.headers)) {
    if (clientMayNotSet.test(name)) delete request.headers[name];
  }
  request.headers.host = origin.host;
  request.headers['x-forwarded-host'] = origin.host;
  request.headers['x-forwarded-proto'] = origin.protocol.slice(0, -1);
  request.headers['x-forwarded-for'] = client;
}

const clientMayNotSet =
  /^(forwarded|x-forwarded-.*|x-real-ip|x-nonce|x-middleware-.*|content-security-policy)$/;

/** The last address that no trusted proxy wrote about another trusted proxy. */
function clientBehind(
  header: string | string[] | undefined,
  peer: string,
  isTrusted: (address: string) => boolean,
): string {
  const chain = [header ?? []]
    .flat()
    .join(',')
    .split(',')
    .map((part) => plainAddress(part.trim()));
  for (const address of chain.reverse()) {
    if (isIP(address) === 0) break;
    if (!isTrusted(address)) return address;
  }
  return peer;
}

/** An IPv4 client on a socket of both families arrives as ::ffff:192.0.2.1. */
function plainAddress(address: string): string {
  return address.startsWith('::ffff:') && isIP(address.slice(7)) === 4 ? address.slice(7) : address;
}
