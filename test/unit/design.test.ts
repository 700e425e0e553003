import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import { InputError } from '../../src/quantity/problem.ts';
import type { Fields } from '../../src/record/fields.ts';
import { recordOf } from './record-of.ts';

const whip: Fields = { frequency: '151.25M', source: '50', load: '9.4-j61', band: '150.5M..152M', 'return-loss': '14' };
const stage: Fields = {
  frequency: '434M',
  source: '12.5',
  load: '50',
  method: 'cascade',
  band: '400M..470M',
  'return-loss': '23',
};
const dossierOf = (fields: Fields) => design(recordOf(fields));

describe('design(record): which option', () => {
  it('proposes the first that meets everything, and is about that one', () => {
    const { options, proposed, chosen, chosenBy } = dossierOf({ ...whip, 'block-dc': 'yes' });
    expect(options.map(({ meets }) => meets)).toEqual([false, true, false, false]);
    expect([proposed, chosen, chosenBy]).toEqual([options[1]!.id, options[1]!.id, 'proposal']);
  });

  it("is about the engineer's choice where there is one, whether it meets the requirement or not", () => {
    const { options, proposed, chosen, chosenBy, responses, evidence } = dossierOf({
      ...whip,
      'block-dc': 'yes',
      choice: 'shunt-source-plus',
      reason: 'DC is blocked elsewhere',
    });
    expect([proposed, chosen, chosenBy]).toEqual(['shunt-load-minus', 'shunt-source-plus', 'engineer']);
    const { arms, meets } = options.find(({ id }) => id === chosen)!;
    expect(meets).toBe(false);
    // Response and evidence are those of the chosen one: its gain at the upper end of the sweep falls as a low-pass does.
    expect(arms[0]).toMatchObject({ arm: 'shunt', part: 'capacitor' });
    expect(responses[0]!.transducerGainDb.at(-1)!).toBeLessThan(-10);
    expect(evidence!.pass).toBe(true);
  });

  it('takes the nearest where none meets everything: fewest shortfalls, then the best return loss', () => {
    // Blocked needs a series C, which this load has with a shunt L at the load alone; and that shorts its DC.
    const { options, proposed, chosen, chosenBy } = dossierOf({ ...whip, 'block-dc': 'yes', 'keep-dc': 'load' });
    const shortfalls = options.map(({ checks }) => checks.filter(({ verdict }) => verdict === 'falls short').length);
    expect(shortfalls).toEqual([2, 1, 1, 2]);
    const [, blocked, open] = options;
    expect(open!.worstReturnLossDb!).toBeGreaterThan(blocked!.worstReturnLossDb!);
    expect([proposed, chosen, chosenBy]).toEqual([null, open!.id, 'nearest']);
  });

  it('refuses a choice that these terminations do not have, and lists those that they do', () => {
    const stale = recordOf({ ...whip, load: '10', choice: 'shunt-load-plus' });
    expect(() => design(stale)).toThrow(InputError);
    expect(() => design(stale)).toThrow(
      'choice "shunt-load-plus": no such network for these terminations; choose one of shunt-source-plus, shunt-source-minus',
    );
  });

  it('refuses a choice of another number of sections than is asked for', () => {
    const record = recordOf({ ...stage, sections: '2', choice: 'low-pass-3-shunt-load' });
    expect(() => design(record)).toThrow(/choose one of low-pass-2-shunt-load, high-pass-2-shunt-load$/);
  });
});

describe('design(record): verdicts', () => {
  const checksOf = (fields: Fields, id: string) => {
    const { checks, reasons, meets } = dossierOf(fields).options.find((option) => option.id === id)!;
    return {
      checks: checks.map(({ subject, verdict, reason }) => `${subject}: ${verdict}: ${reason}`),
      reasons,
      meets,
    };
  };

  /**
   * |Γ|² of 50 Ω to 9.4 − j61 Ω through series C and shunt L at the load, from B = −BL − √(GL/RT − GL²) and
   * X = −Im 1/(GL + j(B + BL)), the load a resistance with its capacitor.
   */
  const squared = (u: number): number => {
    const size = 9.4 ** 2 + 61 ** 2;
    const [gl, bl] = [9.4 / size, 61 / size];
    const root = Math.sqrt(gl / 50 - gl * gl);
    const [b, x] = [(-bl - root) / u, -root / (gl * gl + root * root) / u];
    const away = 9.4 ** 2 + (61 / u) ** 2;
    const [g, bt] = [9.4 / away, 61 / u / away + b];
    const [r, xt] = [g / (g * g + bt * bt), -bt / (g * g + bt * bt) + x];
    return ((r - 50) ** 2 + xt ** 2) / ((r + 50) ** 2 + xt ** 2);
  };

  it('says what is met, with the worst return loss and where it is', () => {
    const worst = Math.max(squared(150.5 / 151.25), squared(152 / 151.25));
    const db = (-10 * Math.log10(worst)).toFixed(2);
    const { checks, reasons, meets } = checksOf(
      { ...whip, 'block-dc': 'yes', 'keep-dc': 'source' },
      'shunt-load-minus',
    );
    expect(checks).toEqual([
      `return loss: meets: return loss ${db} dB at worst (150.50 MHz), at least the 14.00 dB required`,
      'DC block: meets: a series capacitor blocks DC',
      'DC at the source: meets: DC at the source is not shorted',
      'part values: meets: part values are practicable',
    ]);
    expect(meets).toBe(true);
    expect(reasons).toHaveLength(4);
  });

  it('says what falls short, and gives only that as the reason', () => {
    const { checks, reasons, meets } = checksOf(
      { ...whip, 'return-loss': '35', 'block-dc': 'yes', 'keep-dc': 'both', inductors: '1n..100n' },
      'shunt-load-plus',
    );
    expect(meets).toBe(false);
    expect(reasons).toHaveLength(5);
    expect(reasons[0]).toMatch(/^return loss \d+\.\d\d dB at worst \(15\d\.\d\d MHz\), below the 35\.00 dB required$/);
    expect(reasons.slice(1)).toEqual([
      'no series capacitor: DC passes from source to load',
      'a shunt inductor shorts the DC at the source to ground',
      'a shunt inductor shorts the DC at the load to ground',
      'out of the practicable range: L1 140.2 nH is above 100 nH; L2 111.5 nH is above 100 nH',
    ]);
    expect(checks.every((line) => line.includes('falls short'))).toBe(true);
  });

  it('assesses what is required and nothing else', () => {
    const { options } = dossierOf({ frequency: '151.25M', source: '50', load: '9.4-j61' });
    for (const { checks } of options) expect(checks.map(({ subject }) => subject)).toEqual(['part values']);
  });

  it('takes f0 for the band where none is given, and no worst figure', () => {
    const { options } = dossierOf({ ...whip, band: '' });
    for (const { worstReturnLossDb, worstAtHz, checks } of options) {
      expect([worstReturnLossDb, worstAtHz]).toEqual([null, null]);
      expect(checks[0]!.reason).toBe('return loss over 100 dB at worst (151.25 MHz), at least the 14.00 dB required');
    }
  });

  it('puts a requirement of exactly what is reached on the right side', () => {
    const reached = dossierOf(whip).options.map(({ worstReturnLossDb }) => worstReturnLossDb!);
    const best = Math.max(...reached);
    const meets = (db: number): number =>
      dossierOf({ ...whip, 'return-loss': String(db) }).options.filter((option) => option.meets).length;
    expect(meets(best)).toBe(1);
    expect(meets(best + 1e-6)).toBe(0);
    // The two figures of the sentence are told apart by as many digits as it takes.
    const [nearly] = dossierOf({ ...whip, 'return-loss': String(best + 1e-6) }).options.filter(
      ({ worstReturnLossDb }) => worstReturnLossDb === best,
    );
    const [found, required] = nearly!.reasons[0]!.match(/\d+\.\d+(?= dB)/g)!;
    expect(found).not.toBe(required);
  });
});

describe('design(record): aim', () => {
  const complex: Fields = {
    frequency: '868M',
    source: '17-j32',
    load: '210+j95',
    band: '860M..876M',
    'return-loss': '10',
  };

  it('conjugate: ZS* is seen and all power delivered', () => {
    for (const { seen, transducerGain, reflection } of dossierOf(complex).options) {
      expect(seen.r).toBeCloseTo(17, 9);
      expect(seen.x).toBeCloseTo(32, 9);
      expect(transducerGain).toBeCloseTo(1, 12);
      expect(reflection).toBeLessThan(1e-9);
    }
  });

  it('reflectionless: ZS is seen, RS²/|ZS|² of the power delivered, and the sentence says which aim', () => {
    const { options, assumptions } = dossierOf({ ...complex, aim: 'reflectionless' });
    for (const { seen, transducerGain, reflection, checks } of options) {
      expect(seen.r).toBeCloseTo(17, 9);
      expect(seen.x).toBeCloseTo(-32, 9);
      expect(transducerGain).toBeCloseTo(17 ** 2 / (17 ** 2 + 32 ** 2), 12);
      expect(reflection).toBeLessThan(1e-9);
      expect(checks[0]!.reason).toMatch(/^return loss \(reflectionless aim\)/);
    }
    expect(assumptions.join()).toMatch(/Aim: reflectionless/);
    expect(assumptions.join()).not.toMatch(/both aims are the same/);
  });

  it('is one and the same for a real source, and says so', () => {
    const one = dossierOf(whip);
    const other = dossierOf({ ...whip, aim: 'reflectionless' });
    expect(other.options.map(({ arms }) => arms)).toEqual(one.options.map(({ arms }) => arms));
    expect(one.assumptions.join()).toMatch(/With a real source both aims are the same/);
  });
});

describe('design(record): sections', () => {
  it('finds the smallest number that holds, and lists every row', () => {
    const { sections, proposed, options } = dossierOf(stage);
    const { rows, smallest, words } = sections!;
    expect(rows.map(({ sections: n, form }) => `${String(n)} ${form}`)).toEqual(
      [1, 2, 3, 4, 5, 6].flatMap((n) => [`${String(n)} low-pass`, `${String(n)} high-pass`]),
    );
    const holding = rows.filter(({ worstReturnLossDb }) => worstReturnLossDb! >= 23).map(({ sections: n }) => n);
    expect(smallest).toBe(Math.min(...holding));
    expect(words).toBe(`${String(smallest)} sections are the smallest number that holds 23.00 dB over the band.`);
    expect(rows.every(({ holds, worstReturnLossDb }) => holds === worstReturnLossDb! >= 23)).toBe(true);
    expect(rows.map(({ parts, sections: n }) => parts / n)).toEqual(rows.map(() => 2));
    expect(options.find(({ id }) => id === proposed)!.sections).toBe(smallest);
  });

  it('has one section do what its closed form says: 16/(25 − 18u² + 9u⁴) at the worse edge', () => {
    const gain = (u: number): number => 16 / (25 - 18 * u ** 2 + 9 * u ** 4);
    const worst = Math.max(1 - gain(400 / 434), 1 - gain(470 / 434));
    const [row] = dossierOf(stage).sections!.rows;
    expect(row!.worstReturnLossDb).toBeCloseTo(-10 * Math.log10(worst), 9);
    expect(row!.sectionQ).toBeCloseTo(Math.sqrt(3), 13);
  });

  it('says by how much six sections fall short', () => {
    const { sections, proposed, chosenBy } = dossierOf({ ...stage, 'return-loss': '40' });
    const { smallest, bestReturnLossDb, words } = sections!;
    expect([smallest, proposed, chosenBy]).toEqual([null, null, 'nearest']);
    const best = bestReturnLossDb!;
    expect(words).toBe(
      `Six sections do not hold 40.00 dB over the band: the best of all reaches ${best.toFixed(2)} dB, ${(40 - best).toFixed(2)} dB short.`,
    );
  });

  it('does not take more sections for better: of 1:20 over an octave, two reflect more than one', () => {
    const { rows } = dossierOf({
      ...stage,
      frequency: '100M',
      source: '1',
      load: '20',
      band: '53M..189M',
      'return-loss': '0.15',
    }).sections!;
    const lowPass = rows.filter(({ form }) => form === 'low-pass').map(({ worstReturnLossDb }) => worstReturnLossDb!);
    expect(lowPass[1]!).toBeLessThan(lowPass[0]!);
  });

  it('lists only the number that is asked for, beside the table of all', () => {
    const { options, sections } = dossierOf({ ...stage, sections: '2' });
    expect(options.map(({ sections: n }) => n)).toEqual([2, 2]);
    expect(sections!.rows).toHaveLength(12);
  });

  it('judges nothing without a band', () => {
    const { sections } = dossierOf({ ...stage, band: '', sections: '2' });
    expect(sections!.rows.every(({ holds, worstReturnLossDb }) => holds === null && worstReturnLossDb === null)).toBe(
      true,
    );
    expect(sections).toMatchObject({
      smallest: null,
      bestReturnLossDb: null,
      words: 'No band is given, so no number of sections can be judged.',
    });
  });

  it('needs none where the ends are the same', () => {
    const { sections, options } = dossierOf({ ...stage, load: '12.5' });
    expect(options.map(({ id }) => id)).toEqual(['direct']);
    expect(sections).toMatchObject({
      smallest: 0,
      words: 'No part is needed: the terminations hold 23.00 dB as they are.',
    });
  });

  it('takes complex ends', () => {
    const { options, evidence } = dossierOf({ ...stage, source: '12.5+j4', load: '45-j12' });
    expect(options.length).toBeGreaterThanOrEqual(12);
    for (const { transducerGain } of options) expect(transducerGain).toBeCloseTo(1, 12);
    expect(evidence!.pass).toBe(true);
  });

  it('is null for the other methods', () => {
    expect(dossierOf(whip).sections).toBeNull();
  });
});

describe('design(record): the rest of the dossier', () => {
  it('compares the routes at f0 and at both edges of the band, each once', () => {
    expect(dossierOf(whip).evidence!.frequenciesHz).toEqual([151.25e6, 150.5e6, 152e6]);
    expect(dossierOf({ ...whip, band: '' }).evidence!.frequenciesHz).toEqual([151.25e6]);
    expect(dossierOf({ ...whip, band: '151.25M..152M' }).evidence!.frequenciesHz).toEqual([151.25e6, 152e6]);
  });

  it('has the Q method among the routes for a resistive pair, by either method, and not for a cascade', () => {
    const names = (fields: Fields): string[] => dossierOf(fields).evidence!.routes.map(({ name }) => name);
    const pair: Fields = { frequency: '10.7M', source: '1k5', load: '50' };
    expect(names(pair)).toContain('Q method');
    expect(names({ ...pair, method: 'resistive-pair' })).toContain('Q method');
    expect(names(whip)).not.toContain('Q method');
    expect(names({ ...stage, sections: '2' })).not.toContain('Q method');
  });

  it('warns of the peak voltage at the node that has most: √(2·2 W/9.4 Ω)·|9.4 − j61| Ω', () => {
    const { cautions } = dossierOf({ ...whip, power: '2' });
    const volts = (Math.sqrt(4 / 9.4) * Math.hypot(9.4, 61)).toFixed(1);
    expect(cautions[0]).toMatchObject({ kind: 'safety', text: expect.stringContaining(`reaches ${volts} V peak`) });
    expect(cautions.filter(({ kind }) => kind === 'safety').length).toBeGreaterThanOrEqual(3);
    expect(cautions.map(({ text }) => text).join(' ')).toMatch(/burns.*local codes and licences.*qualified people/);
  });

  it('warns of burns though no power is stated', () => {
    expect(dossierOf(whip).cautions[0]!.text).toMatch(/burns skin/);
  });

  it('refers to what it applied and to nothing else', () => {
    const titles = (fields: Fields): string =>
      dossierOf(fields)
        .references.map(({ title }) => title)
        .join('; ');
    expect(titles(whip)).toMatch(/Gonzalez/);
    expect(titles(whip)).not.toMatch(/Bowick/);
    expect(titles({ frequency: '1M', source: '50', load: '10', method: 'resistive-pair' })).not.toMatch(/Gonzalez/);
    for (const name of ['IEC 60617', 'ISO 7200', 'RFC 8785', 'FIPS 180-4']) expect(titles(whip)).toContain(name);
  });

  it('numbers its options by ids that the record can hold, and their parts by designators', () => {
    for (const { id, designators, arms } of dossierOf(stage).options) {
      expect(id).toMatch(/^(low|high)-pass-[1-6]-shunt-load$/);
      expect(new Set(designators).size).toBe(arms.length);
    }
  });
});
