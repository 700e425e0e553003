import { describe, expect, it } from 'vitest';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import { onePortFile } from '../../../src/measured/one-port-file.ts';

const { measured } = measuredTermination(
  '# MHz S RI R 75\n100 0.1 -0.30000000000000004\n150.25 -1e-7 0.2\n200 0 -0\n',
  'stub “whip”.s1p',
);

describe('onePortFile(data)', () => {
  it('reads back to the same samples in the same reference resistance, every digit of them', () => {
    const { measured: again } = measuredTermination(onePortFile(measured), 'again.s1p');
    expect([again.frequencyHz, again.re, again.im, again.referenceOhm]).toEqual([
      [100e6, 150.25e6, 200e6],
      [0.1, -1e-7, 0],
      [-0.30000000000000004, 0.2, 0],
      75,
    ]);
  });

  it('says in ASCII where the data came from', () => {
    expect(onePortFile(measured).split('\n').slice(0, 3)).toEqual([
      `! Read from stub ?whip?.s1p, SHA-256 ${measured.sha256}`,
      '! 3 of its 3 samples',
      '# Hz S RI R 75',
    ]);
  });
});
