import { InputError } from '../quantity/problem.ts';
import { digestOf } from './canonical.ts';
import type { DesignRecord, Signature } from './design-record.ts';

/** What starts a revision. */
export interface NextRevision {
  readonly revision: string;
  /** What it changes, and why. */
  readonly change: string;
  /** ISO 8601 calendar date. */
  readonly date: string;
}

/** An issued record is frozen: what is to change starts the next revision. */
export const frozen = ({ signOff }: DesignRecord): boolean => signOff.state === 'issued';

/**
 * The draft of the next revision. The issued one goes into its history and stays with it whole, without the one before
 * itself; who signs is kept, that they signed isn't; a measurement of boards built to the issued one stays with that.
 *
 * @throws InputError where the record isn't issued, the revision stands in its history, or no reason is given
 */
export function revise(record: DesignRecord, { revision, change, date }: NextRevision): DesignRecord {
  const { identity, history, signOff } = record;
  if (!frozen(record)) {
    throw new InputError({
      field: 'state',
      read: signOff.state,
      why: 'only an issued record is revised',
      would: 'change this one as it stands, or issue it first',
    });
  }
  if ([identity, ...history].some((earlier) => earlier.revision.trim() === revision.trim())) {
    throw new InputError({
      field: 'revision',
      read: revision,
      why: 'this revision exists already',
      would: 'give the next one',
    });
  }
  if (change.trim() === '') {
    throw new InputError({
      field: 'change',
      read: '',
      why: 'a revision needs its reason',
      would: 'say what it changes and why',
    });
  }
  return {
    ...record,
    identity: { ...identity, revision, date, change },
    history: [
      ...history,
      { revision: identity.revision, date: identity.date, change: identity.change, digest: digestOf(record) },
    ],
    previous: { ...record, previous: null },
    asBuilt: null,
    signOff: {
      state: 'draft',
      prepared: unsigned(signOff.prepared),
      checked: unsigned(signOff.checked),
      approved: unsigned(signOff.approved),
    },
  };
}

const unsigned = ({ name, role }: Signature): Signature => ({ name, role, date: '', remark: '' });
