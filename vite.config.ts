import react from '@vitejs/plugin-react';
import { defaultClientConditions, defaultServerConditions } from 'vite';
import { defineConfig } from 'vitest/config';

/**
 * Our own name for "take the TypeScript source, not the build" (see "imports" in package.json). It is not
 * called plain `source`, because React Aria's packages publish their own sources under that word.
 */
const SOURCE = 'dawnpeg-source';
const serverPort = process.env['PORT'] ?? '4173';
const quiet = './tests/support/fail-on-console.ts';

export default defineConfig({
  plugins: [react()],
  resolve: { conditions: [SOURCE, ...defaultClientConditions] },
  ssr: { resolve: { conditions: [SOURCE, ...defaultServerConditions] } },
  build: { outDir: 'dist/client', emptyOutDir: true, sourcemap: false, reportCompressedSize: false },
  server: {
    host: '127.0.0.1',
    strictPort: true,
    // '/api/' and not '/api': the key is a prefix and would swallow a module named /api.ts as well.
    proxy: { '/api/': { target: `http://127.0.0.1:${serverPort}`, changeOrigin: false } },
  },
  test: {
    maxWorkers: 2,
    // Files share their worker's modules: loading the product anew for each would take longer than its tests. So
    // nothing mocks a module; what a test replaces it hands over, or spies on and gives back.
    isolate: false,
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          environment: 'node',
          include: ['tests/unit/**/*.test.ts'],
          setupFiles: [quiet],
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'unit-dom',
          environment: 'jsdom',
          // What needs a page is written as .tsx: making one takes longer than most tests.
          include: ['tests/unit/src/**/*.test.tsx'],
          setupFiles: [quiet, './tests/support/dom-setup.ts'],
          // Typing letter by letter takes its time on a machine that does other work as well.
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'reference',
          environment: 'node',
          include: ['tests/reference/**/*.test.ts'],
          setupFiles: [quiet],
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'api',
          environment: 'node',
          include: ['tests/api/**/*.test.ts'],
          setupFiles: [quiet],
          globalSetup: ['./tests/support/mariadb.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'architecture',
          environment: 'node',
          include: ['tests/architecture/**/*.test.ts'],
          setupFiles: [quiet],
          testTimeout: 60_000,
        },
      },
    ],
  },
});
