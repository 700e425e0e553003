import type { Change } from './change.ts';
import type { LoadState } from './design-record.ts';
import { listChanges } from './list-changes.ts';
import { changeOf, same, text } from './statement.ts';
import { terminationStatement } from './termination-statement.ts';

/** Between the load states: a state that has another name and is the same otherwise was renamed. */
export function loadChanges(before: readonly LoadState[], after: readonly LoadState[]): readonly Change[] {
  const [onlyBefore, onlyAfter] = [without(before, after), without(after, before)];
  const names = new Map<string, string>();
  for (const state of onlyBefore) {
    const now = onlyAfter.find(
      ({ name, termination }) =>
        ![...names.values()].includes(name) &&
        (same(termination, state.termination) || (before.length === 1 && after.length === 1)),
    );
    if (now !== undefined) names.set(state.name, now.name);
  }
  const renamed = before.map((state) => ({ ...state, name: names.get(state.name) ?? state.name }));
  return [
    ...[...names]
      .map(([was, is]) => changeOf('terminations', text('Name of a load state', was), text('Name of a load state', is)))
      .filter((change) => change !== null),
    ...listChanges('terminations', 'the load states', renamed.map(statement), after.map(statement)),
  ];
}

const without = (these: readonly LoadState[], those: readonly LoadState[]): readonly LoadState[] =>
  these.filter(({ name }) => !those.some((other) => other.name === name));

const statement = ({ name, termination }: LoadState) =>
  terminationStatement(name === '' ? 'Load' : `Load, ${name}`, termination);
