import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTs from 'eslint-config-next/typescript';
import { defineConfig, globalIgnores } from 'eslint/config';

export default defineConfig([
  ...nextVitals,
  ...nextTs,
  globalIgnores([
    '.next/**',
    '.data/**',
    '.e2e/**',
    'drizzle/**',
    'lib/findings/archive/**',
    'next-env.d.ts',
    'test-results/**',
  ]),
  { rules: { '@next/next/no-html-link-for-pages': 'off' } },
]);
