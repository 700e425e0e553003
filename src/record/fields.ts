import { circuitModels } from '../network/circuit-model.ts';
import { isMeasured, isModel, isOneImpedance, type Behaviour, type Termination } from '../network/termination.ts';
import { formatRead } from '../quantity/format.ts';
import { writePercent } from '../quantity/read-percent.ts';
import type { Span } from '../quantity/span.ts';
import type { Unit } from '../quantity/unit.ts';
import type { Tolerance } from '../parts/tolerance.ts';
import type { Build, DesignRecord } from './design-record.ts';

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
  'fit-seed': 'fit.seed',
  steps: 'fit.steps',
  'q-inductor': 'partQ.inductor',
  'q-capacitor': 'partQ.capacitor',
  'series-inductor': 'build.inductor.origin',
  'series-capacitor': 'build.capacitor.origin',
  stock: 'build.stock',
  pairs: 'build.pairs',
  'tolerance-inductor': 'build.inductor.tolerance',
  'tolerance-capacitor': 'build.capacitor.tolerance',
  distribution: 'build.distribution',
  'source-spread': 'build.sourceSpread',
  'load-spread': 'build.loadSpread',
  samples: 'build.samples',
  seed: 'build.seed',
  'least-yield': 'build.leastYield',
  'q-slope-inductor': 'build.inductor.qSlope',
  'q-slope-capacitor': 'build.capacitor.qSlope',
  'self-resonance': 'build.selfResonanceHz',
  esl: 'build.eslH',
  stray: 'build.strayF',
  lead: 'build.leadH',
  mismatch: 'build.vswr',
  derating: 'build.derating',
  'rated-voltage': 'build.ratedVolts',
  'rated-current': 'build.ratedAmps',
  'rated-heat': 'build.ratedWatts',
  wire: 'build.winding.wireM',
  former: 'build.winding.formM',
  gap: 'build.winding.gapM',
  sweep: 'sweepHz',
  choice: 'selection.option',
  set: 'selection.set',
  reason: 'selection.reason',
  deviations: 'deviations',
  title: 'identity.title',
  number: 'identity.number',
  revision: 'identity.revision',
  date: 'identity.date',
  ticket: 'identity.ticket',
  owner: 'identity.owner',
  change: 'identity.change',
  state: 'signOff.state',
  'prepared-name': 'signOff.prepared.name',
  'prepared-role': 'signOff.prepared.role',
  'prepared-date': 'signOff.prepared.date',
  'prepared-remark': 'signOff.prepared.remark',
  'checked-name': 'signOff.checked.name',
  'checked-role': 'signOff.checked.role',
  'checked-date': 'signOff.checked.date',
  'checked-remark': 'signOff.checked.remark',
  'approved-name': 'signOff.approved.name',
  'approved-role': 'signOff.approved.role',
  'approved-date': 'signOff.approved.date',
  'approved-remark': 'signOff.approved.remark',
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
  'fit-seed': '1',
  pairs: 'no',
  'tolerance-inductor': '5%',
  'tolerance-capacitor': '5%',
  distribution: 'uniform',
  'source-spread': '0%',
  'load-spread': '0%',
  samples: '1000',
  seed: '1',
  'q-slope-inductor': '0',
  'q-slope-capacitor': '0',
  esl: '0 nH',
  stray: '0 pF',
  lead: '0 nH',
  derating: '80%',
  wire: '1 mm',
  former: '6 mm',
  gap: '0.5 mm',
  set: '1',
  state: 'draft',
  'q-inductor': '50',
  'q-capacitor': '300',
  title: 'Matching network',
  number: 'unnumbered',
  revision: 'A',
};

/**
 * Fields that say of what real parts the network is to be built; one of the first three asks for it, the others only
 * say more of it.
 */
export const asksForParts: readonly FieldName[] = ['series-inductor', 'series-capacitor', 'stock'];
export const tellsOfParts: readonly FieldName[] = fieldNames.filter(
  (name) => pathOf[name].startsWith('build.') && !asksForParts.includes(name),
);

/** A record as the texts of its fields: reading them again gives the same record. */
export function fieldsOf(record: DesignRecord): Record<FieldName, string> {
  const { identity, requirement, source, loads, selection, signOff, fit, partQ, build, deviations } = record;
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
    'fit-seed': String(fit.seed),
    steps: fit.steps === null ? '' : String(fit.steps),
    'q-inductor': String(partQ.inductor),
    'q-capacitor': String(partQ.capacitor),
    ...buildFields(build),
    sweep: spanText(record.sweepHz, 'Hz'),
    choice: selection.option ?? '',
    set: String(selection.set),
    reason: selection.reason,
    deviations: deviations.map(({ subject, reason }) => `${subject} = ${reason}`).join('\n'),
    ...identity,
    state: signOff.state,
    'prepared-name': signOff.prepared.name,
    'prepared-role': signOff.prepared.role,
    'prepared-date': signOff.prepared.date,
    'prepared-remark': signOff.prepared.remark,
    'checked-name': signOff.checked.name,
    'checked-role': signOff.checked.role,
    'checked-date': signOff.checked.date,
    'checked-remark': signOff.checked.remark,
    'approved-name': signOff.approved.name,
    'approved-role': signOff.approved.role,
    'approved-date': signOff.approved.date,
    'approved-remark': signOff.approved.remark,
  };
}

function buildFields(build: Build | null): Record<BuildField, string> {
  if (build === null) {
    return Object.fromEntries(
      fieldNames.filter((name) => pathOf[name].startsWith('build.')).map((name) => [name, defaults[name]]),
    ) as Record<BuildField, string>;
  }
  const { inductor, capacitor, winding } = build;
  const optional = (value: number | null, unit: Unit): string => (value === null ? '' : plain(value, unit));
  return {
    'series-inductor': inductor.origin,
    'series-capacitor': capacitor.origin,
    stock: build.stock?.name ?? '',
    pairs: build.pairs ? 'yes' : 'no',
    'tolerance-inductor': toleranceText(inductor.tolerance, 'H'),
    'tolerance-capacitor': toleranceText(capacitor.tolerance, 'F'),
    distribution: build.distribution,
    'source-spread': writePercent(build.sourceSpread),
    'load-spread': writePercent(build.loadSpread),
    samples: String(build.samples),
    seed: String(build.seed),
    'least-yield': build.leastYield === null ? '' : writePercent(build.leastYield),
    'q-slope-inductor': String(inductor.qSlope),
    'q-slope-capacitor': String(capacitor.qSlope),
    'self-resonance': optional(build.selfResonanceHz, 'Hz'),
    esl: plain(build.eslH, 'H'),
    stray: plain(build.strayF, 'F'),
    lead: plain(build.leadH, 'H'),
    mismatch: build.vswr === null ? '' : String(build.vswr),
    derating: writePercent(build.derating),
    'rated-voltage': optional(build.ratedVolts, 'V'),
    'rated-current': optional(build.ratedAmps, 'A'),
    'rated-heat': optional(build.ratedWatts, 'W'),
    wire: plain(winding.wireM, 'm'),
    former: plain(winding.formM, 'm'),
    gap: plain(winding.gapM, 'm'),
  };
}

type BuildField = {
  [Name in FieldName]: (typeof pathOf)[Name] extends `build.${string}` ? Name : never;
}[FieldName];

const toleranceText = ({ kind, value }: Tolerance, unit: Unit): string =>
  kind === 'relative' ? writePercent(value) : plain(value, unit);

/**
 * Engineering notation where it says the value exactly, the number itself where it doesn't. Its unit stands with it, so
 * that a span's lower end isn't read with the prefix of the upper one.
 */
function plain(value: number, unit: Unit): string {
  const written = formatRead(value, unit);
  const [mantissa = '', prefixed = ''] = written.replace('−', '-').split(' ');
  const exponent = exponents[prefixed.slice(0, prefixed.length - unit.length)];
  // A lone m could be milli: metres without a prefix are written out.
  return exponent !== undefined && Number(`${mantissa}e${String(exponent)}`) === value && prefixed !== 'm'
    ? written
    : `${String(value)} ${unit === 'm' ? 'metre' : unit}`;
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
