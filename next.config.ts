import type { NextConfig } from 'next';

/** Framing is refused everywhere but for the public charts, which answer for themselves. */
const everywhereButEmbeds = '/((?!embed/|oembed$|oembed/).*)';

const config: NextConfig = {
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: ['better-sqlite3', '@node-rs/argon2', 'msw'],
  // The development console would print the arguments of actions, passwords among them.
  logging: { serverFunctions: false },
  turbopack: { root: import.meta.dirname },
  // Pages of the wrong role answer with a real 403.
  experimental: { authInterrupts: true },
  async headers() {
    return [
      {
        source: everywhereButEmbeds,
        headers: [
          { key: 'X-Content-Type-Options', value: 'nosniff' },
          { key: 'X-Frame-Options', value: 'DENY' },
          { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
          { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
          { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
          {
            key: 'Permissions-Policy',
            value: 'camera=(), geolocation=(), microphone=(), payment=(), usb=(), browsing-topics=()',
          },
        ],
      },
    ];
  },
};

export default config;
