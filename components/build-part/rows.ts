import { returnLossWords, yieldWords } from '../../src/design/words.ts';
import type {
  Built,
  CoilWinding,
  Option,
  PartSensitivity,
  Stress,
  StressFigures,
  StressKind,
} from '../../src/dossier.ts';
import { formatTolerance } from '../../src/parts/tolerance.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { column, figure, type Rows } from '../base/rows.ts';
import { orderedValue } from '../base/words.ts';

/** "93.2 %" */
export const percent = (fraction: number): string => `${formatFixed(fraction * 100, 1)} %`;

const unknown = 'not known';

/** What is to be ordered; a column that says the same of no part at all is left out. */
export function orderRows({ parts }: Built): Rows {
  const paired = parts.some(({ pair }) => pair !== null);
  const resonant = parts.some(({ selfResonanceHz }) => selfResonanceHz !== null);
  const columns = [
    column('Part'),
    column('Kind'),
    figure('Value'),
    column('From'),
    figure('Tolerance'),
    figure('Q'),
    ...(resonant ? [figure('Self-resonance')] : []),
    ...(paired ? [column('Joined')] : []),
  ];
  const rows = parts.map((part) => [
    part.designator,
    part.part,
    orderedValue(part),
    part.from,
    formatTolerance(part.tolerance, part.part),
    formatFixed(part.q, part.q < 100 ? 1 : 0),
    ...(resonant ? [part.selfResonanceHz === null ? 'not stated' : formatQuantity(part.selfResonanceHz, 'Hz')] : []),
    ...(paired ? [part.pair ?? 'alone'] : []),
  ]);
  return { columns, rows };
}

/** The figures by which a network of real parts is judged, each with its name. */
export function summaryRows(built: Built): readonly (readonly [string, string])[] {
  const { worstReturnLossDb, worstAtHz, worstState, corners, lossDb, efficiency } = built;
  const at = (hertz: number, state: string): string =>
    `at ${formatQuantity(hertz, 'Hz')}${state === '' ? '' : `, ${state}`}`;
  const corner =
    corners === null
      ? []
      : [
          [
            'Worst corner of the tolerances',
            `${returnLossWords(corners.worstReturnLossDb)} ${at(corners.worstAtHz, corners.worstState)}, ${corners.words}` +
              (corners.meets === null ? '' : corners.meets ? ': meets' : ': falls short'),
          ] as const,
        ];
  return [
    ['Worst return loss', `${returnLossWords(worstReturnLossDb)} ${at(worstAtHz, worstState)}`],
    ['Yield', built.yield === null ? 'not assessed: no return loss is required' : yieldWords(built.yield)],
    ...corner,
    ['Loss at the design frequency', `${formatFixed(lossDb, 2)} dB; efficiency ${percent(efficiency)}`],
  ];
}

/** From exact values to those on sale, step by step: what each costs or wins. */
export function stepRows({ centring, worstReturnLossDb, sets }: Built, { arms, designators }: Option): Rows {
  const { idealDb, realDb, centredDb, values } = centring;
  const anew = arms.map(
    ({ part }, k) => `${designators[k] ?? ''} ${formatQuantity(values[k]!, part === 'inductor' ? 'H' : 'F')}`,
  );
  const steps = [
    ['Exact values, ideal parts', idealDb],
    ['Exact values, with loss and strays', realDb],
    ...(sets.length === 0 || arms.length === 0
      ? []
      : ([[`Centred anew for these: ${anew.join(', ')}`, centredDb]] as const)),
    ...(sets.length === 0 ? [] : ([['Parts to order', worstReturnLossDb]] as const)),
  ] as const;
  return {
    columns: [column('Values'), figure('Worst return loss'), figure('Change')],
    rows: steps.map(([name, db], k) => {
      const before = steps[k - 1]?.[1];
      return [name, returnLossWords(db), before === undefined ? '' : change(db - before, db, before)];
    }),
  };
}

/** A difference of two figures says nothing where either is rounding. */
function change(db: number, now: number, before: number): string {
  if (now > 100 || before > 100) return '–';
  return `${db > 0 ? '+' : ''}${formatFixed(db, 2)} dB`;
}

const signed = (db: number): string => `${db > 0 ? '+' : ''}${formatFixed(db, 2)} dB`;

/** How much each part matters; the largest effect first. */
export function sensitivityRows(sensitivity: readonly PartSensitivity[]): Rows {
  const halved = sensitivity.some(({ yieldIfHalved }) => yieldIfHalved !== null);
  return {
    columns: [
      column('Part'),
      figure('For +1 %'),
      figure('For −1 %'),
      figure('At its tolerance'),
      ...(halved ? [figure('Yield, tolerance halved')] : []),
    ],
    rows: sensitivity.map(({ designator, dbPerPercent, dbPerMinusPercent, atToleranceDb, yieldIfHalved }) => [
      designator,
      signed(dbPerPercent),
      signed(dbPerMinusPercent),
      returnLossWords(atToleranceDb),
      ...(halved ? [yieldIfHalved === null ? '–' : percent(yieldIfHalved)] : []),
    ]),
  };
}

/** What each part costs at its tolerance, of the most that any costs: 0 to 1. */
export function sensitivityBars(sensitivity: readonly PartSensitivity[], worstReturnLossDb: number): readonly number[] {
  const costs = sensitivity.map(({ atToleranceDb }) => Math.max(0, worstReturnLossDb - atToleranceDb));
  const most = Math.max(...costs);
  return costs.map((cost) => (most === 0 ? 0 : cost / most));
}

const figuresOf = ({ voltsPeak, ampsRms, watts }: StressFigures): readonly string[] => [
  formatQuantity(voltsPeak, 'V', 3),
  formatQuantity(ampsRms, 'A', 3),
  formatQuantity(watts, 'W', 3),
];

/** What each part bears, with the load mismatched too, and which rating that meets first. */
export function stressRows({ parts, vswr, powerW }: Stress): Rows {
  const names = ['Peak voltage', 'RMS current', 'Heat'];
  const mismatch = vswr === null ? [] : names.map((name) => figure(`${name}, VSWR ${formatFixed(vswr, 1)}`));
  return {
    columns: [column('Part'), ...names.map(figure), ...mismatch, column('Reaches its rating')],
    rows: parts.map((part) => [
      part.designator,
      ...figuresOf(part),
      ...(vswr === null ? [] : part.mismatched === null ? names.map(() => '–') : figuresOf(part.mismatched)),
      limitWords(part.limitBy, part.limitW, powerW),
    ]),
  };
}

function limitWords(by: StressKind | null, limitW: number | null, powerW: number): string {
  if (by === null || limitW === null) return 'no rating known';
  const words = `of ${by} at ${formatQuantity(limitW, 'W', 3)}`;
  return limitW < powerW ? `over it: ${words}` : words;
}

/** Coils to be wound by hand; what the formulas don't hold for is said beneath. */
export const coilRows = (coils: readonly CoilWinding[]): Rows => ({
  columns: [
    column('Coil'),
    figure('Inductance'),
    figure('Turns'),
    figure('Mean diameter'),
    figure('Length'),
    figure('Wire'),
    figure('Length of wire'),
    figure('Own capacitance'),
    figure('Self-resonance'),
  ],
  rows: coils.map((coil) => [
    coil.designator,
    formatQuantity(coil.inductanceH, 'H'),
    formatFixed(coil.turns, 1),
    formatQuantity(coil.diameterM, 'm', 3),
    formatQuantity(coil.lengthM, 'm', 3),
    formatQuantity(coil.wireM, 'm', 3),
    formatQuantity(coil.wireLengthM, 'm', 3),
    coil.selfCapacitanceF === null ? unknown : formatQuantity(coil.selfCapacitanceF, 'F', 3),
    coil.selfResonanceHz === null ? unknown : formatQuantity(coil.selfResonanceHz, 'Hz', 3),
  ]),
});

/** A set of values by the designators of its arms: "L1 82 nH, C1 8.2 pF + 1 pF". */
export const setWords = (words: readonly string[], designators: readonly string[]): string =>
  words.map((text, k) => `${designators[k] ?? ''} ${text}`.replaceAll(' ', '\u00a0')).join(', ');
