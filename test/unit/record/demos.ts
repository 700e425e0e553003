import { readFileSync } from 'node:fs';

/** The text of a record under public/demo/. */
export const demoText = (name: string): string =>
  readFileSync(new URL(`../../../public/demo/${name}.json`, import.meta.url), 'utf8');

export const demoNames = ['tide-gauge', 'crystal-filter', 'power-stage'] as const;
