import * as v from 'valibot';
import { circuitModels, type CircuitModelName } from '../network/circuit-model.ts';
import { isResistive } from '../network/termination-at.ts';
import type { Termination } from '../network/termination.ts';
import { mostSections } from '../synthesis/cascade.ts';
import { buildSchema } from './build-schema.ts';
import type { DesignRecord } from './design-record.ts';
import { methods, requirements } from './design-record.ts';
import { between, controlsButNewLine, date, frequency, limits, number, printed, span, text } from './schema-pieces.ts';

/**
 * What a record may hold. The same schema reads records, checks the sheet's fields and writes the published JSON
 * Schema.
 * Long, because all that is refused of a record is refused here.
 */

const oneImpedance = (what: string) =>
  v.strictObject({
    r: v.pipe(
      number(`the ${what}'s resistance`),
      v.gtValue(0, `the ${what}'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61`),
      v.minValue(limits.resistanceOhm.low, `the ${what}'s resistance is out of range; give 1 µΩ to 1 GΩ`),
      v.maxValue(limits.resistanceOhm.high, `the ${what}'s resistance is out of range; give 1 µΩ to 1 GΩ`),
    ),
    x: between(`the ${what}'s reactance`, -limits.reactanceOhm, limits.reactanceOhm, '−1 GΩ to 1 GΩ'),
    behaviour: v.picklist(
      ['constant', 'series', 'parallel'],
      `the ${what}'s behaviour is unknown; give constant, series or parallel`,
    ),
  });

const modelNames = Object.keys(circuitModels) as CircuitModelName[];

const model = (what: string) =>
  v.pipe(
    v.strictObject({
      model: v.picklist(modelNames, `the ${what}'s model is unknown; give one of ${modelNames.join(', ')}`),
      values: v.pipe(
        v.array(between(`a value of the ${what}'s model`, 1e-18, 1e12, 'values above zero in SI units')),
        v.minLength(2, `the ${what}'s model lacks values; give one for each of its parts`),
        v.maxLength(4, `the ${what}'s model has too many values; give one for each of its parts`),
      ),
    }),
    v.check(
      ({ model: name, values }) => values.length === circuitModels[name].symbols.length,
      `the ${what}'s model has not as many values as parts; give one for each of them`,
    ),
  );

const samples = (what: string) =>
  v.pipe(
    v.array(number(`a sample of the ${what}`)),
    v.minLength(2, `the ${what} has too few samples; give two or more`),
    v.maxLength(limits.samples, `the ${what} has too many samples; give at most ${String(limits.samples)}`),
  );

const digest = v.pipe(v.string(), v.regex(/^[0-9a-f]{64}$/u, 'this is no SHA-256 digest; give 64 hex digits'));

const measuredData = (what: string) =>
  v.pipe(
    v.strictObject({
      name: text(`the name of the ${what}'s data`, limits.nameLetters),
      sha256: digest,
      samples: v.pipe(number('the number of samples'), v.integer(), v.minValue(2)),
      thinningError: between('the thinning error', 0, 2, 'a distance between reflection coefficients'),
      referenceOhm: between('the reference', limits.resistanceOhm.low, limits.resistanceOhm.high, '1 µΩ to 1 GΩ'),
      frequencyHz: samples(what),
      re: samples(what),
      im: samples(what),
    }),
    v.check(
      ({ frequencyHz, re, im }) => re.length === frequencyHz.length && im.length === frequencyHz.length,
      `the ${what}'s columns differ in length; give as many of each`,
    ),
    v.check(
      ({ frequencyHz }) => frequencyHz.every((hz, k) => hz >= 0 && (k === 0 || hz > frequencyHz[k - 1]!)),
      `the ${what}'s frequencies do not ascend; give each once, ascending`,
    ),
    v.check(
      ({ re, im }) => re.every((value, k) => Math.hypot(value, im[k]!) < 1),
      `the ${what} reflects all power or more somewhere; give a passive termination`,
    ),
  );

const measured = (what: string) => v.strictObject({ measured: measuredData(what) });

/** The forms that a termination can have; which one is meant shows in its fields, so that messages speak of that one. */
function termination(what: string): v.GenericSchema<unknown, Termination> {
  const forms = { one: oneImpedance(what), model: model(what), measured: measured(what) };
  const chosen = v.lazy((input): v.GenericSchema<unknown, Termination> => {
    if (typeof input !== 'object' || input === null) return forms.one;
    return 'model' in input ? forms.model : 'measured' in input ? forms.measured : forms.one;
  });
  return Object.assign(chosen, { forms: Object.values(forms) });
}

const signature = (what: string) =>
  v.strictObject({
    name: printed(`the name under ${what}`, limits.nameLetters),
    role: printed(`the role under ${what}`, limits.nameLetters),
    date: date(`the date under ${what}`, true),
    remark: printed(`the remark under ${what}`, limits.remarkLetters, controlsButNewLine),
  });

/** One revision before: a whole record, itself without one before. */
const previous: v.GenericSchema<unknown, DesignRecord> = Object.assign(
  v.lazy(() =>
    v.pipe(
      recordSchema,
      v.check(({ previous: before }) => before === null, 'the revision before has one before it; keep only the last'),
    ),
  ),
  { self: true },
);

export const recordSchema: v.GenericSchema<unknown, DesignRecord> = v.pipe(
  v.strictObject({
    schema: v.literal('ferrule-record/2', 'this schema is unknown; give "ferrule-record/2"'),
    identity: v.strictObject({
      title: printed('the title', limits.nameLetters),
      number: printed('the document number', limits.nameLetters),
      revision: printed('the revision', limits.nameLetters),
      date: date('the date of issue', false),
      ticket: printed('the change ticket', limits.nameLetters),
      owner: printed('the legal owner', limits.nameLetters),
      change: printed('the change', limits.reasonLetters, controlsButNewLine),
    }),
    requirement: v.strictObject({
      frequencyHz: frequency('the design frequency'),
      bandHz: v.nullable(
        span('the band', limits.frequencyHz.low, limits.frequencyHz.high, 'frequencies from 1 Hz to 1 THz'),
      ),
      returnLossDb: v.nullable(
        v.pipe(
          number('the return loss'),
          v.gtValue(0, 'a return loss is above 0 dB; give 0 to 100 dB, larger is better'),
          v.maxValue(limits.returnLossDb, 'the return loss is out of range; give 0 to 100 dB, larger is better'),
        ),
      ),
      blockDc: v.boolean('whether DC is to be blocked is not yes or no; give yes or no, in a record true or false'),
      keepDc: v.picklist(
        ['none', 'source', 'load', 'both'],
        'the ends that carry DC are unknown; give none, source, load or both',
      ),
      inductorH: span('the range of inductance', limits.inductorH.low, limits.inductorH.high, 'values such as 1n..10u'),
      capacitorF: span(
        'the range of capacitance',
        limits.capacitorF.low,
        limits.capacitorF.high,
        'values such as 1p..100n',
      ),
      powerW: v.nullable(
        v.pipe(
          number('the power'),
          v.gtValue(0, 'the power must be above zero; give watts, or leave it out'),
          v.maxValue(limits.powerW, 'the power is out of range; give at most 100 kW'),
        ),
      ),
    }),
    source: termination('source'),
    loads: v.pipe(
      v.array(
        v.strictObject({
          name: printed("the load state's name", limits.stateLetters),
          termination: termination('load'),
        }),
      ),
      v.minLength(1, 'no load is given; give one state or more'),
      v.maxLength(limits.states, `there are too many load states; give at most ${String(limits.states)}`),
      v.check(
        (loads) => new Set(loads.map(({ name }) => name)).size === loads.length,
        'two load states have the same name; give each its own',
      ),
    ),
    aim: v.picklist(['conjugate', 'reflectionless'], 'the aim is unknown; give conjugate or reflectionless'),
    method: v.picklist(methods, `the method is unknown; give ${methods.join(', ')}`),
    sections: v.picklist(
      ['auto', 1, 2, 3, 4, 5, 6],
      `the number of sections is out of range; give auto or a whole number from 1 to ${String(mostSections)}`,
    ),
    q: v.nullable(between('the chosen Q', 1e-3, 1e6, 'a Q from 0.001 to 1 000 000')),
    fit: v.strictObject({
      elements: v.picklist(
        ['auto', 2, 3, 4, 5, 6, 7, 8],
        'the number of elements is out of range; give auto or a whole number from 2 to 8',
      ),
      form: v.picklist(['any', 'low-pass', 'high-pass'], 'this form is unknown; give any, low-pass or high-pass'),
      shuntInductor: v.boolean('whether shunt inductors are allowed is not yes or no; give yes or no'),
      seed: v.pipe(
        between('the seed', 0, 4294967295, 'a whole number from 0 to 4294967295'),
        v.integer('the seed is not whole; give a whole number from 0 to 4294967295'),
      ),
      steps: v.nullable(
        v.pipe(
          between('the number of steps', 1, 1e6, 'a whole number from 1'),
          v.integer('the number of steps is not whole; give a whole number from 1'),
        ),
      ),
    }),
    partQ: v.strictObject({
      inductor: between("the inductors' Q", 1, 1e6, 'a Q from 1 to 1 000 000'),
      capacitor: between("the capacitors' Q", 1, 1e6, 'a Q from 1 to 1 000 000'),
    }),
    build: v.nullable(buildSchema),
    sweepHz: v.nullable(
      v.pipe(
        span('the sweep', limits.frequencyHz.low, limits.frequencyHz.high, 'frequencies from 1 Hz to 1 THz'),
        v.check(({ low, high }) => low < high, 'the sweep has no width; give two different frequencies'),
      ),
    ),
    selection: v.strictObject({
      option: v.nullable(text('the chosen network', limits.nameLetters)),
      reason: printed('the reason', limits.reasonLetters, controlsButNewLine),
      set: v.picklist([1, 2, 3], 'the set of values is unknown; give 1, 2 or 3'),
    }),
    deviations: v.pipe(
      v.array(
        v.strictObject({
          subject: v.picklist(
            requirements,
            `a deviation is from what is required; begin it with one of ${requirements.join(', ')}, as in "return loss = accepted because …"`,
          ),
          reason: printed('the reason of a deviation', limits.reasonLetters),
        }),
      ),
      v.maxLength(limits.deviations, `there are too many deviations; give at most ${String(limits.deviations)}`),
    ),
    history: v.pipe(
      v.array(
        v.strictObject({
          revision: printed('an earlier revision', limits.nameLetters),
          date: date('the date of an earlier revision', false),
          change: printed('the change of an earlier revision', limits.reasonLetters, controlsButNewLine),
          digest,
        }),
      ),
      v.maxLength(limits.revisions, `there are too many revisions; give at most ${String(limits.revisions)}`),
    ),
    previous: v.nullable(previous),
    asBuilt: v.nullable(
      v.strictObject({
        measured: measuredData('board'),
        state: v.nullable(text('the load state attached', limits.stateLetters)),
        note: printed('the note on the board', limits.reasonLetters, controlsButNewLine),
      }),
    ),
    signOff: v.strictObject({
      state: v.picklist(['draft', 'for review', 'issued'], 'this state is unknown; give draft, for review or issued'),
      prepared: signature('prepared'),
      checked: signature('checked'),
      approved: signature('approved'),
    }),
  }),
  v.forward(
    v.check(({ requirement: { bandHz, frequencyHz } }) => {
      return bandHz === null || (bandHz.low <= frequencyHz && frequencyHz <= bandHz.high);
    }, 'the band does not hold the design frequency; widen the band or move the frequency'),
    ['requirement', 'bandHz'],
  ),
  v.forward(
    v.check(
      ({ build, requirement: { returnLossDb } }) => (build?.leastYield ?? null) === null || returnLossDb !== null,
      'a least yield is asked for, of networks that hold a return loss; give that too, or ask for no yield',
    ),
    ['requirement', 'returnLossDb'],
  ),
  v.forward(
    v.check(
      ({ asBuilt, loads }) =>
        asBuilt === null || asBuilt.state === null || loads.some(({ name }) => name === asBuilt.state),
      'the board was measured with a load state that there is not; name one of them, or none',
    ),
    ['asBuilt'],
  ),
  v.forward(
    v.check(
      ({ selection: { option, set } }) => set === 1 || option !== null,
      'a set of values belongs to a network; choose that too',
    ),
    ['selection', 'set'],
  ),
  v.forward(
    v.check(({ sweepHz, requirement: { frequencyHz } }) => {
      return sweepHz === null || (sweepHz.low <= frequencyHz && frequencyHz <= sweepHz.high);
    }, 'the sweep does not hold the design frequency; widen the sweep'),
    ['sweepHz'],
  ),
  v.forward(
    v.check(({ sweepHz, requirement: { frequencyHz } }) => {
      return sweepHz === null || (sweepHz.low >= frequencyHz / 1000 && sweepHz.high <= frequencyHz * 1000);
    }, 'the sweep reaches too far; stay within a thousand times the design frequency'),
    ['sweepHz'],
  ),
  v.forward(
    v.check(({ requirement: { bandHz, frequencyHz } }) => {
      return bandHz === null || (bandHz.low >= frequencyHz / 1000 && bandHz.high <= frequencyHz * 1000);
    }, 'the band reaches too far; stay within a thousand times the design frequency'),
    ['requirement', 'bandHz'],
  ),
  v.forward(
    v.check(
      ({ method, source, loads }) =>
        method !== 'resistive-pair' || (isResistive(source) && loads.every(({ termination: t }) => isResistive(t))),
      'the Q method takes two resistances; leave the reactance out, or use complex terminations',
    ),
    ['method'],
  ),
  v.forward(
    v.check(
      ({ method, sections, requirement: { bandHz, returnLossDb } }) =>
        method !== 'cascade' || sections !== 'auto' || (bandHz !== null && returnLossDb !== null),
      'the smallest number of sections needs something to hold; give a band and a return loss, or a number of sections',
    ),
    ['sections'],
  ),
  v.forward(
    v.check(
      ({ method, requirement: { bandHz } }) => (method !== 'equal-ripple' && method !== 'fitted') || bandHz !== null,
      'this method is for a band; give one',
    ),
    ['requirement', 'bandHz'],
  ),
);
