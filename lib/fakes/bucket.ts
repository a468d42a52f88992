import { createHash } from 'node:crypto';
import { http, HttpResponse, type RequestHandler } from 'msw';
import { openJournal } from './journal';

/** Any bucket at this address, addressed by path. No real host can have this name. */
export const FAKE_BUCKET_ENDPOINT = 'https://objects.leadline.invalid';

type Entry = { op: 'put'; key: string; base64: string; at: string } | { op: 'delete'; key: string };
type Stored = { bytes: Buffer; at: string };

const PAGE = 100;

/** A bucket as far as the product uses one: put, get, head, list in pages, delete. */
export function fakeBucket(dataFolder: string): RequestHandler[] {
  const journal = openJournal<Entry>(dataFolder, 'bucket');
  const objects = () => {
    const stored = new Map<string, Stored>();
    for (const entry of journal.read())
      if (entry.op === 'delete') stored.delete(entry.key);
      else stored.set(entry.key, { bytes: Buffer.from(entry.base64, 'base64'), at: entry.at });
    return stored;
  };
  const object = `${FAKE_BUCKET_ENDPOINT}/:bucket/*`;
  return [
    http.get(`${FAKE_BUCKET_ENDPOINT}/:bucket`, ({ request }) => listed(objects(), new URL(request.url))),
    http.get(`${FAKE_BUCKET_ENDPOINT}/:bucket/`, ({ request }) => listed(objects(), new URL(request.url))),
    http.put(object, async ({ request }) => {
      if (!isSigned(request)) return refused();
      const bytes = Buffer.from(await request.arrayBuffer());
      const base64 = bytes.toString('base64');
      journal.append({ op: 'put', key: keyOf(request), base64, at: new Date().toISOString() });
      return new HttpResponse(null, { status: 200, headers: { ETag: etagOf(bytes) } });
    }),
    http.head(object, ({ request }) => {
      const stored = objects().get(keyOf(request));
      return new HttpResponse(null, { status: stored ? 200 : 404 });
    }),
    http.get(object, ({ request }): Response => {
      if (!isSigned(request)) return refused();
      const stored = objects().get(keyOf(request));
      if (!stored) return HttpResponse.xml(error('NoSuchKey'), { status: 404 });
      return HttpResponse.arrayBuffer(new Uint8Array(stored.bytes).buffer, {
        headers: { ETag: etagOf(stored.bytes), 'Last-Modified': new Date(stored.at).toUTCString() },
      });
    }),
    http.delete(object, ({ request }) => {
      if (!isSigned(request)) return refused();
      journal.append({ op: 'delete', key: keyOf(request) });
      return new HttpResponse(null, { status: 204 });
    }),
  ];
}

const isSigned = (request: Request) => request.headers.get('authorization')?.startsWith('AWS4-HMAC-SHA256 ');
const refused = () => HttpResponse.xml(error('AccessDenied'), { status: 403 });
const error = (code: string) =>
  `<?xml version="1.0"?><Error><Code>${code}</Code><Message>${code}</Message></Error>`;
const etagOf = (bytes: Buffer) => `"${createHash('md5').update(bytes).digest('hex')}"`;
const keyOf = (request: Request) =>
  decodeURIComponent(new URL(request.url).pathname.split('/').slice(2).join('/'));

function listed(objects: Map<string, Stored>, url: URL): Response {
  const prefix = url.searchParams.get('prefix') ?? '';
  const after = url.searchParams.get('continuation-token') ?? '';
  const keys = [...objects.keys()].filter((key) => key.startsWith(prefix) && key > after).sort();
  const page = keys.slice(0, PAGE);
  const isCut = keys.length > page.length;
  const contents = page.map((key) => {
    const { bytes, at } = objects.get(key)!;
    return `<Contents><Key>${key}</Key><LastModified>${at}</LastModified><Size>${bytes.length}</Size></Contents>`;
  });
  const next = isCut ? `<NextContinuationToken>${page.at(-1)}</NextContinuationToken>` : '';
  return HttpResponse.xml(
    `<?xml version="1.0"?><ListBucketResult><IsTruncated>${isCut}</IsTruncated><KeyCount>${page.length}</KeyCount>${next}${contents.join('')}</ListBucketResult>`,
  );
}
