import { expect, it } from 'vitest';
import { newId } from '../../../../components/record-store/entry.ts';
import { keptAddress, keptIdIn } from '../../../../components/record-store/kept-address.ts';

it('keptIdIn(#keptAddress(id)) is the id', () => {
  const id = newId();
  expect(keptIdIn(`#${keptAddress(id)}`)).toBe(id);
});

it.each(['', '#', '#load=50', '#kept=', '#kept=../x', `#kept=${'0'.repeat(32)}&load=50`])(
  'keptIdIn(%j) is null',
  (hash) => expect(keptIdIn(hash)).toBeNull(),
);
