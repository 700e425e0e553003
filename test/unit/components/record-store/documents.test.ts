import { describe, expect, it } from 'vitest';
import { documentsOf, duplicateOf, matches, noteOf, stateOf } from '../../../../components/record-store/documents.ts';
import { issuedEntry, newDraft, type Entry } from '../../../../components/record-store/entry.ts';
import type { Fields } from '../../../../src/record/fields.ts';
import { plainRecord } from '../../record/plain-record.ts';

const draft = (fields: Fields, savedAt = 1): Entry => newDraft('two-element', fields, savedAt);
const issued = (revision: string, date: string, savedAt = 1): Entry =>
  issuedEntry('two-element', { ...plainRecord, identity: { ...plainRecord.identity, revision, date } }, 'x', savedAt);

describe('documentsOf(entries)', () => {
  it('puts together what has one number, drafts first, the newest of each first', () => {
    const entries = [
      issued('A', '2026-01-31'),
      draft({ number: ' EX-014 ', revision: 'C' }, 3),
      issued('B', '2026-02-01'),
      issued('10', '2026-02-01'),
      issued('9', '2026-02-01'),
    ];
    const [one, ...others] = documentsOf(entries);
    expect(others).toEqual([]);
    expect(one!.number).toBe('EX-014');
    expect(one!.entries.map(({ fields }) => fields.revision)).toEqual(['C', 'B', '10', '9', 'A']);
  });

  it('takes drafts without a number for documents of their own, the last worked on first', () => {
    const entries = [
      draft({ title: 'a' }, 1),
      draft({ number: '', title: 'b' }, 3),
      draft({ number: 'unnumbered' }, 2),
    ];
    expect(documentsOf(entries).map(({ title }) => title)).toEqual(['b', 'Matching network', 'a']);
  });
});

describe('matches(entry, search)', () => {
  it.each([
    ['', true],
    ['  ', true],
    ['ex-014', true],
    ['WHIP issued', true],
    ['whip draft', false],
    ['2026-01', true],
  ])('%j: %s', (search, found) => expect(matches(issued('A', '2026-01-31'), search)).toBe(found));

  it('leaves accents out of account', () => expect(matches(draft({ title: 'Pegel Süd' }), 'sud')).toBe(true));
});

describe('stateOf(entry)', () => {
  it('calls a draft issued only where it is kept frozen', () => {
    expect(stateOf(draft({ state: 'issued' }))).toBe('draft');
    expect(stateOf(draft({ state: 'for review' }))).toBe('for review');
    expect(stateOf(issued('A', '2026-01-31'))).toBe('issued');
  });
});

describe('noteOf(entry, others)', () => {
  it('tells a draft of a revision that is issued, and one that was kept apart', () => {
    const frozen = issued('A', '2026-01-31');
    const late = draft({ number: 'EX-014', revision: ' A' });
    expect(noteOf(late, [frozen, late])).toBe('Revision A is issued already.');
    expect(noteOf(frozen, [frozen, late])).toBe('');
    expect(noteOf({ ...draft({}), apart: true }, [])).toMatch(/^Kept apart/);
  });
});

describe('duplicateOf(entry, body, savedAt)', () => {
  it('is an unsigned draft of a document of its own', () => {
    const { entry, body } = duplicateOf(issued('C', '2026-01-31'), { record: plainRecord }, 7);
    expect(entry).toMatchObject({ kind: 'draft', version: 0, savedAt: 7, seal: '' });
    expect(entry.fields).toMatchObject({
      title: 'Copy of Transmitter to whip',
      number: 'unnumbered',
      revision: 'A',
      state: 'draft',
      frequency: '151.25 MHz',
    });
    expect(body).toMatchObject({ record: null, kept: { history: [], previous: null, asBuilt: null } });
  });

  it('keeps the title within what a record takes, no letter halved', () => {
    const { entry } = duplicateOf(draft({ title: '🎛'.repeat(60) }), { record: plainRecord }, 7);
    expect(entry.fields.title!.length).toBeLessThanOrEqual(120);
    expect(entry.fields.title).not.toMatch(/\p{Surrogate}/u);
  });
});
