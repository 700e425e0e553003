import { defineConfig } from 'vitest/config';

const root = new URL('..', import.meta.url).pathname;

/** A folder of tests; their names end in .test.ts. */
const project = (name: string, settings: object = {}) => ({
  root,
  test: { name, include: [`test/${name}/**/*.test.ts`], environment: 'node', ...settings },
});

export default defineConfig({
  root,
  test: {
    projects: [
      project('house'),
      project('unit'),
      project('published'),
      project('property', { testTimeout: 30_000 }),
      // One browser at a time, on a built site: a machine of two cores shows no race that isn't there.
      project('browser', { fileParallelism: false, testTimeout: 60_000, hookTimeout: 60_000 }),
    ],
  },
});
