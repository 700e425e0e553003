import { formatTolerance, type Tolerance } from '../parts/tolerance.ts';
import type { Change } from './change.ts';
import type { Build, PartPolicy } from './design-record.ts';
import { changeOf, choice, minus, percent, plainNumber, quantity, yesNo, type Statement } from './statement.ts';
import { stockChanges } from './stock-changes.ts';

const notStated = 'not stated';

/** Between what real parts are taken from; null: exact, ideal ones. */
export function buildChanges(before: Build | null, after: Build | null): readonly Change[] {
  const kind = (build: Build | null): Statement =>
    choice('Parts', build !== null, build === null ? 'exact values, ideal parts' : 'real parts');
  const [old, now] = [statements(before), statements(after)];
  const pairs = [
    [kind(before), kind(after)] as const,
    ...(now ?? old ?? []).map(({ what }, k) => [old?.[k] ?? absent(what), now?.[k] ?? absent(what)] as const),
  ];
  return [
    ...pairs.map(([a, b]) => changeOf('parts', a, b)).filter((change) => change !== null),
    ...stockChanges(before?.stock ?? null, after?.stock ?? null),
  ];
}

const absent = (what: string): Statement => ({ what, value: null, words: 'not given', exact: () => 'not given' });

/** The same number of them, in the same order, of every build. The least yield is told with the requirement. */
function statements(build: Build | null): readonly Statement[] | null {
  if (build === null) return null;
  const { winding } = build;
  return [
    ...policy('inductor', build.inductor),
    ...policy('capacitor', build.capacitor),
    yesNo('Two parts for one', build.pairs),
    quantity('Self-resonance of inductors', build.selfResonanceHz, 'Hz', 'above all frequencies of interest'),
    quantity('Series inductance of capacitors', build.eslH, 'H'),
    quantity('Stray capacitance of every node', build.strayF, 'F'),
    quantity('Lead inductance of every shunt arm', build.leadH, 'H'),
    choice('Distribution within the tolerance', build.distribution),
    percent('Spread of the source', build.sourceSpread),
    percent('Spread of the load', build.loadSpread),
    plainNumber('Networks drawn for the yield', build.samples),
    plainNumber('Seed of the yield', build.seed),
    plainNumber('Load mismatch for the stress, VSWR', build.vswr, 'load states alone'),
    percent('Part of a rating that may be used', build.derating),
    quantity('Rated voltage where the stock line has none', build.ratedVolts, 'V', notStated),
    quantity('Rated current where the stock line has none', build.ratedAmps, 'A', notStated),
    quantity('Rated heat', build.ratedWatts, 'W', notStated),
    quantity('Wire of a coil', winding.wireM, 'm'),
    quantity('Form of a coil', winding.formM, 'm'),
    quantity('Gap between turns', winding.gapM, 'm'),
  ];
}

function policy(part: 'inductor' | 'capacitor', { origin, tolerance, qSlope }: PartPolicy) {
  const Part = part === 'inductor' ? 'Inductors' : 'Capacitors';
  return [
    choice(`${Part} from`, origin),
    toleranceOf(`Tolerance of ${part}s`, tolerance, part),
    plainNumber(`Slope of the ${part}s’ Q over frequency`, qSlope),
  ];
}

const toleranceOf = (what: string, tolerance: Tolerance, part: 'inductor' | 'capacitor'): Statement => ({
  what,
  value: tolerance,
  words: formatTolerance(tolerance, part),
  exact: () =>
    `±${minus(String(tolerance.value))} ${tolerance.kind === 'relative' ? 'of the value' : part === 'inductor' ? 'H' : 'F'}`,
});
