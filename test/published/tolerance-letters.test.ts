import { describe, expect, it } from 'vitest';
import { readTolerance } from '../../src/parts/tolerance.ts';

describe('IEC 60062:2016, tolerance letters, exact', () => {
  it.each([
    ['F', 0.01],
    ['G', 0.02],
    ['J', 0.05],
    ['K', 0.1],
    ['M', 0.2],
  ])('%s is a fraction of %s', (letter, value) => {
    expect(readTolerance(letter, 'inductor')).toEqual({ ok: true, value: { kind: 'relative', value } });
    expect(readTolerance(letter, 'capacitor')).toEqual({ ok: true, value: { kind: 'relative', value } });
  });

  it.each([
    ['B', 0.1e-12],
    ['C', 0.25e-12],
    ['D', 0.5e-12],
  ])('%s of a capacitor below 10 pF is %s F', (letter, value) => {
    const wanted = { ok: true, value: { kind: 'absolute', value } };
    expect(readTolerance(letter, 'capacitor')).toEqual(wanted);
    expect(readTolerance(letter, 'capacitor', 8.2e-12)).toEqual(wanted);
  });
});
