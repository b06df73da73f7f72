import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    projects: [
      { test: { name: 'shared', include: ['tests/shared/**/*.test.ts'] } },
      { test: { name: 'verification', include: ['tests/verification/**/*.test.ts'] } },
      {
        // one thread's files share the compiler, which takes a second to load
        test: {
          name: 'architecture',
          include: ['tests/architecture/**/*.test.ts'],
          isolate: false,
        },
      },
      {
        test: { name: 'scripts', include: ['tests/scripts/**/*.test.ts'], testTimeout: 60_000 },
      },
    ],
  },
});
