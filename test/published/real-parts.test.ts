import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import type { Fields } from '../../src/record/fields.ts';
import { recordOf } from '../unit/record-of.ts';

interface Figures {
  readonly voltsPeak: number;
  readonly ampsRms: number;
  readonly watts: number;
}

interface Case {
  readonly name: string;
  readonly fields: Fields;
  readonly id: string;
  /** Of all pairs of preferred values within a decade of the exact ones, the three with the best worst return loss. */
  readonly sets: readonly (readonly [number, number, number])[];
  readonly worstAtHz: number;
  readonly worstState: string;
  /** At the design frequency, in the state above. */
  readonly lossDb: number;
  /** Nodal equations; largest over 101 frequencies of the band and every load state, each figure by itself. */
  readonly stress: readonly [Figures, Figures];
  /** Largest over all angles of the load as well; null: no mismatch is stated. */
  readonly mismatched: readonly [Figures, Figures] | null;
  /** Worst return loss with every part at an end of its tolerance. */
  readonly cornerDb: number;
  /** Fraction of 200 000 networks drawn by PCG64. */
  readonly yield: number;
  /** Best of Nelder-Mead from six starts, dB. */
  readonly centredDb: number;
}

const figures = (voltsPeak: number, ampsRms: number, watts: number): Figures => ({ voltsPeak, ampsRms, watts });

const cases: readonly Case[] = [
  {
    name: 'a whip, E24, Q 40 and 300',
    fields: {
      frequency: '151.25M',
      source: '50',
      load: '9.4-j61',
      band: '150.5M..152M',
      'return-loss': '14',
      'series-inductor': 'E24',
      'series-capacitor': 'E24',
      'q-inductor': '40',
      'q-capacitor': '300',
      power: '2',
      samples: '2000',
      seed: '7',
    },
    id: 'shunt-load-minus',
    sets: [
      [8.2e-12, 4.7e-8, 17.722562639699277],
      [7.5e-12, 4.7e-8, 16.137572426625685],
      [10e-12, 4.3e-8, 16.126820903717093],
    ],
    worstAtHz: 152e6,
    worstState: '',
    lossDb: 0.9176773324036879,
    stress: [
      figures(33.66223324134576, 0.1845677147355287, 0.014644009248643494),
      figures(36.224370616671244, 0.5761505089171766, 0.3688299116601943),
    ],
    mismatched: null,
    cornerDb: 10.147639039396289,
    yield: 0.682215,
    centredDb: 29.0965,
  },
  {
    name: 'the same with strays, leads, self-resonance, sloping Q and a VSWR of 3, E12',
    fields: {
      frequency: '151.25M',
      source: '50',
      load: '9.4-j61',
      band: '150.5M..152M',
      'return-loss': '14',
      'series-inductor': 'E12',
      'series-capacitor': 'E96',
      'tolerance-inductor': '10%',
      'tolerance-capacitor': '0.25p',
      distribution: 'normal',
      'q-inductor': '40',
      'q-capacitor': '300',
      'q-slope-inductor': '0.5',
      'q-slope-capacitor': '-1',
      'self-resonance': '900M',
      esl: '0.5n',
      stray: '0.4p',
      lead: '0.5n',
      mismatch: '3',
      power: '2',
      samples: '3000',
      seed: '7',
    },
    id: 'shunt-source-minus',
    sets: [
      [2.7e-8, 3.9e-8, 24.528080040157935],
      [2.2e-8, 3.9e-8, 13.977385389017073],
      [3.3e-8, 3.9e-8, 13.079571608201269],
    ],
    worstAtHz: 152e6,
    worstState: '',
    lossDb: 0.6747298864743011,
    stress: [
      figures(14.878731548904112, 0.3933453868141556, 0.10478090113923585),
      figures(23.666562131136924, 0.436344538391279, 0.1873907666664567),
    ],
    mismatched: [
      figures(20.48157826346156, 0.5414664750234756, 0.19855331929833214),
      figures(32.6603637481484, 0.6030062369631888, 0.35687807788875237),
    ],
    cornerDb: 11.118332864037377,
    yield: 0.996025,
    centredDb: 31.3119,
  },
  {
    name: 'a reactive source, three states of the load, both ends spread, a VSWR of 5',
    fields: {
      frequency: '433.9M',
      source: '30+j12',
      load: 'open = 20-j35\nhand = 14-j28\nbag = 26-j40',
      band: '433M..434.8M',
      'return-loss': '10',
      'series-inductor': 'E48',
      'series-capacitor': 'E24',
      'q-inductor': '50',
      'q-capacitor': '300',
      'self-resonance': '2.5G',
      esl: '0.4n',
      stray: '0.15p',
      lead: '0.3n',
      'load-spread': '10%',
      'source-spread': '5%',
      mismatch: '5',
      power: '0.1',
      samples: '3000',
    },
    id: 'shunt-load-minus',
    sets: [
      [7.5e-12, 8.66e-9, 13.346765591187172],
      [8.2e-12, 8.66e-9, 13.116276674066576],
      [9.1e-12, 9.09e-9, 12.325841367657343],
    ],
    worstAtHz: 433e6,
    worstState: 'bag',
    lossDb: 0.32725304908987707,
    stress: [
      figures(4.7234446110109065, 0.06969837583941964, 0.0007935878921787919),
      figures(3.9401128491367454, 0.11095472508527067, 0.006165411172975768),
    ],
    mismatched: [
      figures(6.70148834540199, 0.09888606554049412, 0.00159742292350502),
      figures(6.165124494028219, 0.17361170086822275, 0.015094836922270427),
    ],
    cornerDb: 10.423003489462248,
    yield: 0.937505,
    centredDb: 13.8328,
  },
];

const near = (found: number, wanted: number, within: number): void =>
  expect(Math.abs(found / wanted - 1)).toBeLessThan(within);
const nearFigures = (found: Figures, wanted: Figures, within: number): void => {
  near(found.voltsPeak, wanted.voltsPeak, within);
  near(found.ampsRms, wanted.ampsRms, within);
  near(found.watts, wanted.watts, within);
};

describe.each(cases)('computed apart from this project with NumPy/SciPy from circuit theory: $name', (expected) => {
  const { options } = design(recordOf(expected.fields));
  const built = options.find(({ id }) => id === expected.id)!.built!;

  it('takes the three sets that a search of all preferred values finds, with their return losses to 1 part in 10⁹', () => {
    const found = built.sets.toSorted((a, b) => b.worstReturnLossDb - a.worstReturnLossDb);
    expect(found).toHaveLength(3);
    expected.sets.forEach(([first, second, db], k) => {
      near(found[k]!.values[0]!, first, 1e-9);
      near(found[k]!.values[1]!, second, 1e-9);
      near(found[k]!.worstReturnLossDb, db, 1e-9);
    });
  });

  it('is worst at that frequency and in that state, and loses as much, to 1 part in 10⁹', () => {
    near(built.worstReturnLossDb, expected.sets[0]![2], 1e-9);
    near(built.worstAtHz, expected.worstAtHz, 1e-9);
    expect(built.worstState).toBe(expected.worstState);
    near(built.lossDb, expected.lossDb, 1e-9);
  });

  it('has these voltages, currents and heat, to 1 part in 10⁹; over all angles of the load, 1 in 10⁶', () => {
    built.stress!.parts.forEach((part, k) => {
      nearFigures(part, expected.stress[k]!, 1e-9);
      if (expected.mismatched === null) expect(part.mismatched).toBeNull();
      else nearFigures(part.mismatched!, expected.mismatched[k]!, 1e-6);
    });
  });

  it('has its worst corner there, to 1 part in 10⁹', () => {
    near(built.corners!.worstReturnLossDb, expected.cornerDb, 1e-9);
  });

  it('has that yield within four standard deviations of both draws', () => {
    const { value, samples } = built.yield!;
    const deviation = Math.sqrt(expected.yield * (1 - expected.yield) * (1 / samples + 1 / 200_000));
    expect(Math.abs(value - expected.yield)).toBeLessThan(4 * deviation);
  });

  it('is centred no worse than by Nelder-Mead, to 0.01 dB', () => {
    expect(built.centring.centredDb).toBeGreaterThan(expected.centredDb - 0.01);
  });
});
