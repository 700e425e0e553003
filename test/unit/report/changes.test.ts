import { describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import type { Dossier } from '../../../src/dossier.ts';
import { lacksForIssue } from '../../../src/design/issuing.ts';
import { parts } from '../../../src/report/content/parts.ts';
import { report } from '../../../src/report/report.ts';
import { issued, revisionB } from './board.ts';
import { overlaps, readPdf } from './read-pdf.ts';
import { fonts } from './records.ts';

const revised = design(revisionB);
const read = async (dossier: Dossier, paper: 'a4' | 'letter' = 'a4') => {
  const { pages, text } = await readPdf(await report(dossier, { paper, fonts }));
  return { pages, text: text.replace(/\s+/gu, ' ') };
};
const inState = (dossier: Dossier, state: 'draft' | 'for review' | 'issued'): Dossier => ({
  ...dossier,
  record: { ...dossier.record, signOff: { ...dossier.record.signOff, state } },
});

describe('changes of a revision', { timeout: 30_000 }, () => {
  it.each(['a4', 'letter'] as const)('stand in a part of their own on %s, before and after', async (paper) => {
    const { pages, text } = await read(revised, paper);
    expect(text).toContain(`${parts.changes} Changes from revision A Before is revision A of 2026-11-30, SHA-256`);
    expect(text).toContain('Requirement Band 150.5 MHz to 152 MHz 150 MHz to 153 MHz');
    expect(text).toContain('Identity Revision A B');
    const told = revised.difference!.filter(({ group }) => group !== 'sign-off');
    expect(told.some(({ group }) => group === 'results')).toBe(true);
    for (const { what } of told) expect(text).toContain(what);
    expect(text).not.toContain('Prepared, date');
    expect(text).not.toMatch(/NaN|Infinity|undefined|null/u);
    for (const words of pages) expect(overlaps(words)).toEqual([]);
  });

  it('are pointed to on the first sheet', async () => {
    const { pages } = await read(revised);
    const first = pages[0]!.map((word) => word.text).join(' ');
    expect(first).toContain(`Band widened. Part ${parts.changes} tells each change.`);
  });

  it('are none of a first revision, and not told where the one before is lost, or not worked out', async () => {
    expect((await read(design(issued))).text).toContain('Changes from the revision before None: this is the first');
    const { record } = revised;
    const lost = { ...revised, record: { ...record, previous: null }, difference: null };
    expect((await read(lost)).text).toContain('Not told: the record of the revision before is not with this one.');
    expect((await read({ ...revised, difference: null })).text).toContain('Not told: they were not worked out.');
    expect((await read({ ...revised, difference: [] })).text).toContain('Nothing changed.');
  });

  it('are readable where a text of 500 letters took the place of another', async () => {
    const long = { group: 'selection', what: 'Reason', before: 'W'.repeat(500), after: 'i'.repeat(500) } as const;
    const named = {
      ...revised.record,
      previous: { ...issued, identity: { ...issued.identity, revision: long.before } },
    };
    const { pages, text } = await read({ ...revised, record: named, difference: [long] });
    expect(text).toContain('Changes from the revision before');
    for (const words of pages) {
      expect(overlaps(words)).toEqual([]);
      for (const word of words) expect(word.x + word.width).toBeLessThan(595 - 42);
    }
  });
});

describe('what lacks before issue', { timeout: 30_000 }, () => {
  it('is listed by the sign-off of what is for review', async () => {
    const dossier = inState(revised, 'for review');
    const lacks = lacksForIssue(dossier);
    expect(lacks.length).toBeGreaterThan(0);
    const { text } = await read(dossier);
    expect(text).toContain('What lacks before issue –');
    for (const each of lacks) expect(text).toContain(each.slice(1).replaceAll("'", '’'));
    expect(text).not.toContain('marked as issued');
  });

  it('is listed of what is marked as issued all the same, and not of a draft', async () => {
    expect((await read(inState(revised, 'issued'))).text).toContain('It is marked as issued all the same.');
    expect((await read(inState(revised, 'draft'))).text).not.toContain('What lacks before issue');
  });

  it('is nothing of what was issued in order', async () => {
    const dossier = design(issued);
    expect(lacksForIssue(dossier)).toEqual([]);
    expect((await read(dossier)).text).not.toContain('What lacks before issue');
  });
});
