import type { StockList, StockPart } from '../parts/stock.ts';
import { formatTolerance } from '../parts/tolerance.ts';
import { formatRead } from '../quantity/format.ts';
import { canonical } from './canonical.ts';
import type { Change } from './change.ts';
import { listChanges, removed } from './list-changes.ts';
import { changeOf, none, type Statement } from './statement.ts';

/** Lines told one by one; of more, how many there are says enough. */
const mostNamed = 10;

/** Between two stock lists: the file, how many lines are otherwise, and the first of them by name. */
export function stockChanges(before: StockList | null, after: StockList | null): readonly Change[] {
  const file = changeOf('parts', listStatement(before), listStatement(after));
  const files = file === null ? [] : [file];
  if (before === null || after === null) return files;
  const lines = listChanges('parts', 'the stock lines', before.parts.map(line), after.parts.map(line));
  if (lines.length <= mostNamed) return [...files, ...lines];
  const count = (kind: (change: Change) => boolean): number => lines.filter(kind).length;
  const more = count((change) => change.before === none);
  const fewer = count((change) => change.after === removed);
  return [
    ...files,
    {
      group: 'parts',
      what: 'Stock lines',
      before: String(before.parts.length),
      after: `${String(after.parts.length)}: ${String(more)} added, ${String(fewer)} removed, ${String(lines.length - more - fewer)} otherwise; ${String(mostNamed)} of them follow`,
    },
    ...lines.slice(0, mostNamed),
  ];
}

const listStatement = (list: StockList | null): Statement => ({
  what: 'Stock list',
  value: list === null ? null : { name: list.name, sha256: list.sha256 },
  words:
    list === null
      ? none
      : `${list.name}, ${String(list.parts.length)} ${list.parts.length === 1 ? 'line' : 'lines'}, SHA-256 ${list.sha256.slice(0, 16)}…`,
  exact: () => (list === null ? none : `${JSON.stringify(list.name)}, SHA-256 ${list.sha256}`),
});

function line(part: StockPart): Statement {
  const { name, kind, value, tolerance, q, qAtHz, selfResonanceHz, eslH, ratedVolts, ratedAmps } = part;
  const words = [
    `${formatRead(value, kind === 'inductor' ? 'H' : 'F')}${tolerance === null ? '' : ` ${formatTolerance(tolerance, kind)}`}`,
    q === null ? '' : `Q ${String(q)}${qAtHz === null ? '' : ` at ${formatRead(qAtHz, 'Hz')}`}`,
    selfResonanceHz === null ? '' : `self-resonance ${formatRead(selfResonanceHz, 'Hz')}`,
    eslH === null ? '' : `ESL ${formatRead(eslH, 'H')}`,
    ratedVolts === null ? '' : formatRead(ratedVolts, 'V'),
    ratedAmps === null ? '' : formatRead(ratedAmps, 'A'),
  ];
  return {
    what: `Stock line ${name}`,
    value: part,
    words: words.filter((each) => each !== '').join(', '),
    exact: () => canonical(part),
  };
}
