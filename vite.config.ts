import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    projects: [
      { test: { name: 'shared', include: ['tests/shared/**/*.test.ts'] } },
      { test: { name: 'verification', include: ['tests/verification/**/*.test.ts'] } },
      { test: { name: 'architecture', include: ['tests/architecture/**/*.test.ts'] } },
      {
        test: { name: 'scripts', include: ['tests/scripts/**/*.test.ts'], testTimeout: 60_000 },
      },
    ],
  },
});
