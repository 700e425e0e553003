import { describe, expect, it } from 'vitest';
import { dossierDifference } from '../../../src/design/dossier-difference.ts';
import type { Dossier } from '../../../src/dossier.ts';
import { plainBuilt, plainDossier, plainOption, withOption } from './plain-dossier.ts';

const told = (after: Dossier, before = plainDossier): readonly string[] =>
  dossierDifference(before, after).map(({ group, what, before: a, after: b }) => `${group} / ${what}: ${a} -> ${b}`);

const [inductor, capacitor] = plainOption.arms;

describe('dossierDifference(before, after)', () => {
  it('is empty between a dossier and itself', () => {
    expect(told(structuredClone(plainDossier))).toEqual([]);
    expect(told(withOption({ built: plainBuilt }), withOption({ built: plainBuilt }))).toEqual([]);
  });

  it('takes what differs in the tenth digit, or by a billionth of a decibel, as the same', () => {
    expect(
      told(
        withOption({
          arms: [{ ...inductor!, value: inductor!.value * (1 + 5e-10) }, capacitor!],
          worstReturnLossDb: plainOption.worstReturnLossDb! + 5e-9,
          lossDb: plainOption.lossDb + 5e-10,
        }),
      ),
    ).toEqual([]);
  });

  it('tells figures with as many digits as tell them apart', () => {
    expect(
      told(
        withOption({
          arms: [
            { ...inductor!, value: 84.631e-9 },
            { ...capacitor!, value: 47e-12 },
          ],
          worstReturnLossDb: 17.2534,
        }),
      ),
    ).toEqual([
      'results / L1, exact: 84.630 nH in series -> 84.631 nH in series',
      'results / C1, exact: 43.71 pF across -> 47.00 pF across',
      'results / Worst return loss, exact parts: 17.2530 dB -> 17.2534 dB',
    ]);
  });

  it('tells another network, part by part', () => {
    expect(
      told(
        withOption({
          title: 'Series C',
          arms: [{ arm: 'series', part: 'capacitor', value: 10e-12 }],
          designators: ['C1'],
        }),
      ),
    ).toEqual([
      'results / Network: Series L, shunt C -> Series C',
      'results / L1, exact: 84.63 nH in series -> none',
      'results / C1, exact: 43.71 pF across -> 10.00 pF in series',
      'verdicts / Network proposed: Series L, shunt C -> Series C',
    ]);
  });

  it('tells verdicts after results', () => {
    const checks = [
      { subject: 'return loss', verdict: 'falls short', reason: '' },
      { subject: 'DC block', verdict: 'meets', reason: '' },
    ] as const;
    const after: Dossier = {
      ...withOption({ worstReturnLossDb: 12, meets: false, checks }),
      proposed: null,
      chosenBy: 'nearest',
      ceiling: { ...plainDossier.ceiling!, bestReflection: 0.1, needs: null, verdict: 'out of reach' },
      evidence: {
        ...plainDossier.evidence!,
        pass: false,
        checks: [{ subject: 'power balance', spread: 1, tolerance: 1e-9, pass: false, note: '' }],
      },
    };
    // |Γ| 0.01 is 40 dB, 0.1 is 20 dB.
    expect(told(after)).toEqual([
      'results / Worst return loss, exact parts: 17.25 dB -> 12.00 dB',
      'results / Ceiling, return loss: 40.00 dB -> 20.00 dB',
      'results / Resonators needed: 1 -> none',
      'verdicts / Ceiling: room to spare -> out of reach',
      'verdicts / Requirement: met -> not met',
      'verdicts / Verdict on return loss: meets -> falls short',
      'verdicts / Verdict on DC block: not assessed -> meets',
      'verdicts / Network proposed: Series L, shunt C -> none: none meets everything',
      'verdicts / Chosen by: proposal -> nearest to what is required',
      'verdicts / Evidence: passes -> fails: power balance',
    ]);
  });

  it('tells parts on sale, yield, loss and stress', () => {
    const after = withOption({
      built: {
        ...plainBuilt,
        parts: [{ ...plainBuilt.parts[0]!, from: 'E12' }],
        lossDb: 0.4,
        yield: { ...plainBuilt.yield!, value: 0.93204 },
        stress: { ...plainBuilt.stress!, first: { designator: 'L1', by: 'heat', powerW: 6 } },
      },
    });
    expect(told(after, withOption({ built: plainBuilt }))).toEqual([
      'results / L1: 82.00 nH (E24) -> 82.00 nH (E12)',
      'results / Loss, real parts: 0.31 dB -> 0.40 dB',
      'results / Yield: 93.200 % -> 93.204 %',
      'results / First rating reached: 8.000 W: current of L1 -> 6.000 W: heat of L1',
    ]);
    expect(told(withOption({ built: plainBuilt }))).toContain(
      'results / Yield: none -> 93.2 % (91.4 to 94.7 %, 95 % confidence, 1000 networks, seed 1)',
    );
  });

  it('tells that there is no network any more', () => {
    const after: Dossier = {
      ...plainDossier,
      options: [],
      chosen: null,
      proposed: null,
      evidence: null,
      ceiling: null,
    };
    expect(told(after)).toEqual(
      expect.arrayContaining([
        'results / Networks considered: 1 -> 0',
        'results / Network: Series L, shunt C -> none',
        'verdicts / Requirement: met -> no network',
        'verdicts / Evidence: passes -> none: no network',
        'verdicts / Ceiling: room to spare -> none',
      ]),
    );
  });
});
