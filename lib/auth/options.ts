import 'server-only';
import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { requestContext } from '@/lib/services/account/request-context';
import { SESSION_LIFETIME, signIn } from '@/lib/services/account/sign-in';
import { signOut } from '@/lib/services/account/sign-out';

const text = (value: unknown, max: number) => (typeof value === 'string' ? value.slice(0, max) : '');

/** The token carries a random session id and nothing else; who that is stands in the database. */
export const authOptions: NextAuthOptions = {
  session: { strategy: 'jwt', maxAge: SESSION_LIFETIME / 1000 },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [
    CredentialsProvider({
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(credentials, request) {
        const result = await signIn(
          {
            email: text(credentials?.email, 200),
            password: text(credentials?.password, 1024),
            address: text(request.headers?.['x-forwarded-for'], 100),
          },
          requestContext(),
        );
        if (result.ok) return { id: result.token };
        if (result.throttled) throw new Error('throttled');
        return null;
      },
    }),
  ],
  callbacks: {
    jwt: ({ token, user }) => (user ? { sid: user.id } : { sid: token.sid }),
    session: ({ session }) => ({ expires: session.expires }),
  },
  events: {
    signOut({ token }) {
      if (typeof token?.sid === 'string') signOut(token.sid, requestContext());
    },
  },
};
