import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export default defineConfig({
  resolve: {
    tsconfigPaths: true,
    alias: {
      'server-only': here('./tests/support/server-only.ts'),
      'next/cache': here('./tests/support/next-cache.ts'),
      'next/headers': here('./tests/support/next-headers.ts'),
      '@/lib/jobs/start-build-thread': here('./tests/support/start-build-thread.ts'),
      '@/lib/jobs/start-picture-thread': here('./tests/support/start-picture-thread.ts'),
      '@/lib/jobs/start-solve-thread': here('./tests/support/start-solve-thread.ts'),
    },
  },
  test: {
    include: ['tests/{architecture,unit,reference,integration}/**/*.test.{ts,tsx}'],
    setupFiles: ['tests/support/fail-on-console-error.ts'],
    testTimeout: 60_000,
    hookTimeout: 60_000,
  },
});
