import { describe, expect, it } from 'vitest';
import { readWire } from '../../../src/parts/read-wire.ts';

describe('readWire(text)', () => {
  it.each([
    ['1 mm', 1e-3],
    ['0.8mm', 0.8e-3],
    ['0,8 mm', 0.8e-3],
    ['250 µm', 250e-6],
    ['0.001 metre', 1e-3],
    ['AWG 36', 0.127e-3],
    ['awg36', 0.127e-3],
    ['36 AWG', 0.127e-3],
    ['36awg', 0.127e-3],
    ['AWG #36', 0.127e-3],
  ])('reads "%s" as %s m', (text, value) => {
    expect(readWire(text)).toEqual({ ok: true, value });
  });

  it.each([
    ['', 'nothing is given'],
    ['1', 'the unit is missing'],
    ['0,8', 'the unit is missing'],
    ['1 m', 'the m can mean metre or milli'],
    ['AWG', 'not a gauge'],
    ['AWG 18.5', 'not a gauge'],
    ['AWG -1', 'not a gauge'],
    ['AWG 41', 'a gauge is from 0 to 40'],
    ['AWG 99999999999999999999', 'a gauge is from 0 to 40'],
    ['0 mm', 'a wire is from 0.01 mm to 20 mm thick'],
    ['-1 mm', 'a wire is from 0.01 mm to 20 mm thick'],
    ['0.5 metre', 'a wire is from 0.01 mm to 20 mm thick'],
    ['thin', 'not a quantity'],
    ['1 pF', '"pF" is not a prefix with m'],
  ])('refuses "%s": %s', (text, why) => {
    expect(readWire(text)).toEqual({ ok: false, why, would: 'write it as 0.8 mm or AWG 20' });
  });
});
