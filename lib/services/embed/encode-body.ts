import 'server-only';
import { brotliCompressSync, constants, gzipSync } from 'node:zlib';

/** How a body travels; `identity` is as it is. */
export type Encoding = 'br' | 'gzip' | 'identity';

/** The best encoding that a client says it takes (RFC 9110, section 12.5.3); one given weight 0 is not taken. */
export function encodingFor(acceptEncoding: string | undefined): Encoding {
  const taken = new Set(
    (acceptEncoding ?? '')
      .toLowerCase()
      .split(',')
      .map((one) => one.split(';').map((part) => part.trim()))
      .filter(([, weight]) => !/^q=0(\.0*)?$/.test(weight ?? ''))
      .map(([name]) => name),
  );
  return taken.has('br') ? 'br' : taken.has('gzip') ? 'gzip' : 'identity';
}

/** The bytes of a body in an encoding. Slow on purpose: done once a body, then kept. */
export function encodeBody(body: Buffer, encoding: Encoding): Buffer {
  if (encoding === 'gzip') return gzipSync(body, { level: 9 });
  if (encoding === 'identity') return body;
  return brotliCompressSync(body, {
    params: { [constants.BROTLI_PARAM_QUALITY]: 9, [constants.BROTLI_PARAM_SIZE_HINT]: body.byteLength },
  });
}
