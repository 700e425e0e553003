import type { AsBuilt } from '../../src/record/design-record.ts';
import { fieldNames, type FieldName, type Fields } from '../../src/record/fields.ts';
import type { Settled } from './settle.ts';

/** What was typed or measured since a record was issued: it waits for the next revision. */
export interface Waiting {
  /** Texts of the issued record, as they stand in it. */
  readonly issued: Fields;
  /** The finished board, where it was measured, described or left out since; undefined: it wasn't. */
  readonly board?: AsBuilt | null;
}

/** An issued record that can be read is frozen; one that can't be has to be corrected first. */
export const isFrozen = ({ fields, problems }: Settled): boolean =>
  fields.state === 'issued' && Object.keys(problems).length === 0;

/** Fields in which another text stands than the record was issued with. */
export const changedFields = (issued: Fields, typed: Fields): readonly FieldName[] =>
  fieldNames.filter((name) => (issued[name] ?? '') !== (typed[name] ?? ''));

/** @returns null where what is typed is what was issued */
export const waitingFor = (waiting: Waiting, typed: Fields): Waiting | null =>
  waiting.board === undefined && changedFields(waiting.issued, typed).length === 0 ? null : waiting;
