import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

// The editor tests run inside the real workbench (npm run test:editor), not here.
export default defineConfig({
  root: fileURLToPath(new URL('..', import.meta.url)),
  test: {
    include: ['test/**/*.test.ts'],
    exclude: ['test/editor/**', '**/node_modules/**'],
    testTimeout: 60_000,
  },
});
