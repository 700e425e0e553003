import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { demoNames, demoText } from './record/demos.ts';

const dossierOf = (name: string) => design(readRecord(demoText(name)));

describe('the demo tide-gauge: 50 Ω to a stub whip of 9.4 − j61 Ω, no DC on the antenna', () => {
  const { options, proposed, chosenBy, evidence } = dossierOf('tide-gauge');
  const option = options.find(({ id }) => id === proposed)!;

  it('proposes series C, shunt L: the one network of four that keeps the transmitter’s DC off the antenna', () => {
    expect(chosenBy).toBe('proposal');
    expect(option.title).toBe('Series C, shunt L');
    expect(options.filter(({ dc }) => dc.blocked).map(({ id }) => id)).toEqual([proposed]);
    // And the coil to ground at the antenna bleeds its static charge.
    expect(option.dc.loadShorted).toBe(true);
  });

  it('holds the channel with margin, by parts that are sold', () => {
    expect(option.worstReturnLossDb!).toBeGreaterThan(20);
    const [c, l] = option.arms;
    expect(c!.value).toBeGreaterThan(5e-12);
    expect(c!.value).toBeLessThan(12e-12);
    expect(l!.value).toBeGreaterThan(30e-9);
    expect(l!.value).toBeLessThan(60e-9);
    expect(evidence!.pass).toBe(true);
  });
});

describe('the demo crystal-filter: 1.5 kΩ to 50 Ω at 10.7 MHz, DC at the load kept', () => {
  const { options, proposed, evidence } = dossierOf('crystal-filter');
  const option = options.find(({ id }) => id === proposed)!;

  it('proposes shunt C, series L: low-pass, with the shunt arm across the higher resistance', () => {
    expect(option.title).toBe('Shunt C, series L');
    expect(option.form).toBe('low-pass');
    // Q = √29: C = Q/(1500·ω) = 53.4 pF, L = Q·50/ω = 4.005 µH, both on sale.
    const omega = 2 * Math.PI * 10.7e6;
    expect(option.arms.map(({ value }) => value)).toEqual([
      expect.closeTo(Math.sqrt(29) / (1500 * omega), 22),
      expect.closeTo((Math.sqrt(29) * 50) / omega, 16),
    ]);
    expect(option.dc).toMatchObject({ sourceShorted: false, loadShorted: false });
  });

  it('holds the filter’s channel, of a thousandth of f0, with ease', () => {
    expect(option.worstReturnLossDb!).toBeGreaterThan(40);
    expect(evidence!.checks.map(({ subject }) => subject)).toContain('element values by the Q method');
    expect(evidence!.pass).toBe(true);
  });
});

describe('the demo power-stage: 12.5 Ω to 50 Ω over 400 to 470 MHz, the supply fed through the source', () => {
  const { options, proposed, sections, evidence } = dossierOf('power-stage');
  const option = options.find(({ id }) => id === proposed)!;

  it('proposes the low-pass of fewest sections: it attenuates harmonics and does not short the supply', () => {
    expect(option.form).toBe('low-pass');
    expect(option.sections).toBe(sections!.smallest);
    expect(option.dc.sourceShorted).toBe(false);
    expect(option.harmonicDb.every(({ attenuationDb }) => attenuationDb! > 0)).toBe(true);
    expect(evidence!.pass).toBe(true);
  });

  it('needs several: fewer do not hold 23 dB, in either form', () => {
    const fewer = sections!.rows.filter(({ sections: n }) => n < sections!.smallest!);
    expect(sections!.smallest).toBe(3);
    expect(fewer).toHaveLength(4);
    expect(fewer.every(({ holds }) => holds === false)).toBe(true);
  });
});

describe('the demos', () => {
  it.each(demoNames)('%s names nobody and is signed by no one', (name) => {
    const { signOff, selection } = readRecord(demoText(name));
    for (const { name: person, date } of [signOff.prepared, signOff.checked, signOff.approved]) {
      expect([person, date]).toEqual(['', '']);
    }
    expect(selection).toEqual({ option: null, reason: '', set: 1 });
  });
});
