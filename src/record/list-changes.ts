import type { Change, ChangeGroup } from './change.ts';
import { changeOf, none, type Statement } from './statement.ts';

const removed = 'removed';

/**
 * Between two lists of named things: what was added, removed and changed, and whether those that stayed stand in another
 * order. Things of one name are told apart by their order.
 *
 * @param ordered what is said to have an order: "Load states"
 */
export function listChanges(
  group: ChangeGroup,
  ordered: string,
  before: readonly Statement[],
  after: readonly Statement[],
): readonly Change[] {
  const [old, now] = [keyed(before), keyed(after)];
  const changes: Change[] = [];
  for (const [key, statement] of old) {
    const kept = now.get(key);
    if (kept === undefined) {
      const { what, words, exact } = statement;
      changes.push({ group, what, before: words === removed ? exact() : words, after: removed });
    } else {
      const change = changeOf(group, statement, kept);
      if (change !== null) changes.push(change);
    }
  }
  for (const [key, { what, words }] of now) {
    if (!old.has(key)) changes.push({ group, what, before: none, after: `added: ${words}` });
  }
  const [orderBefore, orderAfter] = [order(old, now), order(now, old)];
  if (orderBefore !== orderAfter) {
    changes.push({ group, what: `Order of ${ordered}`, before: orderBefore, after: orderAfter });
  }
  return changes;
}

function keyed(statements: readonly Statement[]): ReadonlyMap<string, Statement> {
  const map = new Map<string, Statement>();
  for (const statement of statements) {
    let key = statement.what;
    for (let k = 2; map.has(key); k += 1) key = `${statement.what} (${k})`;
    map.set(key, statement);
  }
  return map;
}

const order = (of: ReadonlyMap<string, Statement>, other: ReadonlyMap<string, Statement>): string =>
  [...of.keys()].filter((key) => other.has(key)).join('; ');
