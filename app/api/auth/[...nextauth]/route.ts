import NextAuth from 'next-auth';
import { authOptions } from '@/lib/auth/options';

const handler: (request: Request, context: unknown) => Promise<Response> = NextAuth(authOptions);

/** A sign-in is an address and a password; whoever sends more is not read, since anybody may knock here. */
const MAX_BODY = 16 * 1024;

export { handler as GET };

export async function POST(request: Request, context: unknown): Promise<Response> {
  const isTooLarge = Number(request.headers.get('content-length') ?? 0) > MAX_BODY;
  return isTooLarge
    ? new Response(null, { status: 413, headers: { 'Cache-Control': 'no-store' } })
    : handler(request, context);
}
