import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { readTouchstone } from '../../src/measured/read-touchstone.ts';

const polar = (size: number, degrees: number): Complex => new Complex({ abs: size, arg: (degrees * Math.PI) / 180 });

/** Γ of each sample. */
function gammas(text: string, name: string, port: 1 | 2 = 1): Complex[] {
  const { re, im } = readTouchstone(text, name, port);
  return Array.from(re, (value, k) => new Complex(value, im[k]!));
}

/** Z = R·(1 + Γ)/(1 − Γ), Ω */
const impedances = (text: string, name: string, port: 1 | 2 = 1): Complex[] => {
  const { referenceOhm } = readTouchstone(text, name, port);
  return gammas(text, name, port).map((gamma) => gamma.add(1).div(new Complex(1, 0).sub(gamma)).mul(referenceOhm));
};

const apart = (a: Complex, b: Complex): number => a.sub(b).abs() / b.abs();

describe('Touchstone, IBIS Open Forum, version 1.1: its one-port examples (quoted from memory)', () => {
  it('# MHz S MA R 50: 0.894 at −12.136° at 2 MHz', () => {
    const text = '! 1-port S-parameter file, single frequency point\n# MHz S MA R 50\n2.000 0.894 -12.136\n';
    expect([...readTouchstone(text, 'example.s1p').frequencyHz]).toEqual([2e6]);
    expect(apart(gammas(text, 'example.s1p')[0]!, polar(0.894, -12.136))).toBeLessThan(1e-15);
  });

  it('# MHz Z MA R 75: values normalised to 75 Ω, the first of them 74.25 Ω at −4°', () => {
    const text = [
      '! 1-port Z-parameter file, multiple frequency points',
      '# MHz Z MA R 75',
      '!freq magZ11 angZ11',
      '100  0.99   -4',
      '200  0.80  -22',
      '300  0.707 -45',
      '400  0.40  -62',
      '500  0.01  -89',
    ].join('\r\n');
    const wanted = [
      polar(74.25, -4),
      polar(75 * 0.8, -22),
      polar(75 * 0.707, -45),
      polar(75 * 0.4, -62),
      polar(75 * 0.01, -89),
    ];
    expect([...readTouchstone(text, 'example.s1p').frequencyHz]).toEqual([100e6, 200e6, 300e6, 400e6, 500e6]);
    // |Γ| of the last is within 2e-4 of 1, so that its resistance loses four digits.
    impedances(text, 'example.s1p').forEach((z, k) => expect(apart(z, wanted[k]!)).toBeLessThan(1e-11));
  });
});

/** Every keyword that the specification allows with one or two ports, written as it says. */
const version2 = (version: '2.0' | '2.1', order: '12_21' | '21_12'): string =>
  [
    '! every keyword of a two-port file',
    `[Version] ${version}`,
    '# GHz Z RI R 50',
    '[Number of Ports] 2',
    `[Two-Port Data Order] ${order}`,
    '[Number of Frequencies] 2',
    '[Number of Noise Frequencies] 2',
    '[Reference] 50  ! port 1',
    '25              ! port 2, on a line of its own',
    '[Matrix Format] Full',
    '[Begin Information]',
    '[Manufacturer] nobody',
    '1 2 3 not data',
    '[End Information]',
    '[Network Data]',
    '! freq Z11 Z.. Z.. Z22, in ohms',
    '1.0  40 10  5 2  3 1  30 -20',
    '2.0  41 11  5 2  3 1  31 -21',
    '[Noise Data]',
    '0.5 1.2 0.3 40 0.2',
    '1.0 1.3 0.3 50 0.2',
    '[End]',
    '',
  ].join('\n');

describe('Touchstone, IBIS Open Forum, versions 2.0 and 2.1: a two-port file with every keyword', () => {
  const z12z21 = new Complex(5, 2).mul(new Complex(3, 1));
  const seen = (near: Complex, far: Complex, closing: number): Complex => near.sub(z12z21.div(far.add(closing)));

  it.each([
    ['2.0', '12_21'],
    ['2.0', '21_12'],
    ['2.1', '12_21'],
    ['2.1', '21_12'],
  ] as const)('version %s, order %s: Zin = Znear − Z12·Z21/(Zfar + Rfar), not normalised', (version, order) => {
    const text = version2(version, order);
    const [one, two] = [impedances(text, 'x.ts', 1), impedances(text, 'x.ts', 2)];
    expect(readTouchstone(text, 'x.ts', 1).referenceOhm).toBe(50);
    expect(readTouchstone(text, 'x.ts', 2).referenceOhm).toBe(25);
    expect(apart(one[0]!, seen(new Complex(40, 10), new Complex(30, -20), 25))).toBeLessThan(1e-14);
    expect(apart(one[1]!, seen(new Complex(41, 11), new Complex(31, -21), 25))).toBeLessThan(1e-14);
    expect(apart(two[0]!, seen(new Complex(30, -20), new Complex(40, 10), 50))).toBeLessThan(1e-14);
  });

  it.each(['Lower', 'Upper'])('[Matrix Format] %s: three pairs, Z12 = Z21', (format) => {
    const text = version2('2.1', '12_21')
      .replace('Full', format)
      .replace('5 2  3 1  30', '5 2  30')
      .replace('5 2  3 1  31', '5 2  31');
    const wanted = new Complex(40, 10).sub(new Complex(5, 2).pow(2).div(new Complex(30 + 25, -20)));
    expect(apart(impedances(text, 'x.s2p')[0]!, wanted)).toBeLessThan(1e-14);
  });

  it('a one-port of version 2 needs neither an order nor a reference', () => {
    const text =
      '[Version] 2.0\n# MHz Y DB\n[Number of Ports] 1\n[Number of Frequencies] 1\n[Network Data]\n7 -40 30\n[End]\n';
    // −40 dB is 10 mS, which version 2 doesn't normalise: 100 Ω at −30°.
    expect(apart(impedances(text, 'x.s1p')[0]!, polar(100, -30))).toBeLessThan(1e-14);
  });
});

describe('one physical two-port, written in every way that the specification gives', () => {
  /** Ω; not reciprocal, so that an exchanged pair would show in S. */
  const z = {
    z11: new Complex(35, 22),
    z12: new Complex(6, -9),
    z21: new Complex(14, 4),
    z22: new Complex(61, -48),
  };
  interface Matrix {
    readonly p11: Complex;
    readonly p12: Complex;
    readonly p21: Complex;
    readonly p22: Complex;
  }
  const asZ: Matrix = { p11: z.z11, p12: z.z12, p21: z.z21, p22: z.z22 };
  const determinant = z.z11.mul(z.z22).sub(z.z12.mul(z.z21));
  const asY: Matrix = {
    p11: z.z22.div(determinant),
    p12: z.z12.neg().div(determinant),
    p21: z.z21.neg().div(determinant),
    p22: z.z11.div(determinant),
  };
  /** S of power waves in R1, R2: D·S11 = (Z11 − R1)(Z22 + R2) − Z12·Z21, D·S21 = 2·Z21·√(R1·R2), and so on. */
  const asS = (r1: number, r2: number): Matrix => {
    const product = z.z12.mul(z.z21);
    const d = z.z11.add(r1).mul(z.z22.add(r2)).sub(product);
    const root = 2 * Math.sqrt(r1 * r2);
    return {
      p11: z.z11.sub(r1).mul(z.z22.add(r2)).sub(product).div(d),
      p12: z.z12.mul(root).div(d),
      p21: z.z21.mul(root).div(d),
      p22: z.z11.add(r1).mul(z.z22.sub(r2)).sub(product).div(d),
    };
  };
  const formats = {
    RI: ({ re, im }: Complex) => `${String(re)} ${String(im)}`,
    MA: (value: Complex) => `${String(value.abs())} ${String((value.arg() * 180) / Math.PI)}`,
    DB: (value: Complex) => `${String(20 * Math.log10(value.abs()))} ${String((value.arg() * 180) / Math.PI)}`,
  };
  const row = ({ p11, p12, p21, p22 }: Matrix, format: keyof typeof formats, order: '12_21' | '21_12'): string =>
    [p11, ...(order === '12_21' ? [p12, p21] : [p21, p12]), p22].map(formats[format]).join('  ');
  const scaled = ({ p11, p12, p21, p22 }: Matrix, by: number): Matrix => ({
    p11: p11.mul(by),
    p12: p12.mul(by),
    p21: p21.mul(by),
    p22: p22.mul(by),
  });

  const version1 = (parameter: 'S' | 'Z' | 'Y', format: keyof typeof formats, r: number): string => {
    const matrix = { S: asS(r, r), Z: scaled(asZ, 1 / r), Y: scaled(asY, r) }[parameter];
    return `# kHz ${parameter} ${format} R ${String(r)}\n13.56e3 ${row(matrix, format, '21_12')}\n`;
  };
  const second = (parameter: 'S' | 'Z' | 'Y', format: keyof typeof formats, r1: number, r2: number): string => {
    const order = format === 'MA' ? '12_21' : '21_12';
    return [
      '[Version] 2.1',
      `# kHz ${parameter} ${format} R 1`,
      '[Number of Ports] 2',
      `[Two-Port Data Order] ${order}`,
      '[Number of Frequencies] 1',
      `[Reference] ${String(r1)} ${String(r2)}`,
      '[Network Data]',
      `13.56e3 ${row({ S: asS(r1, r2), Z: asZ, Y: asY }[parameter], format, order)}`,
      '[End]',
    ].join('\n');
  };
  const ways = (['S', 'Z', 'Y'] as const).flatMap((parameter) =>
    (['RI', 'MA', 'DB'] as const).map((format) => [parameter, format] as const),
  );
  const wanted = (port: 1 | 2, closing: number): Complex => {
    const [near, far] = port === 1 ? [z.z11, z.z22] : [z.z22, z.z11];
    return near.sub(z.z12.mul(z.z21).div(far.add(closing)));
  };

  it.each(ways)(
    'version 1.1, %s %s, normalised to 50 and to 75 Ω: ports 1 and 2, to 1 part in 10¹²',
    (what, format) => {
      for (const r of [50, 75]) {
        const text = version1(what, format, r);
        for (const port of [1, 2] as const) {
          expect(apart(impedances(text, 'device.s2p', port)[0]!, wanted(port, r))).toBeLessThan(1e-12);
        }
      }
    },
  );

  it.each(ways)('version 2.1, %s %s, references of 50 and 10 Ω, of 75 and 300 Ω: to 1 part in 10¹²', (what, format) => {
    for (const [r1, r2] of [
      [50, 10],
      [75, 300],
    ] as const) {
      const text = second(what, format, r1, r2);
      expect(apart(impedances(text, 'device.s2p', 1)[0]!, wanted(1, r2))).toBeLessThan(1e-12);
      expect(apart(impedances(text, 'device.s2p', 2)[0]!, wanted(2, r1))).toBeLessThan(1e-12);
    }
  });
});
