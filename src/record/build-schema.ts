import * as v from 'valibot';
import { distributions } from '../evidence/distribution.ts';
import { origins } from '../parts/origin.ts';
import type { StockList } from '../parts/stock.ts';
import type { Build } from './design-record.ts';
import { between, limits, number, text } from './schema-pieces.ts';

const tolerance = (what: string) =>
  v.pipe(
    v.strictObject({
      kind: v.picklist(['relative', 'absolute'], `${what} is of no known kind; give relative or absolute`),
      value: v.pipe(number(what), v.minValue(0, `${what} is negative; give 0 or more`)),
    }),
    v.check(
      ({ kind, value }) => value < (kind === 'relative' ? 1 : 1e-3),
      `${what} leaves nothing of the part; give less than 100 %`,
    ),
  );

const frequency = (what: string) =>
  v.nullable(between(what, limits.frequencyHz.low, limits.frequencyHz.high, 'a frequency from 1 Hz to 1 THz'));

const policy = (what: string) =>
  v.strictObject({
    origin: v.picklist(origins, `the ${what}' series is unknown; give ${origins.join(', ')}`),
    tolerance: tolerance(`the ${what}' tolerance`),
    qSlope: between(`the slope of the ${what}' Q`, -2, 2, 'a slope from −2 to 2; 0 is a constant Q'),
  });

const rating = (what: string, most: number, unit: string) =>
  v.nullable(
    v.pipe(
      number(what),
      v.gtValue(0, `${what} must be above zero; give ${unit}, or leave it out`),
      v.maxValue(most, `${what} is out of range; give at most ${String(most)} ${unit}`),
    ),
  );

const stockPart = v.strictObject({
  name: v.pipe(text("a part's name", limits.nameLetters), v.minLength(1, 'a part has no name; give it one')),
  kind: v.picklist(['inductor', 'capacitor'], "a part's kind is unknown; give inductor or capacitor"),
  value: between("a part's value", 1e-18, 1, 'henry or farad above zero'),
  tolerance: v.nullable(tolerance("a part's tolerance")),
  q: v.nullable(between("a part's Q", 1, 1e6, 'a Q from 1 to 1 000 000')),
  qAtHz: frequency("the frequency of a part's Q"),
  selfResonanceHz: frequency("a part's self-resonance"),
  eslH: v.nullable(between("a part's ESL", 0, 1e-3, 'henry')),
  ratedVolts: rating("a part's rated voltage", 1e6, 'V'),
  ratedAmps: rating("a part's rated current", 1e5, 'A'),
});

const stockList = v.strictObject({
  name: text('the name of the stock list', limits.nameLetters),
  sha256: v.pipe(v.string(), v.regex(/^[0-9a-f]{64}$/u, 'this is no SHA-256 digest; give 64 hex digits')),
  parts: v.pipe(
    v.array(stockPart),
    v.minLength(1, 'the stock list is empty; give one part or more'),
    v.maxLength(
      limits.stockParts,
      `the stock list is too long; give at most ${String(limits.stockParts)} parts of the values in question`,
    ),
  ),
});

/** Lists found sound before: a long one isn't gone through again at every keystroke. */
const sound = new WeakSet();

const stock: v.GenericSchema<unknown, StockList> = Object.assign(
  v.lazy((input): v.GenericSchema<unknown, StockList> => {
    const known = typeof input === 'object' && input !== null ? input : {};
    if (sound.has(known)) return v.custom<StockList>(() => true);
    return v.pipe(
      stockList,
      v.transform((list) => {
        sound.add(known);
        return list;
      }),
    );
  }),
  { forms: [stockList] },
);

/** What real parts are taken from, and what is asked of the network built of them. */
export const buildSchema: v.GenericSchema<unknown, Build> = v.pipe(
  v.strictObject({
    inductor: policy('inductors'),
    capacitor: policy('capacitors'),
    stock: v.nullable(stock),
    pairs: v.boolean('whether two parts may stand for one is not yes or no; give yes or no, in a record true or false'),
    selfResonanceHz: frequency("the inductors' self-resonance"),
    eslH: between("the capacitors' ESL", 0, 1e-3, 'henry, from 0 to 1 mH'),
    strayF: between('the stray capacitance', 0, 1e-6, 'farad, from 0 to 1 µF'),
    leadH: between('the lead inductance', 0, 1e-3, 'henry, from 0 to 1 mH'),
    distribution: v.picklist(distributions, `this distribution is unknown; give ${distributions.join(', ')}`),
    sourceSpread: between("the source's spread", 0, 0.9, '0 to 90 %'),
    loadSpread: between("the load's spread", 0, 0.9, '0 to 90 %'),
    samples: v.pipe(
      between('the number of networks drawn', 1, limits.draws, `a whole number from 1 to ${String(limits.draws)}`),
      v.integer(`the number of networks drawn is not whole; give a whole number from 1 to ${String(limits.draws)}`),
    ),
    seed: v.pipe(
      between('the seed', 0, 4294967295, 'a whole number from 0 to 4294967295'),
      v.integer('the seed is not whole; give a whole number from 0 to 4294967295'),
    ),
    leastYield: v.nullable(
      v.pipe(
        number('the least yield'),
        v.gtValue(0, 'a yield is above 0; give a percentage up to 100'),
        v.maxValue(1, 'a yield is at most 100 %; give a percentage up to 100'),
      ),
    ),
    vswr: v.nullable(between('the load mismatch', 1, 1000, 'a VSWR from 1 to 1000')),
    derating: v.pipe(
      number('the derating'),
      v.gtValue(0, 'a rating of which nothing may be used is none; give a percentage above 0 up to 100'),
      v.maxValue(1, 'more than a rating may not be used; give a percentage up to 100'),
    ),
    ratedVolts: rating('the rated voltage', 1e6, 'V'),
    ratedAmps: rating('the rated current', 1e5, 'A'),
    ratedWatts: rating('the rated heat', 1e5, 'W'),
    winding: v.strictObject({
      wireM: between('the wire', 1e-5, 0.05, 'a diameter from 0.01 mm to 50 mm'),
      formM: between('the form', 1e-4, 1, 'a diameter from 0.1 mm to 1 m'),
      gapM: between('the gap between turns', 0, 0.1, 'a gap from 0 to 100 mm'),
    }),
  }),
  v.forward(
    v.check(
      ({ stock: list, inductor }) => inductor.origin !== 'stock' || (list?.parts.some(isKind('inductor')) ?? false),
      'inductors are to come from a stock list and none is given with such; give a list that has them, or a series such as E24',
    ),
    ['inductor', 'origin'],
  ),
  v.forward(
    v.check(
      ({ stock: list, capacitor }) => capacitor.origin !== 'stock' || (list?.parts.some(isKind('capacitor')) ?? false),
      'capacitors are to come from a stock list and none is given with such; give a list that has them, or a series such as E24',
    ),
    ['capacitor', 'origin'],
  ),
  v.forward(
    v.check(({ capacitor }) => capacitor.origin !== 'wound', 'a capacitor is not wound; give a series or stock'),
    ['capacitor', 'origin'],
  ),
);

const isKind =
  (kind: 'inductor' | 'capacitor') =>
  (part: { readonly kind: string }): boolean =>
    part.kind === kind;
