import type { Built, Dossier, Option } from '../dossier.ts';
import { returnLossDb } from '../network/figures-of-merit.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { Change } from '../record/change.ts';
import { yieldWords } from './words.ts';

/** One thing that a dossier says, ready to be compared with what another says of the same. */
interface Finding {
  readonly group: 'results' | 'verdicts';
  readonly what: string;
  /** What isn't a number; two findings are different when these are. */
  readonly label: string;
  /** ... or when these differ by more than rounding. */
  readonly numbers: readonly number[];
  /** Size below which a difference counts as if the numbers were so large. */
  readonly floor: number;
  /** In words, with so many digits. */
  readonly write: (digits: number) => string;
}

/** Relative difference that is rounding. */
const rounding = 1e-9;
const [fewestDigits, mostDigits] = [4, 12];

/**
 * What came out otherwise: figures and verdicts of the chosen network, the ceiling, the proposal, the evidence. Figures
 * have as many digits as tell them apart; what differs by rounding alone is the same.
 */
export function dossierDifference(before: Dossier, after: Dossier): readonly Change[] {
  const [old, now] = [findingsOf(before), findingsOf(after)];
  return merged([...old.keys()], [...now.keys()])
    .map((what) => changeOf(what, old.get(what), now.get(what)))
    .filter((change) => change !== null)
    .toSorted((a, b) => Number(a.group === 'verdicts') - Number(b.group === 'verdicts'));
}

/** The later names in their order, and after the name before it each one that is gone. */
function merged(before: readonly string[], after: readonly string[]): readonly string[] {
  const names = [...after];
  for (const [k, name] of before.entries()) {
    if (!names.includes(name)) names.splice(k === 0 ? 0 : names.indexOf(before[k - 1]!) + 1, 0, name);
  }
  return names;
}

function changeOf(what: string, before: Finding | undefined, after: Finding | undefined): Change | null {
  if (before !== undefined && after !== undefined && same(before, after)) return null;
  const { group } = (after ?? before)!;
  const write = (finding: Finding | undefined, digits: number): string =>
    finding?.write(digits) ?? (group === 'results' ? 'none' : 'not assessed');
  let digits = fewestDigits;
  while (digits < mostDigits && write(before, digits) === write(after, digits)) digits += 1;
  return { group, what, before: write(before, digits), after: write(after, digits) };
}

const same = (a: Finding, b: Finding): boolean =>
  a.label === b.label &&
  a.numbers.length === b.numbers.length &&
  a.numbers.every((value, k) => {
    const other = b.numbers[k]!;
    return Math.abs(value - other) <= rounding * Math.max(Math.abs(value), Math.abs(other), a.floor);
  });

function findingsOf(dossier: Dossier): ReadonlyMap<string, Finding> {
  const option = dossier.options.find(({ id }) => id === dossier.chosen);
  const proposed = dossier.options.find(({ id }) => id === dossier.proposed);
  const findings = [
    words('results', 'Networks considered', String(dossier.options.length)),
    words('results', 'Network', option?.title ?? 'none'),
    ...(option === undefined ? [] : ofOption(option)),
    ...(option?.built ? ofBuilt(option.built) : []),
    ...ofCeiling(dossier),
    words('verdicts', 'Requirement', option === undefined ? 'no network' : option.meets ? 'met' : 'not met'),
    ...(option?.checks ?? []).map(({ subject, verdict }) => words('verdicts', `Verdict on ${subject}`, verdict)),
    words('verdicts', 'Network proposed', proposed?.title ?? 'none: none meets everything'),
    words('verdicts', 'Chosen by', dossier.chosenBy === 'nearest' ? 'nearest to what is required' : dossier.chosenBy),
    words('verdicts', 'Evidence', evidenceWords(dossier)),
  ];
  return new Map(findings.map((finding) => [finding.what, finding]));
}

const words = (group: Finding['group'], what: string, label: string): Finding => ({
  group,
  what,
  label,
  numbers: [],
  floor: 0,
  write: () => label,
});

const figure = (what: string, value: number, write: Finding['write'], label = ''): Finding => ({
  group: 'results',
  what,
  label,
  numbers: [value],
  floor: 0,
  write,
});

/** A decibel figure with two decimals or more; beyond 100 dB it is rounding. */
const decibels = (what: string, db: number): Finding => ({
  ...figure(what, Math.min(db, 100), (digits) => (db > 100 ? 'over 100 dB' : `${formatFixed(db, digits - 2)} dB`)),
  floor: 1,
});

const quantity = (what: string, value: number, unit: string, after = ''): Finding =>
  figure(what, value, (digits) => `${formatQuantity(value, unit, digits)}${after}`, after);

const unitOf = (part: 'inductor' | 'capacitor'): string => (part === 'inductor' ? 'H' : 'F');

function ofOption({ arms, designators, states, worstState, ...option }: Option): readonly Finding[] {
  const worst = option.worstReturnLossDb ?? returnLossDb(option.reflection ** 2);
  return [
    ...arms.map(({ arm, part, value }, k) =>
      quantity(`${designators[k] ?? ''}, exact`, value, unitOf(part), arm === 'series' ? ' in series' : ' across'),
    ),
    decibels('Worst return loss, exact parts', worst),
    ...(states.length < 2 ? [] : [words('results', 'Load state that governs', worstState)]),
    decibels('Loss for the stated Q', option.lossDb),
  ];
}

function ofBuilt({ parts, worstReturnLossDb, lossDb, yield: found, stress }: Built): readonly Finding[] {
  const first = stress?.first ?? null;
  return [
    ...parts.map(({ designator, part, value, from, pair }) =>
      quantity(designator, value, unitOf(part), ` (${from}${pair === null ? '' : `, one of two ${pair}`})`),
    ),
    decibels('Worst return loss, real parts', worstReturnLossDb),
    decibels('Loss, real parts', lossDb),
    ...(found === null
      ? []
      : [
          {
            ...figure('Yield', found.value, (digits) =>
              digits === fewestDigits ? yieldWords(found) : `${formatFixed(100 * found.value, digits - 3)} %`,
            ),
            numbers: [found.value, found.low, found.high],
          },
        ]),
    ...(stress?.parts ?? []).flatMap(({ designator, mismatched, ...matched }) => {
      const { voltsPeak, ampsRms, watts } = mismatched ?? matched;
      return [
        quantity(`Peak voltage across ${designator}`, voltsPeak, 'V'),
        quantity(`RMS current in ${designator}`, ampsRms, 'A'),
        quantity(`Heat in ${designator}`, watts, 'W'),
      ];
    }),
    ...(first === null
      ? []
      : [quantity('First rating reached', first.powerW, 'W', `: ${first.by} of ${first.designator}`)]),
  ];
}

function ofCeiling({ ceiling }: Dossier): readonly Finding[] {
  if (ceiling === null) return [words('verdicts', 'Ceiling', 'none')];
  const { bestReflection, verdict, needs } = ceiling;
  return [
    decibels('Ceiling, return loss', returnLossDb(bestReflection ** 2)),
    ...(needs === null ? [] : [words('results', 'Resonators needed', String(needs))]),
    words('verdicts', 'Ceiling', verdict),
  ];
}

function evidenceWords({ evidence }: Dossier): string {
  if (evidence === null) return 'none: no network';
  const failing = evidence.checks.filter(({ pass }) => !pass).map(({ subject }) => subject);
  return evidence.pass ? 'passes' : `fails: ${failing.join(', ')}`;
}
