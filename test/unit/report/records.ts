import { readFileSync } from 'node:fs';
import { design } from '../../../src/design.ts';
import type { Dossier } from '../../../src/dossier.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import { readRecord } from '../../../src/record/read-record.ts';
import { recordOf } from '../record-of.ts';

const file = (path: string): Buffer => readFileSync(new URL(`../../../public/${path}`, import.meta.url));

export const fonts = {
  regular: new Uint8Array(file('fonts/ferrule-regular.ttf')),
  bold: new Uint8Array(file('fonts/ferrule-bold.ttf')),
};

export type Demo = 'tide-gauge' | 'crystal-filter' | 'power-stage';

export const demo = (name: Demo): DesignRecord => readRecord(file(`demo/${name}.json`).toString());

/** Dossier of a demo with some of its record put otherwise. */
export const dossierOf = (
  name: Demo,
  change: (record: DesignRecord) => Partial<DesignRecord> = () => ({}),
): Dossier => {
  const record = demo(name);
  return design({ ...record, ...change(record) });
};

/** Γ in 50 Ω of R with C in series from 100 MHz to 200 MHz, as a file of 101 samples. */
function sampled(name: string, ohm: number, farad: number) {
  const lines = Array.from({ length: 101 }, (_, k) => {
    const megahertz = 100 + k;
    const x = -1 / (2e6 * Math.PI * megahertz * farad);
    const size = (ohm + 50) ** 2 + x ** 2;
    return [megahertz, (ohm ** 2 - 2500 + x ** 2) / size, (100 * x) / size].join(' ');
  });
  return measuredTermination(`# MHz S RI R 50\n${lines.join('\n')}\n`, name);
}

/** Two measured states of a load, and networks of three elements fitted to both. */
export const measuredStates: DesignRecord = {
  ...recordOf({
    method: 'fitted',
    frequency: '151.25M',
    source: '50',
    load: '1',
    band: '148M..154M',
    'return-loss': '10',
    elements: '3',
  }),
  loads: [
    { name: 'free space', termination: sampled('free.s1p', 9.4, 17.25e-12) },
    { name: 'in hand', termination: sampled('hand.s1p', 12, 19e-12) },
  ],
};
