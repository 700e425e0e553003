import type { Method } from '../../src/record/design-record.ts';
import { defaults, fieldNames, type Fields } from '../../src/record/fields.ts';

/** Where the sheet that serves any record of a method lives under the base of the site. */
const pathOfMethod: Record<Method, string> = {
  'two-element': '',
  'resistive-pair': 'resistive/',
  pi: '',
  tee: '',
  cascade: 'sections/',
  'equal-ripple': 'sections/',
  fitted: 'sections/',
  all: 'sections/',
};

/** Path under the base of the site; undefined for a text that names no method. */
export const pathOf = (method: string | undefined): string | undefined =>
  method !== undefined && Object.hasOwn(pathOfMethod, method) ? pathOfMethod[method as Method] : undefined;

/** The sheet as the part of an address after #: every text that isn't what the field holds when nothing is typed. */
export function writeAddress(fields: Fields): string {
  const address = new URLSearchParams();
  for (const name of fieldNames) {
    const text = fields[name] ?? defaults[name];
    if (text !== defaults[name]) address.set(name, text);
  }
  // An address that says nothing would mean the demonstration.
  return address.size === 0 ? 'method=two-element' : address.toString();
}

/** @returns null when the address holds no sheet */
export function readAddress(hash: string): Fields | null {
  const address = new URLSearchParams(hash.replace(/^#/u, ''));
  const given = fieldNames.filter((name) => address.has(name));
  if (given.length === 0) return null;
  return { ...defaults, ...Object.fromEntries(given.map((name) => [name, address.get(name) ?? ''])) };
}
