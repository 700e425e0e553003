import type { Built, Check, Option } from '../dossier.ts';
import type { Arm } from '../network/arm.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { checksOf, verdictOf } from './checks.ts';
import { yieldWords } from './words.ts';
import { power } from '../quantity/elementary.ts';

/** An option as it is with real parts: what is required is asked of those. */
export function withBuilt(record: DesignRecord, option: Option, built: Built): Option {
  const arms = built.parts.map(({ arm, part, value }): Arm => ({ arm, part, value }));
  const worst = { gammaSquared: power(10, -built.worstReturnLossDb / 10), atHz: built.worstAtHz };
  const designators = built.parts.map(({ designator }) => designator);
  const checks = [
    ...checksOf(record, arms, designators, worst, built.worstState, option.dc, 'with real parts '),
    ...yieldCheck(record, built),
    ...stressCheck(built),
  ];
  return { ...option, built, checks, ...verdictOf(checks) };
}

function yieldCheck({ build }: DesignRecord, { yield: found }: Built): readonly Check[] {
  const least = build?.leastYield ?? null;
  if (least === null || found === null) return [];
  const good = found.value >= least;
  return [
    {
      subject: 'yield',
      verdict: good ? 'meets' : 'falls short',
      reason: `yield ${yieldWords(found)}, ${good ? 'at least' : 'below'} the ${String(Number((least * 100).toPrecision(6)))} % required`,
    },
  ];
}

const stressCheck = ({ stress }: Built): readonly Check[] =>
  stress === null || stress.within === null
    ? []
    : [{ subject: 'stress', verdict: stress.within ? 'meets' : 'falls short', reason: stress.words }];
