import { readPercent } from '../quantity/read-percent.ts';
import { formatFixed, formatRead } from '../quantity/format.ts';
import { read, refuse, type Reading } from '../quantity/reading.ts';
import type { StockList } from '../parts/stock.ts';
import { formatTolerance, readTolerance, type Tolerance } from '../parts/tolerance.ts';
import { readWire } from '../parts/read-wire.ts';
import { asksForParts, type FieldName } from './fields.ts';
import type { Kept } from './kept.ts';

/** The readers of `readDraft`, which keep what was understood and what can't be used. */
export interface Take {
  readonly fields: Readonly<Record<FieldName, string>>;
  readonly take: <T>(name: FieldName, reading: Reading<T>, words: (value: T) => string) => T | undefined;
  readonly quantity: (name: FieldName, unit: 'Hz' | 'H' | 'F' | 'V' | 'A' | 'W' | 'm') => number | undefined;
  readonly plainNumber: (name: FieldName) => number | string;
  readonly whole: (name: FieldName) => number | string;
  readonly yesNo: (name: FieldName) => boolean | string;
}

/** The build policy as typed, still to be checked; null where real parts aren't asked for. */
export function draftBuild({ fields, take, quantity, plainNumber, whole, yesNo }: Take, kept: Kept): unknown {
  if (asksForParts.every((name) => fields[name].trim() === '')) return null;
  const optional = (name: FieldName, unit: 'Hz' | 'V' | 'A' | 'W'): number | null | undefined =>
    fields[name].trim() === '' ? null : quantity(name, unit);
  const percent = (name: FieldName): number | undefined =>
    take(name, readPercent(fields[name]), (value) => `${formatFixed(value * 100, 1)} %`);
  const policy = (part: 'inductor' | 'capacitor') => ({
    origin: originOf(fields[`series-${part}`], fields.stock),
    tolerance: take<Tolerance>(`tolerance-${part}`, readTolerance(fields[`tolerance-${part}`], part), (value) =>
      formatTolerance(value, part),
    ),
    qSlope: plainNumber(`q-slope-${part}`),
  });
  const wire = (name: FieldName): number | undefined =>
    take(name, readWire(fields[name]), (value) => formatRead(value, 'm'));
  return {
    inductor: policy('inductor'),
    capacitor: policy('capacitor'),
    stock: take('stock', stockOf(fields.stock.trim(), kept), (list) =>
      list === null ? '' : `${String(list.parts.length)} parts`,
    ),
    pairs: yesNo('pairs'),
    selfResonanceHz: optional('self-resonance', 'Hz'),
    eslH: quantity('esl', 'H'),
    strayF: quantity('stray', 'F'),
    leadH: quantity('lead', 'H'),
    distribution: fields.distribution,
    sourceSpread: percent('source-spread'),
    loadSpread: percent('load-spread'),
    samples: whole('samples'),
    seed: whole('seed'),
    leastYield: fields['least-yield'].trim() === '' ? null : percent('least-yield'),
    vswr: fields.mismatch.trim() === '' ? null : plainNumber('mismatch'),
    derating: percent('derating'),
    ratedVolts: optional('rated-voltage', 'V'),
    ratedAmps: optional('rated-current', 'A'),
    ratedWatts: optional('rated-heat', 'W'),
    winding: { wireM: wire('wire'), formM: quantity('former', 'm'), gapM: quantity('gap', 'm') },
  };
}

/** A stock list alone means that parts come from it; a series in small letters is that series. */
function originOf(series: string, stock: string): string {
  const given = series.trim();
  if (given === '') return stock.trim() === '' ? 'exact' : 'stock';
  return /^e\d+$/u.test(given) ? given.toUpperCase() : given;
}

function stockOf(name: string, kept: Kept): Reading<StockList | null> {
  if (name === '') return read(null);
  const list = kept.stock.get(name);
  return list === undefined ? refuse('the list is not here', 'open the file again') : read(list);
}

/** One deviation a line: `return loss = accepted because ...`. */
export const readDeviations = (text: string): readonly { readonly subject: string; readonly reason: string }[] =>
  text
    .split('\n')
    .filter((line) => line.trim() !== '')
    .map((line) => {
      const [subject = '', ...reason] = line.split(' = ');
      return { subject: subject.trim(), reason: reason.join(' = ') };
    });
