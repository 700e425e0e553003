import { rangeOf } from '../network/termination-at.ts';
import { isMeasured } from '../network/termination.ts';
import { formatQuantity } from '../quantity/format.ts';
import { InputError } from '../quantity/problem.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { frequencySpan } from './words.ts';

/** Frequencies that every termination speaks of, Hz; null: all. */
export function reachOf({ source, loads }: DesignRecord): Span | null {
  const ranges = [source, ...loads.map(({ termination }) => termination)]
    .map(rangeOf)
    .filter((range) => range !== null);
  if (ranges.length === 0) return null;
  return {
    low: Math.max(...ranges.map(({ low }) => low)),
    high: Math.min(...ranges.map(({ high }) => high)),
  };
}

/**
 * Measured data are never extrapolated: what is asked must lie within them.
 *
 * @throws InputError naming the field that reaches outside
 */
export function checkReach(record: DesignRecord, reach: Span | null): void {
  if (reach === null) return;
  const { frequencyHz, bandHz } = record.requirement;
  if (!(reach.low < reach.high)) {
    throw new InputError({
      field: 'load',
      read: '',
      why: 'the terminations have no frequency in common',
      would: 'give data that overlap',
    });
  }
  const several = [record.source, ...record.loads.map(({ termination }) => termination)].filter(isMeasured).length > 1;
  const data = `${several ? 'what all the data share' : 'the data'}, ${frequencySpan(reach)}`;
  const outside = (field: string, read: string, why: string): InputError =>
    new InputError({ field, read, why, would: 'stay within them or measure further' });
  if (frequencyHz < reach.low || frequencyHz > reach.high) {
    throw outside('frequency', formatQuantity(frequencyHz, 'Hz'), `the design frequency is outside ${data}`);
  }
  for (const [field, span] of [
    ['band', bandHz],
    ['sweep', record.sweepHz],
  ] as const) {
    if (span !== null && (span.low < reach.low || span.high > reach.high)) {
      throw outside(field, frequencySpan(span), `it reaches outside ${data}`);
    }
  }
}
