import { describe, expect, it } from 'vitest';
import { modelWords, namesModel, readModel } from '../../../src/network/read-model.ts';

describe('readModel(text) reads a name and its values', () => {
  it.each([
    ['rc-series 12 8.2p', 'rc-series', [12, 8.2e-12]],
    ['  RC-Series   12   8p2  ', 'rc-series', [12, 8.2e-12]],
    ['rl-series 4R7 33n', 'rl-series', [4.7, 33e-9]],
    ['rlc-series 1k5 2,2u 1e-12', 'rlc-series', [1500, 2.2e-6, 1e-12]],
    ['rc-parallel 1k 3pF', 'rc-parallel', [1000, 3e-12]],
    ['rl-parallel 75ohm 100nH', 'rl-parallel', [75, 100e-9]],
    ['rlc-parallel\t50\t10n\t4p7', 'rlc-parallel', [50, 10e-9, 4.7e-12]],
    ['crystal 30 10m 25f 5p', 'crystal', [30, 10e-3, 25e-15, 5e-12]],
    ['antenna 36 145M 11.5', 'antenna', [36, 145e6, 11.5]],
    ['antenna 36 145MHz 11,5', 'antenna', [36, 145e6, 11.5]],
  ])('%s', (text, model, values) => {
    const reading = readModel(text);
    if (!reading.ok) throw new Error(reading.why);
    expect(reading.value.model).toBe(model);
    values.forEach((value, k) => expect(reading.value.values[k]! / value).toBeCloseTo(1, 12));
  });
});

describe('readModel(text) refuses in one line', () => {
  it.each([
    ['rc-serie 12 8p', /"rc-serie" is no circuit model/u, /give one of rc-series, .* as in rc-series 12 8\.2p/u],
    ['constructor 1 2', /"constructor" is no circuit model/u, /give one of/u],
    ['__proto__ 1 2', /is no circuit model/u, /give one of/u],
    ['rc-series', /0 values where 2 belong/u, /write it as rc-series R C/u],
    ['rc-series 12', /1 values where 2 belong/u, /write it as rc-series R C/u],
    ['rc-series 12 8p 3', /3 values where 2 belong/u, /write it as rc-series R C/u],
    ['rc-series 12 0', /C must be above zero/u, /write it as rc-series R C/u],
    ['rc-series -12 8p', /R must be above zero/u, /write it as rc-series R C/u],
    ['rc-series twelve 8p', /R "twelve": not a quantity/u, /write it as/u],
    ['rc-series 12 8nH', /C "8nH": "nH" is not a prefix with F/u, /write it as/u],
    ['rlc-series 12 1n 1e999', /C "1e999": beyond the range of numbers/u, /write it as/u],
    ['antenna 36 145M', /2 values where 3 belong/u, /write it as antenna R f0 Q/u],
    ['antenna 36 145M high', /Q "high": not a number/u, /write it as/u],
    ['antenna 36 145M Infinity', /Q "Infinity": not a number/u, /write it as/u],
    ['antenna 36 145m 11', /f0 "145m": "m" makes it less than a hertz/u, /write it as/u],
  ])('%s', (text, why, would) => {
    const reading = readModel(text);
    if (reading.ok) throw new Error('it was read');
    expect(reading.why).toMatch(why);
    expect(reading.would).toMatch(would);
  });
});

describe('namesModel(text)', () => {
  it.each(['rc-series 12 8p', 'ANTENNA 36 145M 11', 'antena 36 145M 11', 'rc-series'])(
    '%s is meant as a model',
    (text) => {
      expect(namesModel(text)).toBe(true);
    },
  );
  it.each(['50', '9.4-j61', 'j50', '50 ohm', '-j20', '1k5', '50∠-30°', '', 'R50', 'antena', 'fifty ohms'])(
    '"%s" is not',
    (text) => {
      expect(namesModel(text)).toBe(false);
    },
  );
});

describe('modelWords(model)', () => {
  it('names each value with its unit', () => {
    expect(modelWords({ model: 'rc-series', values: [12, 8.2e-12] })).toBe('rc-series: R 12 Ω, C 8.2 pF');
    expect(modelWords({ model: 'antenna', values: [36, 145e6, 11.5] })).toBe('antenna: R 36 Ω, f0 145 MHz, Q 11.5');
  });
});
