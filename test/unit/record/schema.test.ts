import { readFileSync } from 'node:fs';
import { Ajv } from 'ajv';
import { describe, expect, it } from 'vitest';
import { jsonSchema } from '../../../src/cli/json-schema.ts';
import { readRecord } from '../../../src/record/read-record.ts';
import { demoNames, demoText } from './demos.ts';

const published = readFileSync(new URL('../../../public/schema/ferrule-record-2.json', import.meta.url), 'utf8');
const validate = new Ajv({ allErrors: true, strict: true, allowUnionTypes: true }).compile(JSON.parse(published));

describe('the published JSON Schema', () => {
  it('is the one that records are read with', () => {
    expect(published).toBe(jsonSchema());
  });

  it.each(demoNames)('admits the demo %s, which the program reads too', (name) => {
    const text = demoText(name);
    expect(validate(JSON.parse(text)), JSON.stringify(validate.errors)).toBe(true);
    expect(readRecord(text)).toEqual(JSON.parse(text));
  });

  it('refuses an unknown field in every object of a record', () => {
    const objects = (value: unknown, path: readonly string[]): (readonly string[])[] =>
      typeof value === 'object' && value !== null
        ? [
            ...(Array.isArray(value) ? [] : [path]),
            ...Object.entries(value).flatMap(([name, inner]) => objects(inner, [...path, name])),
          ]
        : [];
    const record: unknown = JSON.parse(demoText('tide-gauge'));
    const paths = objects(record, []);
    // The record, its nine parts, two policies of parts with a tolerance each, the winding, two spans of parts, the band,
    // three signatures, a load state and its termination.
    expect(paths).toHaveLength(22);
    for (const path of paths) {
      const copy = structuredClone(record) as Record<string, unknown>;
      const inner = path.reduce((at, name) => at[name] as Record<string, unknown>, copy);
      inner['notion'] = 1;
      expect(validate(copy), path.join('.')).toBe(false);
      expect(() => readRecord(JSON.stringify(copy)), path.join('.')).toThrow([...path, 'notion'].join('.'));
    }
  });

  it('refuses a missing field and a value out of range', () => {
    const record = JSON.parse(demoText('tide-gauge'));
    expect(validate(JSON.parse(JSON.stringify({ ...record, loads: undefined })))).toBe(false);
    for (const r of [0, -1, 1e12, '50', null]) {
      const loads = [{ name: '', termination: { ...record.loads[0].termination, r } }];
      expect(validate({ ...record, loads })).toBe(false);
    }
    for (const sections of [0, 7, 1.5, 'two']) expect(validate({ ...record, sections })).toBe(false);
  });
});
