import { describe, expect, it } from 'vitest';
import { differenceMarkdown, differenceText } from '../../../src/design/difference-text.ts';
import type { Change } from '../../../src/record/change.ts';

const changes: readonly Change[] = [
  { group: 'verdicts', what: 'Requirement', before: 'met', after: 'not met' },
  { group: 'requirement', what: 'Band', before: '150.5 MHz to 152 MHz', after: '150 MHz to 153 MHz' },
  {
    group: 'requirement',
    what: 'Available power',
    before: 'not stated',
    after: 'a long reason that has to go on below itself\nand a line',
  },
];

describe('differenceText(changes)', () => {
  it('aligns columns under a heading for each group, in the order of the groups', () => {
    expect(differenceText(changes)).toBe(
      [
        'Requirement',
        '  Band             150.5 MHz to 152 MHz  ->  150 MHz to 153 MHz',
        '  Available power  not stated            ->  a long reason that has to go on',
        '                                             below itself',
        '                                             and a line',
        '',
        'Verdicts',
        '  Requirement  met  ->  not met',
        '',
      ].join('\n'),
    );
  });

  it('says that nothing changed', () => {
    expect(differenceText([])).toBe('Nothing changed.\n');
    expect(differenceMarkdown([])).toBe('Nothing changed.\n');
  });

  it('keeps every line below 100 letters and loses none', () => {
    const long = 'wörd😀'.repeat(200);
    const text = differenceText([{ group: 'selection', what: long, before: `${long} ${long}`, after: long }]);
    const lines = text.split('\n');
    expect(Math.max(...lines.map((line) => Array.from(line).length))).toBeLessThan(100);
    expect(lines.join('').replace(/[^w]/gu, '').length).toBe(4 * 200);
    expect(text.isWellFormed()).toBe(true);
  });
});

describe('differenceMarkdown(changes)', () => {
  it('writes a table for each group, and nothing that Markdown would take for its own', () => {
    const [, band] = changes;
    expect(differenceMarkdown([{ ...band!, before: 'a|b *c*\nd_e', after: '<img>&' }])).toBe(
      [
        '### Requirement',
        '',
        '| What | Before | After |',
        '| --- | --- | --- |',
        '| Band | a\\|b \\*c\\*<br>d\\_e | \\<img\\>&amp; |',
        '',
      ].join('\n'),
    );
  });
});
