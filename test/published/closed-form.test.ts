import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import { endsOver, sweep } from '../../src/network/sweep.ts';
import { recordOf } from '../unit/record-of.ts';

/**
 * Source R1 = 12.5 Ω, series L, shunt C across R2 = 50 Ω; n = R2/R1 = 4, Q² = n − 1 = 3, ω0·L = Q·R1, ω0·C = Q/R2,
 * u = ω/ω0. With 1 A in the load: V2 = R2, I = 1 + jQu, V = R2 + jQu·R1·I, so
 *   V + I·R1 = R1·[n + 1 − Q²u² + 2jQu] and GT = 4·R1·R2/|V + I·R1|² = 4n/[(n + 1 − Q²u²)² + 4Q²u²]
 * which for n = 4 is 16/(25 − 18u² + 9u⁴). GT(0) = 16/25; half power at 9u⁴ − 18u² − 7 = 0, u² = 1 + 4/3 = 7/3.
 */
const closedForm = (u: number): number => 16 / (25 - 18 * u ** 2 + 9 * u ** 4);
const f0 = 435e6;
const record = recordOf({ frequency: '435M', source: '12.5', load: '50' });
const { options } = design(record);

describe('12.5 Ω to 50 Ω in closed form (derived by hand)', () => {
  const lowPass = options.find(({ form }) => form === 'low-pass')!;
  const highPass = options.find(({ form }) => form === 'high-pass')!;
  const at = [0.01, 0.3, 0.7, 1, 1.2, 2, 3, 10, 100];

  it('low-pass: L = √3·12.5/ω0, C = √3/(50·ω0), to 1 part in 10¹⁴', () => {
    const omega = 2 * Math.PI * f0;
    const [l, c] = lowPass.arms;
    expect(Math.abs(l!.value / ((Math.sqrt(3) * 12.5) / omega) - 1)).toBeLessThan(1e-14);
    expect(Math.abs(c!.value / (Math.sqrt(3) / (50 * omega)) - 1)).toBeLessThan(1e-14);
  });

  it.each([
    ['low-pass', lowPass, (u: number) => u],
    // ω → ω0²/ω turns one into the other.
    ['high-pass', highPass, (u: number) => 1 / u],
  ])('sweep of the %s network has GT = 16/(25 − 18u² + 9u⁴), to 1 part in 10¹²', (_, { arms }, map) => {
    const frequencies = Float64Array.from(at, (u) => f0 * map(u));
    const { gain } = sweep(
      prepareLadder(arms),
      endsOver(record.source, record.loads[0]!.termination, f0, frequencies),
      'conjugate',
    );
    at.forEach((u, k) => expect(Math.abs(gain[k]! / closedForm(u) - 1)).toBeLessThan(1e-12));
  });

  it('low-pass: half power at √(7/3)·f0 above, none below, to 1 part in 10¹²', () => {
    expect(lowPass.halfPower.lowHz).toBeNull();
    expect(lowPass.halfPower.bandwidthHz).toBeNull();
    expect(Math.abs(lowPass.halfPower.highHz! / (Math.sqrt(7 / 3) * f0) - 1)).toBeLessThan(1e-12);
  });

  it('high-pass: half power at √(3/7)·f0 below, none above, to 1 part in 10¹²', () => {
    expect(highPass.halfPower.highHz).toBeNull();
    expect(Math.abs(highPass.halfPower.lowHz! / (Math.sqrt(3 / 7) * f0) - 1)).toBeLessThan(1e-12);
  });

  it('low-pass: attenuation of 2f0 and 3f0 is 10·lg(97/16) and 10·lg(592/16) dB', () => {
    // 25 − 72 + 144 = 97 and 25 − 162 + 729 = 592.
    const [second, third] = lowPass.harmonicDb;
    expect(second!.attenuationDb).toBeCloseTo(10 * Math.log10(97 / 16), 10);
    expect(third!.attenuationDb).toBeCloseTo(10 * Math.log10(592 / 16), 10);
  });

  it('loaded Q is √3/2, and f0/QL is told not to hold where an edge is absent', () => {
    expect(lowPass.loadedQ).toBeCloseTo(Math.sqrt(3) / 2, 14);
    expect(lowPass.bandwidthFromQHz).toBeCloseTo((2 * f0) / Math.sqrt(3), 3);
    expect(lowPass.bandwidthNote).toMatch(/none/);
  });
});
