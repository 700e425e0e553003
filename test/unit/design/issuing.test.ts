import { describe, expect, it } from 'vitest';
import { lacksForIssue } from '../../../src/design/issuing.ts';
import type { Dossier } from '../../../src/dossier.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { plainBuilt, plainDossier, plainOption, withOption } from './plain-dossier.ts';

const signed = { name: 'N', role: '', date: '2026-01-31', remark: '' };
const ready: Dossier = {
  ...plainDossier,
  record: {
    ...plainDossier.record,
    signOff: { state: 'for review', prepared: signed, checked: signed, approved: signed },
  },
};
const withRecord = (change: Partial<DesignRecord>, dossier = ready): Dossier => ({
  ...dossier,
  record: { ...dossier.record, ...change },
});
const identity = (change: Partial<DesignRecord['identity']>): Dossier =>
  withRecord({ identity: { ...ready.record.identity, ...change } });

describe('lacksForIssue(dossier)', () => {
  it('is empty where everything is met, verified and signed', () => {
    expect(lacksForIssue(ready)).toEqual([]);
  });

  it('asks for all three names with their dates', () => {
    const { signOff } = plainDossier.record;
    expect(
      lacksForIssue(withRecord({ signOff: { ...signOff, prepared: signed, checked: { ...signed, date: '' } } })),
    ).toEqual(['“checked” lacks its date', '“approved” lacks its name and its date']);
    expect(
      lacksForIssue(withRecord({ signOff: { ...ready.record.signOff, approved: { ...signed, name: ' ' } } })),
    ).toEqual(['“approved” lacks its name']);
  });

  it('asks for what identifies the document', () => {
    expect(lacksForIssue(identity({ number: 'unnumbered' }))).toEqual(['the document has no number']);
    expect(lacksForIssue(identity({ title: '', number: '', revision: ' ' }))).toEqual([
      'the document has no title',
      'the document has no number',
      'the document has no revision',
    ]);
  });

  it('asks a later revision what it changes', () => {
    const history = [{ revision: 'A', date: '2026-01-31', change: '', digest: '' }];
    expect(lacksForIssue(withRecord({ history }))).toEqual(['what this revision changes, and why, is not said']);
    expect(lacksForIssue(withRecord({ history }, identity({ change: 'wider band' })))).toEqual([]);
  });

  it('asks for a written deviation from each requirement that is not met', () => {
    const checks = [
      { subject: 'return loss', verdict: 'falls short', reason: '12 dB, below 14 dB' },
      { subject: 'DC block', verdict: 'falls short', reason: 'DC passes' },
      { subject: 'part values', verdict: 'meets', reason: '' },
    ] as const;
    const short = withOption({ checks, meets: false }, ready);
    expect(lacksForIssue(short)).toEqual([
      'return loss falls short and no deviation is written: 12 dB, below 14 dB',
      'DC block falls short and no deviation is written: DC passes',
    ]);
    const reasoned = { subject: 'return loss', reason: 'accepted' } as const;
    expect(lacksForIssue(withRecord({ deviations: [reasoned, { subject: 'DC block', reason: ' ' }] }, short))).toEqual([
      'DC block falls short and no deviation is written: DC passes',
    ]);
    expect(lacksForIssue(withRecord({ deviations: [reasoned, { subject: 'DC block', reason: 'x' }] }, short))).toEqual(
      [],
    );
  });

  it('asks every piece of evidence to pass', () => {
    const [check] = ready.evidence!.checks;
    const evidence = {
      ...ready.evidence!,
      pass: false,
      checks: [check!, { ...check!, subject: 'transducer gain', pass: false }],
    };
    expect(lacksForIssue({ ...ready, evidence })).toEqual(['the evidence on transducer gain fails']);
    expect(lacksForIssue({ ...ready, evidence: null })).toEqual(['nothing verifies the network']);
  });

  it('refuses a figure above the ceiling, unless the ceiling is an estimate', () => {
    const above = withOption({ ceilingGapDb: -0.1 }, ready);
    expect(lacksForIssue(above)).toEqual([
      'the worst return loss is above the ceiling, which no lossless network can be',
    ]);
    expect(lacksForIssue({ ...above, ceiling: { ...ready.ceiling!, estimate: true } })).toEqual([]);
    expect(lacksForIssue(withOption({ ceilingGapDb: -1e-9 }, ready))).toEqual([]);
  });

  it('waits for real parts where they are asked for', () => {
    const build = {} as NonNullable<DesignRecord['build']>;
    expect(lacksForIssue(withRecord({ build }))).toEqual(['real parts are asked for and not yet worked out']);
    expect(lacksForIssue(withRecord({ build }, withOption({ built: plainBuilt }, ready)))).toEqual([]);
  });

  it('asks for a network', () => {
    expect(lacksForIssue({ ...ready, options: [plainOption], chosen: null })).toEqual(['there is no network']);
  });
});
