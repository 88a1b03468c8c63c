import { defineConfig } from 'vitest/config';

/** Tests mirror `src`; what stands apart from the gate (`fuzz`, `bench`) is not named `*.test.ts`. */
export default defineConfig({
  test: {
    include: ['tests/**/*.test.ts'],
    maxWorkers: 2,
    testTimeout: 20_000,
  },
});
