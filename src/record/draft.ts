import { formatRead } from '../quantity/format.ts';
import { InputError, type Problem } from '../quantity/problem.ts';
import { readQuantity } from '../quantity/read-quantity.ts';
import { readSpan } from '../quantity/read-span.ts';
import type { Reading } from '../quantity/reading.ts';
import type { Span } from '../quantity/span.ts';
import type { Unit } from '../quantity/unit.ts';
import { checkRecord } from './check-record.ts';
import type { DesignRecord } from './design-record.ts';
import { draftBuild, readDeviations } from './draft-build.ts';
import { nothingKept, type Kept } from './kept.ts';
import { readLoads, readTermination, terminationWords, type Attachments } from './read-termination.ts';
import { defaults, fieldNames, pathOf, type FieldName, type Fields } from './fields.ts';

export interface Draft {
  /** null while a field can't be used. */
  readonly record: DesignRecord | null;
  /** `field` is the name of a field; at most one each. */
  readonly problems: readonly Problem[];
  /** What was understood of quantities, in engineering notation. */
  readonly understood: Partial<Record<FieldName, string>>;
}

const examples = {
  band: '150.5M..152M',
  sweep: '100M..200M',
  inductors: '1n..10u',
  capacitors: '1p..100n',
} as const;

/**
 * Typed texts, of the sheet or of the command line, as a design record.
 *
 * @param attachments measured data at hand, by the name that stands for them in a field
 * @param kept        what no field's text can hold
 */
export function readDraft(given: Fields, attachments: Attachments = new Map(), kept: Kept = nothingKept): Draft {
  const fields: Record<FieldName, string> = { ...defaults, ...given };
  const problems: Problem[] = [];
  const understood: Partial<Record<FieldName, string>> = {};

  const take = <T>(name: FieldName, reading: Reading<T>, words: (value: T) => string): T | undefined => {
    if (reading.ok) {
      understood[name] = words(reading.value);
      return reading.value;
    }
    problems.push({ field: name, read: fields[name], why: reading.why, would: reading.would });
    return undefined;
  };
  const quantity = (name: FieldName, unit: Unit): number | undefined =>
    take(name, readQuantity(fields[name], unit), (value) => formatRead(value, unit));
  const optional = (name: FieldName, unit: Unit): number | null | undefined =>
    fields[name].trim() === '' ? null : quantity(name, unit);
  const range = (name: keyof typeof examples, unit: Unit): Span | undefined =>
    take(
      name,
      readSpan(fields[name], unit, examples[name]),
      ({ low, high }) => `${formatRead(low, unit)} to ${formatRead(high, unit)}`,
    );
  const optionalRange = (name: 'band' | 'sweep'): Span | null | undefined =>
    fields[name].trim() === '' ? null : range(name, 'Hz');
  const source = take(
    'source',
    readTermination(fields.source, fields['source-behaviour'], attachments),
    terminationWords,
  );
  const loads = take('load', readLoads(fields.load, fields['load-behaviour'], attachments), (states) =>
    states
      .map(({ name, termination }) => `${name === '' ? '' : `${name}: `}${terminationWords(termination)}`)
      .join('; '),
  );
  // What number it may be is the record's to say.
  const whole = (name: FieldName): number | string =>
    /^[+-]?\d+(?:\.\d+)?(?:e[+-]?\d{1,2})?$/iu.test(fields[name].trim()) ? Number(fields[name]) : fields[name].trim();
  const plainNumber = (name: FieldName): number | string => {
    const value = Number(fields[name].trim().replace(',', '.'));
    return fields[name].trim() === '' || !Number.isFinite(value) ? fields[name] : value;
  };
  const signature = (name: 'prepared' | 'checked' | 'approved') => ({
    name: fields[`${name}-name`],
    role: fields[`${name}-role`],
    date: fields[`${name}-date`].trim(),
    remark: fields[`${name}-remark`],
  });
  const yesNo = (name: FieldName): boolean | string =>
    ['yes', 'no'].includes(fields[name]) ? fields[name] === 'yes' : fields[name];

  const candidate = {
    schema: 'ferrule-record/2',
    identity: {
      title: fields.title,
      number: fields.number,
      revision: fields.revision,
      date: fields.date.trim(),
      ticket: fields.ticket,
      owner: fields.owner,
      change: fields.change,
    },
    requirement: {
      frequencyHz: quantity('frequency', 'Hz'),
      bandHz: optionalRange('band'),
      returnLossDb: optional('return-loss', 'dB'),
      blockDc: yesNo('block-dc'),
      keepDc: fields['keep-dc'],
      inductorH: range('inductors', 'H'),
      capacitorF: range('capacitors', 'F'),
      powerW: optional('power', 'W'),
    },
    source,
    loads,
    aim: fields.aim,
    method: fields.method,
    sections: whole('sections'),
    q: fields.q.trim() === '' ? null : plainNumber('q'),
    fit: {
      elements: whole('elements'),
      form: fields['fit-form'],
      shuntInductor: yesNo('shunt-inductor'),
      seed: whole('fit-seed'),
      steps: fields.steps.trim() === '' ? null : whole('steps'),
    },
    partQ: { inductor: plainNumber('q-inductor'), capacitor: plainNumber('q-capacitor') },
    build: draftBuild({ fields, take, quantity, plainNumber, whole, yesNo }, kept),
    sweepHz: optionalRange('sweep'),
    selection: { option: fields.choice === '' ? null : fields.choice, reason: fields.reason, set: whole('set') },
    deviations: readDeviations(fields.deviations),
    history: kept.history,
    previous: kept.previous,
    asBuilt: kept.asBuilt,
    signOff: {
      state: fields.state,
      prepared: signature('prepared'),
      checked: signature('checked'),
      approved: signature('approved'),
    },
  };

  try {
    const record = checkRecord(candidate);
    return { record: problems.length === 0 ? record : null, problems: inOrder(problems), understood };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const all = [...problems, ...fromRecord(error.problems, fields, problems)];
    return { record: null, problems: inOrder(all), understood };
  }
}

/** In the order of the fields, which is that of the sheet. */
const inOrder = (problems: readonly Problem[]): readonly Problem[] => {
  const place = ({ field }: Problem): number => fieldNames.findIndex((name) => name === field);
  return problems.toSorted((a, b) => place(a) - place(b));
};

/** Problems of the record, told of the field in which its text was typed. */
function fromRecord(
  found: readonly Problem[],
  fields: Record<FieldName, string>,
  known: readonly Problem[],
): readonly Problem[] {
  const taken = new Set(known.map(({ field }) => field));
  return found.flatMap((problem) => {
    const field =
      fieldNames.find((name) => pathOf[name] === problem.field) ??
      fieldNames.find((name) => problem.field.startsWith(`${pathOf[name]}.`));
    // What no field holds is told by its place in the record.
    if (field === undefined) return [problem];
    if (taken.has(field)) return [];
    taken.add(field);
    return [{ ...problem, field, read: fields[field] }];
  });
}
