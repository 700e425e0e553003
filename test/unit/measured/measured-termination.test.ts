import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import { terminationAt } from '../../../src/network/termination-at.ts';

const file = '# MHz S RI R 75\n100 0.1 0.2\n101 0.3 -0.4\n';

describe('measuredTermination(text, name, port)', () => {
  it("holds the file's own samples, reference, name and SHA-256 (FIPS 180-4, by Node's own)", () => {
    expect(measuredTermination(file, 'antenna.s1p')).toEqual({
      measured: {
        name: 'antenna.s1p',
        sha256: createHash('sha256').update(file).digest('hex'),
        samples: 2,
        thinningError: 0,
        referenceOhm: 75,
        frequencyHz: [100e6, 101e6],
        re: [0.1, 0.3],
        im: [0.2, -0.4],
      },
    });
  });

  it('says in the name which port of a two-port it is', () => {
    const row = '0.1 0 0.5 0 0.5 0 0.2 0';
    const text = `# MHz S RI R 50\n100 ${row}\n200 ${row}\n`;
    expect(measuredTermination(text, 'd.s2p', 1).measured).toMatchObject({ name: 'd.s2p', re: [0.1, 0.1] });
    expect(measuredTermination(text, 'd.s2p', 2).measured).toMatchObject({ name: 'd.s2p (port 2)', re: [0.2, 0.2] });
  });

  it('takes a text for a table unless its name or its option line says that it is a Touchstone file', () => {
    const rows = '100 12 -40\n101 13 -40';
    for (const table of [`f/MHz R X\n${rows}`, `# f/MHz R X\n${rows}`, `! a comment\nf/MHz R X\n${rows}`]) {
      expect(measuredTermination(table, 'table').measured.frequencyHz).toEqual([100e6, 101e6]);
    }
    expect(() => measuredTermination(file, 'table')).toThrow(/name the file \.s1p or \.s2p/u);
    const pasted = file
      .replace('#', '[Version] 2.0\n#')
      .replace('100', '[Number of Ports] 1\n[Number of Frequencies] 2\n[Network Data]\n100');
    expect(measuredTermination(pasted, 'table').measured.frequencyHz).toEqual([100e6, 101e6]);
  });

  it('knows a Touchstone file by its option line, after blank lines and between blanks', () => {
    const text = '\n\n \t# MHz\tS RI R 50 ! of a cable\n100 0.1 0.2\n101 0.3 -0.4\n';
    expect(() => measuredTermination(text, 'table')).toThrow(/name the file \.s1p or \.s2p/u);
  });

  it('refuses one sample', () => {
    expect(() => measuredTermination('# MHz S RI R 50\n1 0.1 0\n', 'a.s1p')).toThrow(/one sample is too few/u);
  });

  it('thins a long sweep to 2001 samples, ends among them, and tells how far the rest is from the curve', () => {
    const gamma = (k: number): number => 0.5 + 0.3 * Math.sin(k / 400);
    const rows = Array.from({ length: 10_001 }, (_, k) => `${String(1000 + k)} ${String(gamma(k))} 0.1`);
    const { measured } = measuredTermination(`# kHz S RI R 50\n${rows.join('\n')}\n`, 'long.s1p');
    expect(measured.samples).toBe(10_001);
    expect(measured.frequencyHz).toHaveLength(2001);
    expect([measured.frequencyHz[0], measured.frequencyHz[2000]]).toEqual([1e6, 11e6]);
    let worst = 0;
    for (let k = 0; k < 10_001; k += 7) {
      const z = terminationAt({ measured }, 5e6, (1000 + k) * 1e3);
      const back = z.sub(50).div(z.add(50));
      worst = Math.max(worst, Math.hypot(back.re - gamma(k), back.im - 0.1));
    }
    expect(measured.thinningError).toBeGreaterThan(0);
    expect(worst).toBeLessThanOrEqual(measured.thinningError * (1 + 1e-6));
    expect(measured.thinningError).toBeLessThan(1e-4);
  });

  it('is never extrapolated', () => {
    const termination = measuredTermination(file, 'antenna.s1p');
    expect(() => terminationAt(termination, 100e6, 99.9e6)).toThrow(RangeError);
    expect(() => terminationAt(termination, 100e6, 101.1e6)).toThrow(RangeError);
    expect(terminationAt(termination, 100e6, 100.5e6).re).toBeGreaterThan(0);
  });
});
