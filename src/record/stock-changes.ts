import type { StockList, StockPart } from '../parts/stock.ts';
import { formatTolerance } from '../parts/tolerance.ts';
import { formatRead } from '../quantity/format.ts';
import { canonical } from './canonical.ts';
import type { Change } from './change.ts';
import { listChanges } from './list-changes.ts';
import { changeOf, none, type Statement } from './statement.ts';

/** Lines told one by one; of more, how many there are says enough. */
const mostNamed = 10;

/** Between two stock lists: the file, how many lines are otherwise, and the first of them by name. */
export function stockChanges(before: StockList | null, after: StockList | null): readonly Change[] {
  const file = changeOf('parts', listStatement(before), listStatement(after));
  const lines = before === null || after === null ? [] : lineChanges(before.parts, after.parts);
  return [...(file === null ? [] : [file]), ...lines];
}

/** A list may have thousands of lines: only those are written that are told. */
function lineChanges(before: readonly StockPart[], after: readonly StockPart[]): readonly Change[] {
  const [old, now] = [before.map(contents), after.map(contents)];
  const [gone, come] = [without(before, old, now), without(after, now, old)];
  if (gone.length === 0 && come.length === 0) {
    return old.every((each, k) => each === now[k])
      ? []
      : [
          {
            group: 'parts',
            what: 'Order of the stock lines',
            before: 'as it was',
            after: 'another, of the same lines',
          },
        ];
  }
  const [wasNamed, isNamed] = [namesOf(gone), namesOf(come)];
  const names = [...new Set([...wasNamed, ...isNamed])];
  const told = new Set(names.slice(0, mostNamed));
  const statements = (parts: readonly StockPart[]) => parts.filter(({ name }) => told.has(name)).map(line);
  const changes = listChanges('parts', 'the stock lines', statements(gone), statements(come));
  if (names.length <= mostNamed) return changes;
  const more = names.filter((name) => !wasNamed.has(name)).length;
  const fewer = names.filter((name) => !isNamed.has(name)).length;
  const otherwise = names.length - more - fewer;
  return [
    {
      group: 'parts',
      what: 'Stock lines',
      before: String(before.length),
      after: `${String(after.length)}: ${String(more)} added, ${String(fewer)} removed, ${String(otherwise)} otherwise; ${String(mostNamed)} of them follow`,
    },
    ...changes,
  ];
}

/** Lines whose contents the other list doesn't have, or has less often. */
function without(parts: readonly StockPart[], own: readonly string[], other: readonly string[]): readonly StockPart[] {
  const left = new Map<string, number>();
  for (const each of other) left.set(each, (left.get(each) ?? 0) + 1);
  return parts.filter((_, k) => {
    const count = left.get(own[k]!) ?? 0;
    left.set(own[k]!, count - 1);
    return count <= 0;
  });
}

const namesOf = (parts: readonly StockPart[]): ReadonlySet<string> => new Set(parts.map(({ name }) => name));

/** All that a line says, in one order of its fields. */
const contents = (part: StockPart): string =>
  JSON.stringify([
    part.name,
    part.kind,
    part.value,
    part.tolerance?.kind,
    part.tolerance?.value,
    part.q,
    part.qAtHz,
    part.selfResonanceHz,
    part.eslH,
    part.ratedVolts,
    part.ratedAmps,
  ]);

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
