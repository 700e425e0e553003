import { describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import { printedFigures } from '../../../src/design/printed-figures.ts';
import type { Dossier } from '../../../src/dossier.ts';
import { parts } from '../../../src/report/content/parts.ts';
import { report } from '../../../src/report/report.ts';
import { boardOf } from './board.ts';
import { overlaps, readPdf } from './read-pdf.ts';
import { readStructure, nodesOf } from './read-structure.ts';
import { demo, dossierOf, fonts } from './records.ts';

const record = demo('tide-gauge');
const designed = design(record);
const { ladder } = designed.options.find(({ id }) => id === designed.chosen)!.built!;
/** A board whose inductor is 12 % high, its analyser set from 130 MHz to 180 MHz. */
const high = {
  ...ladder,
  arms: ladder.arms.map((arm) => (arm.part === 'inductor' ? { ...arm, value: arm.value * 1.12 } : arm)),
};
const measured = design({ ...record, asBuilt: boardOf(record, high, { low: 130e6, high: 180e6, samples: 101 }) });

const flat = async (dossier: Dossier, paper: 'a4' | 'letter' = 'a4') => {
  const bytes = await report(dossier, { paper, fonts });
  const { pages, text } = await readPdf(bytes);
  return { bytes, pages, text: text.replace(/\s+/gu, ' ') };
};

describe('a report of a finished board', { timeout: 30_000 }, () => {
  it.each(['a4', 'letter'] as const)('tells file, digest, verdict, spans, causes and remedy on %s', async (paper) => {
    const { pages, text } = await flat(measured, paper);
    const { verdict, explanations, outside, remedy, sha256 } = measured.asBuilt!;
    expect(text).toContain(`${parts.finishedBoard} Finished board The finished board falls short of the requirement`);
    expect(text).toContain(`the return loss is ${verdict.worstReturnLossDb!.toFixed(2)} dB at worst`);
    expect(text).toContain(`board-7.s1p SHA-256 ${sha256}`);
    expect(text).toContain('Antenna on its bracket');
    expect(outside!.length).toBeGreaterThan(0);
    for (const { byDb } of outside!) expect(text).toContain(`${byDb.toFixed(2)} dB`);
    expect(explanations[0]).toMatchObject({ designator: 'L1' });
    expect(text).toContain(explanations[0]!.words.replaceAll("'", '’'));
    expect(text).toContain(remedy!.words);
    expect(text).not.toMatch(/NaN|Infinity|undefined|null/u);
    for (const words of pages) expect(overlaps(words)).toEqual([]);
  });

  it('says it on the first sheet', async () => {
    const { pages } = await flat(measured);
    const first = pages[0]!.map(({ text }) => text).join(' ');
    expect(first).toContain('The finished board falls short of the requirement (');
    expect(first).toContain(`see part ${parts.finishedBoard}.`);
  });

  it('draws measured over predicted, and says in words what is drawn', async () => {
    const { bytes, text } = await flat(measured);
    expect(text).toContain('measured on the finished board');
    expect(text).toContain('predicted: nominal, and 5 % to 95 % of networks');
    const { pages } = await readStructure(bytes);
    const alts = pages.flatMap((page) => nodesOf(page, 'Figure')).map(({ alt }) => alt);
    expect(alts.find((alt) => alt?.includes('finished board'))).toMatch(
      /measured between [\d.]+ dB and [\d.]+ dB; predicted at the same frequencies between/u,
    );
  });

  it('says that none was measured, or that there is nothing to compare', async () => {
    expect((await flat(dossierOf('tide-gauge'))).text).toContain('Finished board None was measured for this revision.');
    const far = design({ ...record, asBuilt: boardOf(record, ladder, { low: 900e6, high: 950e6, samples: 3 }) });
    const { text } = await flat(far);
    expect(text).toContain('no sample: none lies within the sweep shown');
    expect(text).toContain('The finished board is not assessed against the requirement');
    expect(text).not.toMatch(/Figure 5|What would explain it|NaN|Infinity|undefined|null/u);
  });

  it('needs no cause for a board as predicted, and no band for exact values', async () => {
    const exact = { ...record, build: null };
    const option = designed.options.find(({ id }) => id === designed.chosen)!;
    const same = { ...ladder, arms: ladder.arms.map((arm, k) => ({ ...arm, value: option.arms[k]!.value })) };
    const { text } = await flat(
      design({ ...exact, asBuilt: boardOf(exact, same, { low: 140e6, high: 165e6, samples: 26 }) }),
    );
    expect(text).toContain('Not assessed: no band was worked out for this load state.');
    expect(text).not.toMatch(/NaN|Infinity|undefined|null/u);
    const asMeant = boardOf(record, ladder, { low: 140e6, high: 165e6, samples: 26 });
    const meets = await flat(design({ ...record, asBuilt: asMeant }));
    expect(meets.text).toContain('The finished board meets the requirement');
    expect(meets.text).toContain('The board is as predicted');
    expect(meets.text).toContain('Nowhere: every sample lies within the band.');
    expect(meets.text).not.toContain('Remedy');
  });

  it('has its key figures among those printed, each named once', () => {
    const figures = printedFigures(measured);
    const value = (name: string) => figures.find((each) => each.name === `finished board: ${name}`)?.value;
    const { verdict, explanations, remedy } = measured.asBuilt!;
    expect(value('verdict')).toBe('falls short');
    expect(value('worst return loss measured')).toBe(verdict.worstReturnLossDb);
    expect(value('nearest cause')).toBe(`${explanations[0]!.kind}, L1`);
    expect(figures).toContainEqual({ name: 'finished board: value instead', value: remedy!.to, unit: 'H' });
    expect(new Set(figures.map(({ name }) => name)).size).toBe(figures.length);
    expect(printedFigures(designed).some(({ name }) => name.startsWith('finished board'))).toBe(false);
  });

  it('cites what it applies', () => {
    const titles = (dossier: Dossier) => dossier.references.map(({ title }) => title);
    expect(titles(measured)).toEqual(
      expect.arrayContaining(['Touchstone, IBIS Open Forum', 'ISO 32000-1:2008', 'ISO 16684-1']),
    );
    expect(titles(designed)).not.toContain('Touchstone, IBIS Open Forum');
  });
});
