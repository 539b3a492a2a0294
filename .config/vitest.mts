import { defineConfig } from 'vitest/config';

export default defineConfig({
  oxc: { jsx: { runtime: 'automatic', importSource: 'preact' } },
  test: {
    root: new URL('..', import.meta.url).pathname,
    include: [
      'test/{core,readers,compare,planning,settings,recheck,report,protocol,worker,cli,package}/**/*.test.{ts,tsx}',
    ],
    testTimeout: 20_000,
    coverage: {
      include: ['src/**'],
      exclude: ['src/host/**', 'src/webview/**'],
      reporter: ['text-summary', 'json'],
    },
  },
});
