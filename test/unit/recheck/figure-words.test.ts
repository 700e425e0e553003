import { expect, it } from 'vitest';
import { figureWords } from '../../../src/recheck/figure-words.ts';

it.each([
  [{ then: 4.7e-9, now: 5.6e-9, unit: 'H' }, '4.70000 nH', '5.60000 nH'],
  [{ then: 17.25, now: -0.5, unit: 'dB' }, '17.25 dB', '−0.5 dB'],
  [{ then: 0.125, now: null, unit: '' }, '0.125', 'none'],
  [{ then: true, now: false, unit: '' }, 'yes', 'no'],
  [{ then: undefined, now: 'pi', unit: '' }, 'not printed', 'pi'],
  [{ then: 'pi', now: undefined, unit: '' }, 'pi', 'not computed'],
  // 0.1 + 0.2 in binary: told apart from 0.3 by its last digit alone.
  [{ then: 0.3, now: 0.1 + 0.2, unit: '' }, '0.3', '0.30000000000000004'],
])('figureWords(%o) is %s and %s', (figure, then, now) => {
  expect(figureWords(figure)).toEqual({ then, now });
});
