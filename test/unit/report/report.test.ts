import { describe, expect, it } from 'vitest';
import type { Dossier } from '../../../src/dossier.ts';
import { formatImpedance, formatQuantity } from '../../../src/quantity/format.ts';
import { report } from '../../../src/report/report.ts';
import { overlaps, readPdf } from './read-pdf.ts';
import { recordOf } from '../record-of.ts';
import { design } from '../../../src/design.ts';
import { dossierOf, fonts, measuredStates } from './records.ts';

const pdf = (dossier: Dossier, paper: 'a4' | 'letter' = 'a4') => report(dossier, { paper, fonts });
const long = 'W'.repeat(250) + 'i'.repeat(250);

const dossiers: Readonly<Record<string, Dossier>> = {
  'two parts': dossierOf('tide-gauge'),
  'a resistive pair': dossierOf('crystal-filter'),
  'a cascade': dossierOf('power-stage'),
  'a cascade between reactive ends, both chains': dossierOf('power-stage', () => ({
    source: { r: 20, x: 30, behaviour: 'series' },
    loads: [{ name: '', termination: { r: 30, x: -20, behaviour: 'series' } }],
  })),
  'no part at all': dossierOf('tide-gauge', ({ source, requirement }) => ({
    loads: [{ name: '', termination: source }],
    requirement: { ...requirement, blockDc: false },
  })),
  'twelve parts, chosen': dossierOf('power-stage', ({ selection }) => ({
    selection: { ...selection, option: 'low-pass-6-shunt-load', reason: 'Widest band' },
  })),
  'nothing stated, no band': dossierOf('tide-gauge', ({ requirement }) => ({
    identity: { title: '', number: '', revision: '', date: '', ticket: '', owner: '', change: '' },
    requirement: { ...requirement, bandHz: null, returnLossDb: null, powerW: null },
  })),
  'an extreme ratio': dossierOf('tide-gauge', () => ({
    source: { r: 1e-3, x: 0, behaviour: 'constant' },
    loads: [{ name: '', termination: { r: 1e6, x: 0, behaviour: 'constant' } }],
  })),
  'measured states': design(measuredStates),
  'every method': dossierOf('tide-gauge', ({ fit }) => ({ method: 'all', fit: { ...fit, elements: 2 } })),
  'a Pi of a chosen Q': design(
    recordOf({ method: 'pi', frequency: '7.1M', source: '50', load: 'rc-parallel 1k 4.7p', q: '12' }),
  ),
  'equal ripple': design(
    recordOf({
      method: 'equal-ripple',
      frequency: '150M',
      source: '50',
      load: '200',
      band: '120M..180M',
      'return-loss': '20',
    }),
  ),
  'a requirement out of reach': design(
    recordOf({ frequency: '150M', source: '50', load: 'antenna 14 150M 30', band: '130M..170M', 'return-loss': '14' }),
  ),
  'eight states with long names': design(
    recordOf({
      frequency: '150M',
      source: '50',
      load: Array.from({ length: 8 }, (_, k) => `${'W'.repeat(39)}${k} = rc-series ${8 + 2 * k} ${14 + 2 * k}p`).join(
        '\n',
      ),
      band: '148M..152M',
      'return-loss': '10',
    }),
  ),
  'words of 500 letters': dossierOf('tide-gauge', ({ signOff }) => ({
    identity: {
      title: long,
      number: long,
      revision: long,
      date: '2026-11-30',
      ticket: long,
      owner: long,
      change: long,
    },
    selection: { option: null, reason: `${long} `.repeat(3) + 'reason '.repeat(1500), set: 1 },
    signOff: { ...signOff, prepared: { name: long, role: long, date: '2026-12-01', remark: long } },
  })),
};

describe('report(dossier, options)', { timeout: 30_000 }, () => {
  it.each(Object.entries(dossiers))(
    'of %s sets everything inside the margins and nothing over another',
    async (_, dossier) => {
      for (const paper of ['a4', 'letter'] as const) {
        const [width, height] = paper === 'a4' ? [595.28, 841.89] : [612, 792];
        const bytes = await pdf(dossier, paper);
        expect(bytes.length).toBeLessThan(400_000);
        const { pages, text } = await readPdf(bytes);
        expect(text).not.toMatch(/NaN|Infinity|undefined|null/u);
        for (const words of pages) {
          expect(overlaps(words)).toEqual([]);
          for (const word of words) {
            expect(word.x).toBeGreaterThan(56);
            expect(word.x + word.width).toBeLessThan(width - 42);
            expect(word.y).toBeGreaterThan(30);
            expect(word.y).toBeLessThan(height - 30);
          }
        }
      }
    },
  );

  it('gives the same bytes for the same dossier', async () => {
    const dossier = dossiers['two parts']!;
    expect(await pdf(structuredClone(dossier))).toEqual(await pdf(dossier));
  });

  it('puts number, revision, digest and page on every page', async () => {
    const { pages } = await readPdf(await pdf(dossiers['a cascade']!));
    pages.forEach((words, k) => {
      const text = words.map((word) => word.text).join(' ');
      expect(text).toContain('TGT-RF-033');
      expect(text).toContain('Revision A');
      expect(text).toContain(`Page ${k + 1} of ${pages.length}`);
      expect(text.split(/\s+/u)).toContain(dossiers['a cascade']!.digest);
    });
    expect(pages[0]!.map((word) => word.text)).toContain(`1 of ${pages.length}`);
  });

  it.each(['two parts', 'a cascade', 'a resistive pair'])(
    'of %s prints every option with its figures',
    async (name) => {
      const dossier = dossiers[name]!;
      const { text } = await readPdf(await pdf(dossier));
      const flat = text.replace(/\s+/gu, ' ');
      for (const option of dossier.options) {
        option.arms.forEach(({ part, value }, k) => {
          expect(flat).toContain(`${option.designators[k]!} ${formatQuantity(value, part === 'inductor' ? 'H' : 'F')}`);
        });
        expect(flat).toContain(`${option.worstReturnLossDb!.toFixed(2)} dB`);
      }
      const chosen = dossier.options.find(({ id }) => id === dossier.chosen)!;
      expect(flat).toContain(formatImpedance(chosen.seen.r, chosen.seen.x));
      expect(flat).toContain('Meets the requirement');
      for (const { name: route } of dossier.evidence!.routes) expect(flat).toContain(route);
      for (const { why } of dossier.absent) expect(flat).toContain(why.replace(/\s+/gu, ' ').replaceAll("'", '’'));
      expect(flat).toContain(`A${dossier.assumptions.length} `);
    },
  );

  it('says on its first page that a requirement is not met', async () => {
    const dossier = dossierOf('tide-gauge', ({ requirement }) => ({
      requirement: { ...requirement, returnLossDb: 60 },
    }));
    const [first] = (await readPdf(await pdf(dossier))).pages;
    const text = first!.map((word) => word.text).join(' ');
    expect(text).toContain('Falls short of the requirement');
    expect(text).toContain('Issuing this document needs a written deviation.');
  });

  it('names the engineer who chose, and why', async () => {
    const { text } = await readPdf(await pdf(dossiers['twelve parts, chosen']!));
    expect(text).toContain('Chosen by the engineer. Reason given: “Widest band”');
  });

  const flat = async (name: string): Promise<string> =>
    (await readPdf(await pdf(dossiers[name]!))).text.replace(/\s+/gu, ' ');

  it('says what no network can beat, on the first page too when it is out of reach', async () => {
    const dossier = dossiers['a requirement out of reach']!;
    const words = dossier.ceiling!.words.replaceAll("'", '’');
    const { pages, text } = await readPdf(await pdf(dossier));
    expect(pages[0]!.map((word) => word.text).join(' ')).toContain(words);
    expect(text.replace(/\s+/gu, ' ')).toContain(`Out of reach. ${words}`);
    expect(await flat('equal ripple')).toContain('4 Ceiling Between two resistances no ceiling exists');
  });

  it('calls a ceiling from measured data an estimate, with its basis', async () => {
    const text = await flat('measured states');
    expect(text).toContain('Estimate. Basis: one-resonance model');
    expect(text).toContain('Return loss at best (estimate)');
  });

  it('gives each load state its source, its return loss and its figures, the governing one named', async () => {
    const dossier = dossiers['measured states']!;
    const text = await flat('measured states');
    const { worstState, states } = dossier.options.find(({ id }) => id === dossier.chosen)!;
    for (const { name, termination } of dossier.record.loads) {
      if (!('measured' in termination)) throw new Error('the states are measured');
      expect(text).toContain(`Load, ${name}`);
      expect(text).toContain(termination.measured.name);
      expect(text).toContain(`SHA-256 ${termination.measured.sha256}`);
    }
    for (const { name, worstReturnLossDb } of states)
      expect(text).toContain(`${name} ${worstReturnLossDb!.toFixed(2)} dB at`);
    expect(text).toContain(`${worstState} (governs)`);
    expect(text).toContain('outside the data');
  });

  it('prints the least that holds the requirement, and every option of a long list by method', async () => {
    const dossier = dossiers['every method']!;
    expect(dossier.options.length).toBeGreaterThan(12);
    const text = await flat('every method');
    expect(text).toContain(dossier.minimum);
    dossier.options.forEach(({ worstReturnLossDb, arms, designators }) => {
      expect(text).toContain(`${worstReturnLossDb!.toFixed(2)} dB`);
      arms.forEach(({ part, value }, k) => {
        expect(text).toContain(`${designators[k]!} ${formatQuantity(value, part === 'inductor' ? 'H' : 'F')}`);
      });
    });
    expect(text).toContain('Meets (chosen, proposed):');
    expect(text.match(/C\. Bowick/gu)).toHaveLength(1);
  });

  it('sets typographic apostrophes and quotation marks', async () => {
    for (const name of ['measured states', 'a requirement out of reach']) {
      const text = await flat(name);
      expect(text).not.toMatch(/['"]/u);
      expect(text).toContain('’');
    }
  });

  it('does not repeat as a caution what the line on DC says', async () => {
    const text = await flat('two parts');
    expect(text).toContain('DC: ');
    expect(text).not.toMatch(/Cautions: A (shunt inductor|series capacitor)/u);
  });

  it('marks letters that it cannot draw, and says so', async () => {
    const dossier = dossierOf('tide-gauge', ({ identity }) => ({ identity: { ...identity, owner: '潮位計 Ltd' } }));
    const { text } = await readPdf(await pdf(dossier));
    expect(text).toContain('□□□ Ltd');
    expect(text).toContain('□ stands for a character that this report’s typeface does not hold');
    expect((await readPdf(await pdf(dossiers['two parts']!))).text).not.toContain('□');
  });

  it('describes itself: title, subject, author, language, date of issue and an outline', async () => {
    const { info, language, outline } = await readPdf(await pdf(dossiers['two parts']!));
    expect(info).toMatchObject({
      Title: 'Tide-gauge telemetry: transmitter to stub whip',
      Subject: 'Design report TGT-RF-014 revision A',
      Author: 'Saltmarsh Instruments',
      CreationDate: 'D:20261130000000Z',
      ModDate: 'D:20261130000000Z',
    });
    expect(language).toBe('en');
    expect(outline).toEqual([
      '1 Requirement',
      '2 Terminations',
      '3 Assumptions',
      '4 Ceiling',
      '5 Options considered',
      '6 Chosen network',
      '7 Response',
      '8 Verification',
      '9 Half-power bandwidth',
      '10 Tolerance and yield',
      '11 Loss and stress',
      '12 DC',
      '13 Winding',
      '14 Finished board',
      '15 Cautions',
      '16 Deviations',
      '17 Standards and literature applied',
      '18 Attached files',
      '19 Changes from the revision before',
      '20 Revision history',
      '21 Sign-off',
    ]);
  });

  it('keeps to a few pages where there is little to say', async () => {
    expect((await readPdf(await pdf(dossiers['no part at all']!))).pages.length).toBeLessThanOrEqual(7);
    expect((await readPdf(await pdf(dossiers['a cascade']!))).pages.length).toBeLessThanOrEqual(11);
  });
});
