import { expect, it } from 'vitest';
import { fileStem } from '../../../../components/record-part/files.ts';
import type { DesignRecord } from '../../../../src/record/design-record.ts';

const record = (number: string, revision: string) => ({ identity: { number, revision } }) as DesignRecord;

it.each([
  ['TG-041', 'A', 'TG-041_A'],
  ['EX 7/2', 'C', 'EX-7-2_C'],
  ['../../etc', '..', 'etc'],
  ['', '', 'design'],
  ['Prüfung 1', '0.1', 'Prüfung-1_0.1'],
])('fileStem of number "%s", revision "%s" is "%s"', (number, revision, stem) => {
  expect(fileStem(record(number, revision))).toBe(stem);
});
