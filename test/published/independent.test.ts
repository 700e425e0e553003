import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import type { Option } from '../../src/dossier.ts';
import type { Arm } from '../../src/network/arm.ts';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import { endsOver, sweep } from '../../src/network/sweep.ts';
import { recordOf } from '../unit/record-of.ts';
import { independent } from './independent.ts';

const typed = ({ r, x }: { readonly r: number; readonly x: number }): string =>
  `${String(r)}${x < 0 ? '-' : '+'}j${String(Math.abs(x))}`;
const shape = (arms: readonly Arm[]): string => arms.map(({ arm, part }) => `${arm} ${part}`).join(', ');
const relative = (found: number, wanted: number): number => Math.abs(found / wanted - 1);

describe.each(independent)(
  'computed apart from this project with NumPy/SciPy nodal analysis: $source.r + j $source.x Ω to $load.r + j $load.x Ω, $aim',
  ({ source, load, frequencyHz, aim, networks }) => {
    const record = recordOf({
      frequency: String(frequencyHz),
      source: typed(source),
      load: typed(load),
      'source-behaviour': 'constant',
      'load-behaviour': 'constant',
      aim,
    });
    const { options } = design(record);
    const zl = new Complex(load.r, load.x);
    const pairs = networks.map((network): readonly [string, Option | undefined, typeof network] => [
      shape(network.arms),
      options.find(({ arms }) => shape(arms) === shape(network.arms)),
      network,
    ]);

    it('finds these networks and no other', () => {
      expect(options.map(({ arms }) => shape(arms)).sort()).toEqual(networks.map(({ arms }) => shape(arms)).sort());
    });

    it.each(pairs)('%s: element values to 1 part in 10⁹', (_, option, network) => {
      option!.arms.forEach(({ value }, k) => expect(relative(value, network.arms[k]!.value)).toBeLessThan(1e-9));
    });

    it.each(pairs)('%s: impedance seen and transducer gain to 1 part in 10⁹', (_, option, network) => {
      const { seen, transducerGain } = option!;
      const zin = new Complex(network.zin.r, network.zin.x);
      expect(new Complex(seen.r, seen.x).sub(zin).abs() / zin.abs()).toBeLessThan(1e-9);
      expect(ladderInput(network.arms, zl, frequencyHz).sub(zin).abs() / zin.abs()).toBeLessThan(1e-9);
      expect(relative(transducerGain, network.transducerGain)).toBeLessThan(1e-9);
    });

    it.each(pairs)('%s: transducer gain with Q = 80 in every part to 1 part in 10⁹', (_, option, network) => {
      const lossy = option!.arms.map((arm): Arm => ({ ...arm, q: 80 }));
      const ends = endsOver(record.source, record.loads[0]!.termination, frequencyHz, Float64Array.of(frequencyHz));
      const { gain } = sweep(prepareLadder(lossy), ends, aim);
      expect(relative(gain[0]!, network.transducerGainAllPartsQ80)).toBeLessThan(1e-9);
    });

    // The other side's root finder stops within about 4 parts in 10⁸, so 1 part in 10⁷.
    const withEdges = pairs.filter(([, , { halfPowerHz }]) => halfPowerHz !== undefined);
    it.each(withEdges)(
      '%s: half-power edges of terminations that do not vary, to 1 part in 10⁷',
      (_, option, network) => {
        const { lowHz, highHz } = option!.halfPower;
        [lowHz, highHz].forEach((edge, k) => {
          const wanted = network.halfPowerHz?.[k] ?? null;
          if (wanted === null) expect(edge).toBeNull();
          else expect(relative(edge!, wanted)).toBeLessThan(1e-7);
        });
      },
    );
  },
);
