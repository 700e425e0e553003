import { readFileSync } from 'node:fs';
import { design } from '../../../src/design.ts';
import type { Dossier } from '../../../src/dossier.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { readRecord } from '../../../src/record/read-record.ts';

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
