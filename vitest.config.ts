import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    include: ['tests/**/*.test.ts'],
    testTimeout: 60_000,
    // many tests wait for programs that they start
    maxWorkers: '100%',
    coverage: { include: ['src/**/*.ts', 'cli/**/*.ts'], reporter: ['text-summary'] },
  },
});
