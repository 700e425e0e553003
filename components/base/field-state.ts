import type { FieldName, Fields } from '../../src/record/fields.ts';

/** What the fields of a sheet need to know: the texts as typed, what was read, and in one line what couldn't be. */
export interface FieldState {
  readonly fields: Fields;
  readonly understood: Partial<Record<FieldName, string>>;
  readonly problems: Partial<Record<FieldName, string>>;
}

export const emptyFieldState: FieldState = { fields: {}, understood: {}, problems: {} };
