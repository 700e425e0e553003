import { measuredTermination } from '../../src/measured/measured-termination.ts';
import type { Figure } from './figure.ts';
import { median, timesOf } from './timing.ts';

/** Time to read a Touchstone file of a million lines into a termination. */
export async function benchTouchstone(): Promise<readonly Figure[]> {
  const lines = ['# MHz S RI R 50'];
  for (let k = 1; k <= 1e6; k += 1) lines.push(`${k / 1000} ${(k % 997) / 1100} -0.25`);
  const text = lines.join('\n');
  const seconds = median(await timesOf(3, () => measuredTermination(text, 'long.s1p'))) / 1000;
  const measured = `${seconds.toFixed(2)} s`;
  return [{ name: 'Touchstone file of a million lines', measured, budget: '< 2 s', within: seconds < 2 }];
}
