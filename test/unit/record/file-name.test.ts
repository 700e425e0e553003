import { describe, expect, it } from 'vitest';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { fileName } from '../../../src/record/file-name.ts';

const record = (number: string, revision: string) => ({ identity: { number, revision } }) as DesignRecord;

describe('fileName(record, ending)', () => {
  it.each([
    ['TGT-RF-033', 'A', 'TGT-RF-033_A.pdf'],
    ['EX 7/2', 'C', 'EX-7-2_C.pdf'],
    ['../../etc', '..', 'etc.pdf'],
    ['', '', 'design.pdf'],
    ['???', '*', 'design.pdf'],
    ['Prüfung 1', '0.1', 'Prüfung-1_0.1.pdf'],
    ['תקן 5', 'א', 'תקן-5_א.pdf'],
    ['a\u0000b:c|d"e<f>', '', 'a-b-c-d-e-f.pdf'],
  ])('of number "%s", revision "%s" is "%s"', (number, revision, name) => {
    expect(fileName(record(number, revision), 'pdf')).toBe(name);
  });

  it('writes an accent the same however it was typed', () => {
    expect(fileName(record('Pru\u0308fung', 'A'), 'json')).toBe('Prüfung_A.json');
  });

  it.each(['CON', 'nul', 'Com1', 'lpt9.a', 'AUX.'])('avoids the device %s', (number) => {
    expect(fileName(record(number, ''), 'csv')).toMatch(/^design-/);
  });

  it('leaves a number that only begins like a device', () => {
    expect(fileName(record('CONTROL', ''), 'csv')).toBe('CONTROL.csv');
    expect(fileName(record('CON', 'A'), 'csv')).toBe('CON_A.csv');
  });

  it('cuts a long number between letters, to what every file system takes', () => {
    const long = fileName(record('図'.repeat(120), 'A'), 'pdf');
    // Three bytes a letter: 66 of them are 198 bytes, one more would be 201.
    expect(long).toBe(`${'図'.repeat(66)}.pdf`);
    expect(new TextEncoder().encode(long).length).toBeLessThanOrEqual(255);
  });
});
