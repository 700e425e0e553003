import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { RealArm } from '../../src/network/real-arm.ts';
import { chooseValues } from '../../src/parts/choose-values.ts';
import { finish, interfaces } from '../unit/parts/parts-of.ts';
import { plainBest } from '../unit/parts/plain.ts';
import { logUniform } from './arbitraries.ts';

/** Candidates of one arm, with reactances about 50 Ω at 100 MHz; their loss and strays are anything. */
const arm = fc
  .record({
    arm: fc.constantFrom<RealArm['arm']>('series', 'shunt'),
    part: fc.constantFrom<RealArm['part']>('inductor', 'capacitor'),
    factors: fc.uniqueArray(logUniform(0.2, 5), { minLength: 1, maxLength: 4 }),
    q: fc.option(logUniform(5, 1000)),
    qSlope: fc.constantFrom(-0.5, 0, 0.5),
    parallelF: fc.constantFrom(0, 0.3e-12),
    seriesH: fc.constantFrom(0, 1e-9),
  })
  .map(({ factors, ...rest }): RealArm[] =>
    factors
      .toSorted((a, b) => a - b)
      .map((factor) => ({
        ...rest,
        parallelF: rest.part === 'inductor' ? rest.parallelF : 0,
        value: (rest.part === 'inductor' ? 80e-9 : 32e-12) * factor,
      })),
  );

describe('chooseValues(choice) of any small choice', () => {
  it('gives the best sets of an exhaustive search, in its order', () => {
    const load = fc.tuple(logUniform(2, 1000), fc.double({ min: -200, max: 200, noNaN: true }));
    fc.assert(
      fc.property(
        fc.array(arm, { maxLength: 4 }),
        fc.array(load, { minLength: 1, maxLength: 2 }),
        fc.constantFrom(0, 1e-12),
        fc.constantFrom<[number, number]>([100e6, 100e6], [80e6, 130e6]),
        (candidates, loads, strayF, band) => {
          const states = interfaces(loads, 100e6, band, 25);
          const centre = candidates.map((parts) => parts[0]!.value * 1.1);
          const choice = { candidates, centre, strayF, states, f0: 100e6, aim: 'conjugate', keep: 3 } as const;
          const best = finish(chooseValues(choice));
          const wanted = plainBest(candidates, strayF, states, 100e6, 3);
          expect(best).toHaveLength(wanted.length);
          best.forEach(({ gammaSquared }, k) => expect(Math.abs(gammaSquared - wanted[k]!)).toBeLessThan(1e-9));
        },
      ),
      { numRuns: 60 },
    );
  });
});
