import { expect, it } from 'vitest';
import { nextRevision } from '../../../src/record/next-revision.ts';

it.each([
  ['A', 'B'],
  ['Z', 'AA'],
  ['AZ', 'BA'],
  ['ZZ', 'AAA'],
  ['z', 'aa'],
  ['3', '4'],
  ['9', '10'],
  ['09', '10'],
  ['A1', 'A2'],
  ['0.9', '0.10'],
  ['Rev B', 'Rev C'],
  ['99999999999999999999', '100000000000000000000'],
  ['pilot', 'pilot-2'],
  ['pilot-2', 'pilot-3'],
  ['', 'A'],
  [' C ', 'D'],
])('nextRevision("%s") is "%s"', (revision, next) => {
  expect(nextRevision(revision)).toBe(next);
});
