import fc from 'fast-check';
import type { OneImpedance, Termination } from '../../src/network/termination.ts';
import { distributions } from '../../src/evidence/distribution.ts';
import type { Tolerance } from '../../src/parts/tolerance.ts';
import {
  methods,
  requirements,
  type Build,
  type DesignRecord,
  type Signature,
} from '../../src/record/design-record.ts';
import type { Span } from '../../src/quantity/span.ts';
import { aim, logUniform, termination } from './arbitraries.ts';

/** A value with few digits, as typed, or with all that a double has. */
const value = (low: number, high: number): fc.Arbitrary<number> =>
  fc
    .tuple(logUniform(low, high), fc.constantFrom(3, 6, 17))
    .map(([exact, digits]) => Math.min(high, Math.max(low, Number(exact.toPrecision(digits)))));

const span = (low: number, high: number): fc.Arbitrary<Span> =>
  fc.tuple(value(low, high), value(low, high)).map(([a, b]) => ({ low: Math.min(a, b), high: Math.max(a, b) }));

/** A span of frequencies that holds f0 and has a width. */
const around = (f0: number): fc.Arbitrary<Span> =>
  fc
    .tuple(value(1.001, 500), value(1.001, 500))
    .map(([below, above]) => ({ low: Math.max(1, f0 / below), high: Math.min(1e12, f0 * above) }));

/** Text that the report can print; in a reason, lines too. */
const text = (mostLetters: number, lines = false): fc.Arbitrary<string> =>
  fc
    .string({ unit: 'grapheme', maxLength: 12 })
    .map((letters) => letters.replace(/[\p{Cc}\p{Zl}\p{Zp}\p{Emoji_Presentation}]/gu, ''))
    .map((letters) =>
      letters.replace(
        /[^\p{Script=Latin}\p{Script=Greek}\p{Script=Cyrillic}\p{Script=Common}\p{Script=Inherited}]/gu,
        'x',
      ),
    )
    .map((letters) => (lines ? `${letters}\n${letters}` : letters))
    .filter((letters) => letters.length <= mostLetters);

const date = fc.integer({ min: 0, max: 40_000 }).map((day) => new Date(day * 86_400_000).toISOString().slice(0, 10));

const signature: fc.Arbitrary<Signature> = fc.record({
  name: text(120),
  role: text(120),
  date: fc.oneof(fc.constant(''), date),
  remark: text(1000, true),
});

const nullable = <T>(arbitrary: fc.Arbitrary<T>): fc.Arbitrary<T | null> => fc.option(arbitrary, { nil: null });

const tolerance = (absolute: number): fc.Arbitrary<Tolerance> =>
  fc.oneof(
    fc.record({ kind: fc.constant('relative' as const), value: value(1e-4, 0.5) }),
    fc.record({ kind: fc.constant('absolute' as const), value: value(absolute / 100, absolute) }),
  );

const policy = <Origin extends string>(absolute: number, ...origins: readonly Origin[]) =>
  fc.record({
    origin: fc.constantFrom(...origins),
    tolerance: tolerance(absolute),
    qSlope: fc.constantFrom(0, 0.5, -1),
  });

const share = value(0.01, 0.9);

const build: fc.Arbitrary<Build> = fc.record({
  inductor: policy(1e-9, 'exact', 'E12', 'E24', 'E96', 'wound'),
  capacitor: policy(1e-12, 'exact', 'E6', 'E24', 'E192'),
  stock: fc.constant(null),
  pairs: fc.boolean(),
  selfResonanceHz: nullable(value(2e10, 1e12)),
  eslH: value(1e-11, 1e-8),
  strayF: value(1e-15, 1e-12),
  leadH: value(1e-11, 1e-9),
  distribution: fc.constantFrom(...distributions),
  sourceSpread: share,
  loadSpread: share,
  samples: fc.integer({ min: 1, max: 50 }),
  seed: fc.integer({ min: 0, max: 4294967295 }),
  leastYield: nullable(share),
  vswr: nullable(value(1, 20)),
  derating: share,
  ratedVolts: nullable(value(1, 1e4)),
  ratedAmps: nullable(value(1e-3, 100)),
  ratedWatts: nullable(value(1e-3, 100)),
  winding: fc.record({ wireM: value(1e-4, 5e-3), formM: value(1e-3, 0.1), gapM: value(1e-5, 1e-2) }),
});

/** Those of one frequency: the methods for a band have checks of their own. */
const closedForms = methods.filter((method) => !['equal-ripple', 'fitted', 'all'].includes(method));

/** Any record that the schema admits; a wide range of quantities, a Q of up to `mostQ`. */
export const anyRecord = (mostQ = 1e3): fc.Arbitrary<DesignRecord> =>
  value(1e3, 1e10).chain((frequencyHz) =>
    fc
      .record({
        schema: fc.constant('ferrule-record/2' as const),
        identity: fc.record({
          title: text(120),
          number: text(120),
          revision: text(120),
          date,
          ticket: text(120),
          owner: text(120),
          change: text(4000, true),
        }),
        requirement: fc.record({
          frequencyHz: fc.constant(frequencyHz),
          bandHz: nullable(around(frequencyHz)),
          returnLossDb: nullable(value(0.1, 60)),
          blockDc: fc.boolean(),
          keepDc: fc.constantFrom('none' as const, 'source' as const, 'load' as const, 'both' as const),
          inductorH: span(1e-12, 1e3),
          capacitorF: span(1e-15, 1),
          powerW: nullable(value(1e-6, 1e3)),
        }),
        source: termination(0.1, 1e5, mostQ),
        loads: fc.tuple(fc.record({ name: fc.constant(''), termination: termination(0.1, 1e5, mostQ) })),
        aim,
        method: fc.constantFrom(...closedForms),
        sections: fc.constantFrom(
          'auto' as const,
          1 as const,
          2 as const,
          3 as const,
          4 as const,
          5 as const,
          6 as const,
        ),
        q: fc.constant(null),
        fit: fc.constant({ elements: 2, form: 'any', shuntInductor: true, seed: 1, steps: 3 } as const),
        partQ: fc.record({ inductor: value(10, 300), capacitor: value(30, 3000) }),
        build: nullable(build),
        sweepHz: nullable(around(frequencyHz)),
        selection: fc.record({
          option: fc.constant<string | null>(null),
          reason: text(4000, true),
          set: fc.constant(1 as const),
        }),
        deviations: fc.array(fc.record({ subject: fc.constantFrom(...requirements), reason: text(4000) }), {
          maxLength: 3,
        }),
        history: fc.array(
          fc.record({ revision: text(120), date, change: text(4000, true), digest: fc.constant('0'.repeat(64)) }),
          { maxLength: 3 },
        ),
        previous: fc.constant(null),
        asBuilt: fc.constant(null),
        signOff: fc.record({
          state: fc.constantFrom('draft' as const, 'for review' as const, 'issued' as const),
          prepared: signature,
          checked: signature,
          approved: signature,
        }),
      })
      .map(agreeing),
  );

/** The same with the rules between fields kept. */
function agreeing(record: DesignRecord): DesignRecord {
  const { requirement, method, sections, source, loads } = record;
  const judged = requirement.bandHz !== null && requirement.returnLossDb !== null;
  const real = (termination: Termination): Termination => ({ ...(termination as OneImpedance), x: 0 });
  return {
    ...record,
    build:
      record.build === null || requirement.returnLossDb !== null ? record.build : { ...record.build, leastYield: null },
    ...(method === 'resistive-pair'
      ? { source: real(source), loads: loads.map((state) => ({ ...state, termination: real(state.termination) })) }
      : {}),
    sections: method === 'cascade' && sections === 'auto' && !judged ? 2 : sections,
  };
}
