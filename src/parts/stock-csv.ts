import { formatRead } from '../quantity/format.ts';
import type { StockColumn } from './read-stock-part.ts';
import type { StockPart } from './stock.ts';
import type { Tolerance } from './tolerance.ts';

/** The kind comes first: a line that began with a name such as "#7" would read as a comment. */
const columns: readonly StockColumn[] = [
  'kind',
  'name',
  'value',
  'tolerance',
  'Q',
  'Q frequency',
  'self-resonance',
  'ESL',
  'rated voltage',
  'rated current',
];

/** Parts as lines of a stock list (RFC 4180) that reads back to the same parts. */
export const stockCsv = (parts: readonly StockPart[]): string =>
  [columns, ...parts.map(cells)].map((row) => `${row.map(quoted).join(',')}\r\n`).join('');

function cells(part: StockPart): readonly string[] {
  const { name, kind, value, tolerance, q, qAtHz, selfResonanceHz, eslH, ratedVolts, ratedAmps } = part;
  const unit = kind === 'inductor' ? 'H' : 'F';
  const said = (known: number | null, of: 'Hz' | 'H'): string => (known === null ? '' : formatRead(known, of));
  const plain = (known: number | null): string => (known === null ? '' : String(known));
  return [
    kind,
    name,
    formatRead(value, unit),
    tolerance === null ? '' : written(tolerance, unit),
    plain(q),
    said(qAtHz, 'Hz'),
    said(selfResonanceHz, 'Hz'),
    said(eslH, 'H'),
    plain(ratedVolts),
    plain(ratedAmps),
  ];
}

/** To the last digit, which `formatTolerance` rounds for people. */
const written = ({ kind, value }: Tolerance, unit: 'H' | 'F'): string =>
  kind === 'absolute' ? formatRead(value, unit) : `${String(Number((value * 100).toPrecision(14)))} %`;

const quoted = (text: string): string => (/[",\r\n#;\t]/u.test(text) ? `"${text.replaceAll('"', '""')}"` : text);
