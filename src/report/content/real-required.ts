import { formatTolerance } from '../../parts/tolerance.ts';
import { formatFixed } from '../../quantity/format.ts';
import type { Build } from '../../record/design-record.ts';

/** What is asked of the network as it is built, each with its name. */
export function realRequired(build: Build | null): readonly (readonly [string, string])[] {
  if (build === null) return [['Real parts', 'not asked for: every figure is that of exact, ideal parts']];
  const { leastYield, vswr, derating, pairs } = build;
  return [
    [
      'Real parts',
      `${originWords(build, 'inductor')}; ${originWords(build, 'capacitor')}${pairs ? '; two may stand for one' : ''}`,
    ],
    ['Yield', leastYield === null ? 'not required' : `at least ${trimmed(leastYield * 100)} %`],
    [
      'Stress',
      `${trimmed(derating * 100)} % of a rating may be used${vswr === null ? '' : ', with the load up to a VSWR of ' + String(vswr)}`,
    ],
  ];
}

function originWords({ inductor, capacitor, stock }: Build, part: 'inductor' | 'capacitor'): string {
  const { origin, tolerance } = part === 'inductor' ? inductor : capacitor;
  const allowed = formatTolerance(tolerance, part);
  const from = {
    exact: `of exact value, ${allowed}`,
    wound: `wound by hand, ${allowed}`,
    stock: stock === null ? 'from the stock list' : `from the stock list ${stock.name}`,
  }[origin as 'exact'] as string | undefined;
  return `${part}s ${from ?? `of series ${origin}, ${allowed}`}`;
}

const trimmed = (value: number): string => formatFixed(value, 2).replace(/\.?0+$/u, '');
