import type { Dossier } from '../../dossier.ts';
import { modelWords } from '../../network/read-model.ts';
import { terminationAt } from '../../network/termination-at.ts';
import { isMeasured, isModel, type Termination } from '../../network/termination.ts';
import { formatImpedance, formatImpedanceRead, formatRead } from '../../quantity/format.ts';
import { plain, type Block, type Paragraph, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { spanRead } from './words.ts';

const behaviours = {
  constant: 'held constant',
  series: 'R in series with the L or C that X means at f₀',
  parallel: 'R in parallel with the L or C that X means at f₀',
} as const;

/** Source and every load state: where its impedance comes from, and what it is taken to do away from f₀. */
export function terminations({ record }: Dossier): readonly Block[] {
  const { source, loads, requirement } = record;
  const f0 = requirement.frequencyHz;
  const ends = [
    { name: 'Source, ZS', termination: source },
    ...loads.map(({ name, termination }) => ({ name: name === '' ? 'Load, ZL' : `Load, ${name}`, termination })),
  ];
  return [
    { kind: 'heading', number: parts.terminations, text: 'Terminations' },
    {
      kind: 'table',
      columns: [
        { title: 'End', share: 30 },
        { title: `Impedance at ${formatRead(f0, 'Hz')}`, share: 26 },
        { title: 'Given as, and away from f₀', share: 44 },
      ],
      rows: ends.map(({ name, termination }) => row(name, termination, f0)),
    },
  ];
}

function row(name: string, termination: Termination, f0: number): Row {
  const { source, below } = sourceOf(termination);
  return {
    cells: [[plain(name)], [plain(impedanceAt(termination, f0))], [plain(source)]],
    ...(below.length === 0 ? {} : { below: { from: 1, paragraphs: below } }),
  };
}

function impedanceAt(termination: Termination, f0: number): string {
  if (isMeasured(termination) || isModel(termination)) {
    const { re, im } = terminationAt(termination, f0, f0);
    return formatImpedance(re, im);
  }
  return formatImpedanceRead(termination.r, termination.x);
}

function sourceOf(termination: Termination): { readonly source: string; readonly below: readonly Paragraph[] } {
  if (isModel(termination)) return { source: `circuit model ${modelWords(termination)}`, below: [] };
  if (!isMeasured(termination)) {
    const { x, behaviour } = termination;
    return { source: x === 0 ? 'the same at every frequency' : behaviours[behaviour], below: [] };
  }
  const { name, sha256, samples, frequencyHz, referenceOhm } = termination.measured;
  const span = spanRead({ low: frequencyHz[0]!, high: frequencyHz[frequencyHz.length - 1]! }, 'Hz');
  return {
    source: `measured: ${name}, ${String(samples)} samples, ${span}, reference ${formatRead(referenceOhm, 'Ω')}; interpolated in Γ, never extrapolated`,
    below: [plain(`SHA-256 ${sha256}`, 'small')],
  };
}
