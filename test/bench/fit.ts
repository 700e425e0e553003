import { design } from '../../src/design.ts';
import { readDraft } from '../../src/record/draft.ts';
import type { Figure } from './figure.ts';
import { median, timesOf } from './timing.ts';

/** Time of one fitted network of each size on one core: 14 Ω in series with C, Q 8, over a band with Q·w = 0.8. */
export async function benchFit(): Promise<readonly Figure[]> {
  const f0 = 100e6;
  const c = 1 / (2 * Math.PI * f0 * 8 * 14);
  const half = 0.1 / 2;
  const edge = Math.sqrt(1 + half * half);
  const band = `${f0 * (edge - half)}..${f0 * (edge + half)}`;
  const figures: Figure[] = [];
  for (const elements of [3, 5, 8]) {
    const { record, problems } = readDraft({
      method: 'fitted',
      frequency: String(f0),
      source: '50',
      'source-behaviour': 'constant',
      load: `rc-series 14 ${c}`,
      band,
      'return-loss': '15',
      elements: String(elements),
      date: '2026-01-01',
    });
    if (record === null) throw new Error(problems.map(({ why }) => why).join('; '));
    const times = await timesOf(3, () => design(record));
    const seconds = median(times) / 1000;
    const worst = design(record).options[0]?.worstReturnLossDb ?? 0;
    figures.push({
      name: `fitted network of ${elements} elements`,
      measured: `${seconds.toFixed(2)} s for ${worst.toFixed(2)} dB`,
      budget: '≤ 4 s',
      within: seconds <= 4,
    });
  }
  return figures;
}
