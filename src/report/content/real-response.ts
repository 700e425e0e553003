import type { Built, Percentiles, Response } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { formatFixed, formatRead } from '../../quantity/format.ts';
import type { DesignRecord } from '../../record/design-record.ts';
import { plain, type Block, type Row } from '../page/block.ts';
import { namedFrequencies, sampleAt } from './words.ts';

/** The spread of real parts, its load states in the order of the responses; null where it was not worked out. */
export function percentilesBy(responses: readonly Response[], built: Built | null): Percentiles | null {
  const found = built?.percentiles ?? null;
  if (found === null) return null;
  const states = responses.flatMap(({ state }) => found.states.filter((each) => each.state === state));
  return states.length === 0 ? null : { ...found, states };
}

const share = (fraction: number): string => `${formatFixed(fraction * 100, 0)} %`;

/** What the plot shows of real parts. */
export function bandWords(real: Percentiles | null, { build, loads }: DesignRecord): string {
  if (real === null) return '';
  const { fractions, states } = real;
  const of = loads.length > 1 ? ` into ${states[0]!.state}` : '';
  return `Of real parts${of}: the nominal curve, and the band between the curves that ${share(fractions[0]!)} and ${share(fractions.at(-1)!)} of ${String(build?.samples ?? 0)} networks lie below.`;
}

/** Return loss of real parts at the frequencies that the requirement names. */
export function realFiguresAt(real: Percentiles, requirement: DesignRecord['requirement']): readonly Block[] {
  const several = real.states.length > 1;
  const rows = real.states.flatMap((swept, state) =>
    namedFrequencies(requirement).flatMap(([name, hertz], k): readonly Row[] => {
      const at = sampleAt(swept, hertz);
      if (at < 0) return [];
      const first = k > 0 ? '' : `${swept.state}${state === 0 ? ' (governs)' : ''}`;
      const figures = [swept.nominalDb, ...swept.curvesDb].map((curve) => returnLossWords(curve[at] ?? 0));
      return [{ cells: [several ? first : name, formatRead(hertz, 'Hz'), ...figures].map((cell) => [plain(cell)]) }];
    }),
  );
  if (rows.length === 0) return [];
  return [
    { kind: 'heading', text: 'Return loss of real parts' },
    {
      kind: 'table',
      columns: [
        { title: several ? 'Load state' : 'At', share: 22 },
        { title: 'Frequency', share: 17, align: 'end' },
        { title: 'Parts at their values', share: 20, align: 'end' },
        ...real.fractions.map((fraction) => ({
          title: `${share(fraction)} of networks\u00a0below`,
          share: 16,
          align: 'end' as const,
        })),
      ],
      rows,
    },
  ];
}
