import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('..', import.meta.url));

/**
 * A folder of tests; their names end in .test.ts. The core has no state that one file could leave to the next. Time runs
 * out late, because a machine that does other things too is no fault of the code.
 */
const project = (name: string, settings: object = {}) => ({
  root,
  test: {
    name,
    include: [`test/${name}/**/*.test.ts`],
    environment: 'node',
    isolate: false,
    testTimeout: 60_000,
    hookTimeout: 60_000,
    ...settings,
  },
});

export default defineConfig({
  root,
  test: {
    projects: [
      project('house'),
      project('unit'),
      project('published'),
      project('property'),
      // One browser at a time, on a built site: a machine of two cores shows no race that isn't there.
      project('browser', { fileParallelism: false }),
    ],
  },
});
