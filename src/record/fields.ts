import { circuitModels } from '../network/circuit-model.ts';
import { isMeasured, isModel, isOneImpedance, type Behaviour, type Termination } from '../network/termination.ts';
import { formatRead } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { Unit } from '../quantity/unit.ts';
import type { DesignRecord } from './design-record.ts';

/**
 * The fields in which a record is typed: on the sheet, in its address and on the command line (`--frequency`), all by
 * the same names. Each leads to the place in the record that it fills.
 */
export const pathOf = {
  method: 'method',
  frequency: 'requirement.frequencyHz',
  source: 'source',
  'source-behaviour': 'source.behaviour',
  load: 'loads',
  'load-behaviour': 'loads.0.termination.behaviour',
  aim: 'aim',
  band: 'requirement.bandHz',
  'return-loss': 'requirement.returnLossDb',
  'block-dc': 'requirement.blockDc',
  'keep-dc': 'requirement.keepDc',
  inductors: 'requirement.inductorH',
  capacitors: 'requirement.capacitorF',
  power: 'requirement.powerW',
  sections: 'sections',
  q: 'q',
  elements: 'fit.elements',
  'fit-form': 'fit.form',
  'shunt-inductor': 'fit.shuntInductor',
  seed: 'fit.seed',
  steps: 'fit.steps',
  'q-inductor': 'partQ.inductor',
  'q-capacitor': 'partQ.capacitor',
  sweep: 'sweepHz',
  choice: 'selection.option',
  reason: 'selection.reason',
  title: 'identity.title',
  number: 'identity.number',
  revision: 'identity.revision',
  date: 'identity.date',
  ticket: 'identity.ticket',
  owner: 'identity.owner',
  'prepared-name': 'signOff.prepared.name',
  'prepared-role': 'signOff.prepared.role',
  'prepared-date': 'signOff.prepared.date',
  'checked-name': 'signOff.checked.name',
  'checked-role': 'signOff.checked.role',
  'checked-date': 'signOff.checked.date',
  'approved-name': 'signOff.approved.name',
  'approved-role': 'signOff.approved.role',
  'approved-date': 'signOff.approved.date',
} as const;

export type FieldName = keyof typeof pathOf;
export type Fields = Partial<Record<FieldName, string>>;
export const fieldNames = Object.keys(pathOf) as FieldName[];

/** What a field holds where nothing is typed. The practicable ranges are those of src/parts/practicable.ts. */
export const defaults: Record<FieldName, string> = {
  ...(Object.fromEntries(fieldNames.map((name) => [name, ''])) as Record<FieldName, string>),
  method: 'two-element',
  'source-behaviour': 'series',
  'load-behaviour': 'series',
  aim: 'conjugate',
  'block-dc': 'no',
  'keep-dc': 'none',
  inductors: '1n..10u',
  capacitors: '1p..100n',
  sections: 'auto',
  elements: 'auto',
  'fit-form': 'any',
  'shunt-inductor': 'yes',
  seed: '1',
  'q-inductor': '50',
  'q-capacitor': '300',
  title: 'Matching network',
  number: 'unnumbered',
  revision: 'A',
};

/** A record as the texts of its fields: reading them again gives the same record. */
export function fieldsOf(record: DesignRecord): Record<FieldName, string> {
  const { identity, requirement, source, loads, selection, signOff, fit, partQ } = record;
  return {
    method: record.method,
    frequency: plain(requirement.frequencyHz, 'Hz'),
    source: terminationText(source),
    'source-behaviour': behaviourOf([source]),
    load: loads
      .map(({ name, termination }) => (name === '' ? '' : `${name} = `) + terminationText(termination))
      .join('\n'),
    'load-behaviour': behaviourOf(loads.map(({ termination }) => termination)),
    aim: record.aim,
    band: spanText(requirement.bandHz, 'Hz'),
    'return-loss': requirement.returnLossDb === null ? '' : String(requirement.returnLossDb),
    'block-dc': requirement.blockDc ? 'yes' : 'no',
    'keep-dc': requirement.keepDc,
    inductors: spanText(requirement.inductorH, 'H'),
    capacitors: spanText(requirement.capacitorF, 'F'),
    power: requirement.powerW === null ? '' : plain(requirement.powerW, 'W'),
    sections: String(record.sections),
    q: record.q === null ? '' : String(record.q),
    elements: String(fit.elements),
    'fit-form': fit.form,
    'shunt-inductor': fit.shuntInductor ? 'yes' : 'no',
    seed: String(fit.seed),
    steps: fit.steps === null ? '' : String(fit.steps),
    'q-inductor': String(partQ.inductor),
    'q-capacitor': String(partQ.capacitor),
    sweep: spanText(record.sweepHz, 'Hz'),
    choice: selection.option ?? '',
    reason: selection.reason,
    ...identity,
    'prepared-name': signOff.prepared.name,
    'prepared-role': signOff.prepared.role,
    'prepared-date': signOff.prepared.date,
    'checked-name': signOff.checked.name,
    'checked-role': signOff.checked.role,
    'checked-date': signOff.checked.date,
    'approved-name': signOff.approved.name,
    'approved-role': signOff.approved.role,
    'approved-date': signOff.approved.date,
  };
}

/**
 * Engineering notation where it says the value exactly, the number itself where it doesn't. Its unit stands with it, so
 * that a span's lower end isn't read with the prefix of the upper one.
 */
function plain(value: number, unit: Unit): string {
  const written = formatRead(value, unit);
  const [mantissa = '', prefixed = ''] = written.replace('−', '-').split(' ');
  const exponent = exponents[prefixed.slice(0, prefixed.length - unit.length)];
  return exponent !== undefined && Number(`${mantissa}e${String(exponent)}`) === value
    ? written
    : `${String(value)} ${unit}`;
}

const exponents: Readonly<Record<string, number>> = {
  T: 12,
  G: 9,
  M: 6,
  k: 3,
  '': 0,
  m: -3,
  µ: -6,
  n: -9,
  p: -12,
  f: -15,
  a: -18,
};

/** Measured data go by their name: the text of a field can't hold them. */
function terminationText(termination: Termination): string {
  if (isMeasured(termination)) return termination.measured.name;
  if (isModel(termination)) {
    const { units } = circuitModels[termination.model];
    const values = termination.values.map((value, k) => {
      const unit = units[k]!;
      return unit === '' ? String(value) : plain(value, unit).replace(/\s+/gu, '');
    });
    return [termination.model, ...values].join(' ');
  }
  const { r, x } = termination;
  return x === 0 ? String(r) : `${String(r)}${x < 0 ? '-' : '+'}j${String(Math.abs(x))}`;
}

/** One choice serves every impedance of an end. */
const behaviourOf = (terminations: readonly Termination[]): Behaviour =>
  terminations.find(isOneImpedance)?.behaviour ?? 'series';

const spanText = (span: Span | null, unit: Unit): string =>
  span === null ? '' : `${plain(span.low, unit)} to ${plain(span.high, unit)}`;
