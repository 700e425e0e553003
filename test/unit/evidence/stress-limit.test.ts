import { describe, expect, it } from 'vitest';
import type { PartStress } from '../../../src/evidence/stress-figures.ts';
import { limitOf, stressWords } from '../../../src/evidence/stress-limit.ts';

const figures = { voltsPeak: 20, ampsRms: 0.5, watts: 0.1 };
const unknown = { ratedVolts: null, ratedAmps: null, ratedWatts: null };

describe('limitOf(figures, ratings, derating, powerW)', () => {
  it('takes voltage and current by the square, heat as it is, and the least of them', () => {
    // Of 2 W: (100/20)² = 25 times by voltage, (2/0.5)² = 16 times by current, 30 times by heat.
    const rated = { ratedVolts: 100, ratedAmps: 2, ratedWatts: 3 };
    expect(limitOf(figures, rated, 1, 2)).toEqual({ by: 'current', powerW: 32 });
    expect(limitOf(figures, { ...rated, ratedAmps: null }, 1, 2)).toEqual({ by: 'voltage', powerW: 50 });
    // Half of each: 25/4 times by voltage, 15 times by heat.
    expect(limitOf(figures, { ...rated, ratedAmps: null }, 0.5, 2)).toEqual({ by: 'voltage', powerW: 12.5 });
    expect(limitOf(figures, { ...unknown, ratedWatts: 3 }, 0.5, 2)!.powerW).toBeCloseTo(30, 12);
  });

  it('is null where no rating is known, or none is ever reached', () => {
    expect(limitOf(figures, unknown, 1, 2)).toBeNull();
    expect(limitOf({ ...figures, watts: 0 }, { ...unknown, ratedWatts: 1 }, 1, 2)).toBeNull();
  });
});

describe('stressWords(parts, powerW, vswr, derating)', () => {
  const part = (designator: string, limitW: number | null): PartStress => ({
    designator,
    ...figures,
    mismatched: null,
    limitW,
    limitBy: limitW === null ? null : 'voltage',
  });

  it('names the part that fails first, and how far that is from what is stated', () => {
    expect(stressWords([part('L1', 90), part('C1', 46)], 2, null, 0.8)).toEqual({
      first: { designator: 'C1', by: 'voltage', powerW: 46 },
      within: true,
      words: 'C1 fails first, by voltage: it reaches 80 % of its rating at 46.0 W available, 23 times the 2 W stated.',
    });
  });

  it('says when it fails below the power stated, with the load mismatched, and which parts are not known', () => {
    const { within, words } = stressWords([part('L1', null), part('C1', 1.5)], 2, 3, 1);
    expect(within).toBe(false);
    expect(words).toBe(
      'C1 fails first, by voltage: it reaches its rating at 1.50 W available with the load mismatched up to a VSWR of 3, less than the 2 W stated. No rating is known of L1.',
    );
  });

  it('writes a small multiple with a decimal, and no number beyond a thousand', () => {
    expect(stressWords([part('C1', 2)], 2, null, 1).words).toMatch(/, 1\.0 times the 2 W stated\.$/);
    expect(stressWords([part('C1', 1e30)], 2, null, 1).words).toMatch(/, over a thousand times the 2 W stated\.$/);
  });

  it('has no verdict without a rating', () => {
    expect(stressWords([part('C1', null)], 2, 3, 0.8)).toEqual({
      first: null,
      within: null,
      words: 'No rating is known, so that nothing is said of what fails first.',
    });
    expect(stressWords([], 2, 3, 0.8).words).toBe('The network has no part.');
  });
});
