import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import { recordOf } from '../unit/record-of.ts';

/** Computed apart from this project with SciPy from insertion loss 1 + ε²·T_n² (G. L. Matthaei, Proc. IEEE 52, 1964). */
const apart = [
  { ratio: 4, low: 400e6, high: 470e6, sections: 1, worstReturnLossDb: 18.484651748981122 },
  { ratio: 4, low: 400e6, high: 470e6, sections: 2, worstReturnLossDb: 40.25579681180557 },
  { ratio: 30, low: 8e6, high: 14e6, sections: 3, worstReturnLossDb: 19.43288360057147 },
  { ratio: 2.5, low: 88e6, high: 240e6, sections: 2, worstReturnLossDb: 14.372078214775218 },
];

describe.each(apart)(
  'equal ripple computed apart from this project with SciPy: 1 to $ratio, $sections sections',
  ({ ratio, low, high, sections, worstReturnLossDb }) => {
    const { options } = design(
      recordOf({
        method: 'equal-ripple',
        frequency: String(Math.sqrt(low * high)),
        source: '50',
        load: String(50 * ratio),
        band: `${String(low)}..${String(high)}`,
        sections: String(sections),
      }),
    );

    it('is there in both forms', () => {
      expect(options.map(({ form }) => form)).toEqual(['low-pass', 'high-pass']);
      options.forEach(({ arms }) => expect(arms).toHaveLength(2 * sections));
    });

    it('swept worst return loss within 1e-6 dB', () => {
      for (const option of options) {
        expect(Math.abs(option.worstReturnLossDb! - worstReturnLossDb)).toBeLessThan(1e-6);
      }
    });
  },
);
