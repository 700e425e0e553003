import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { version } from '../../src/version.ts';

it('version is that of package.json', () => {
  const text = readFileSync(new URL('../../package.json', import.meta.url), 'utf8');
  expect(version).toBe((JSON.parse(text) as { version: string }).version);
});
