import { describe, expect, it } from 'vitest';
import { foldWords } from '../../../../components/build-part/fold-words.ts';

const state = (fields: Record<string, string>, understood: Record<string, string> = {}) => ({
  fields,
  understood,
  problems: {},
});

describe('foldWords(names, state)', () => {
  it('names what differs from nothing', () => {
    const typed = state({ stray: '0.3p', lead: '0 H', esl: '0 nH' }, { stray: '300 fF', lead: '0 H', esl: '0 H' });
    expect(foldWords(['esl', 'stray', 'lead'], typed)).toBe('stray 300 fF');
  });

  it('says so where there is nothing', () => {
    expect(foldWords(['esl', 'stray', 'lead'], state({}))).toBe('none assumed');
  });

  it('always tells how networks are drawn', () => {
    const typed = state({ 'load-spread': '10%' }, { 'load-spread': '10.0 %', 'source-spread': '0.0 %' });
    expect(foldWords(['distribution', 'source-spread', 'load-spread', 'samples', 'seed', 'least-yield'], typed)).toBe(
      'uniform; load ±10.0 %; networks drawn: 1000; seed 1',
    );
  });
});
