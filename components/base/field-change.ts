import type { FieldName } from '../../src/record/fields.ts';

export interface FieldChange {
  readonly name: FieldName;
  /** The text as typed or chosen. */
  readonly value: string;
}

/** The event by which every field speaks: crosses shadow roots, so that only the sheet listens. */
export const fieldChange = (name: FieldName, value: string): CustomEvent<FieldChange> =>
  new CustomEvent('field-change', { detail: { name, value }, bubbles: true, composed: true });
