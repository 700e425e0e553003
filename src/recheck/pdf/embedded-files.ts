import { notAsWritten } from '../refusal.ts';
import type { Inflater } from './inflate.ts';
import { contentOf, type Objects } from './objects.ts';
import { isDictionary, isList, isRef, textIn, type IndirectObject, type List, type Value } from './value.ts';

/** A report has a dozen. */
const mostFiles = 100;

/**
 * Reads the files of these names that a report carries (ISO 32000-1, 7.11.4), others stay packed.
 *
 * @throws InputError when one of them lacks, is there twice, or can't be unpacked
 */
export async function embeddedFiles<Wanted extends string>(
  objects: Objects,
  wanted: readonly Wanted[],
  inflater: Inflater,
): Promise<Readonly<Record<Wanted, Uint8Array>>> {
  const { byNumber, trailer } = objects;
  const follow = (value: Value | undefined): Value | undefined =>
    isRef(value) ? byNumber.get(value.ref)?.value : value;
  const entry = (value: Value | undefined, ...path: readonly string[]): Value | undefined =>
    path.reduce<Value | undefined>((at, name) => {
      const here = follow(at);
      return isDictionary(here) ? here.get(name) : undefined;
    }, value);
  const names = follow(entry(trailer, 'Root', 'Names', 'EmbeddedFiles', 'Names'));
  const list: List = isList(names) ? names : [];
  if (list.length > 2 * mostFiles) throw notAsWritten('it carries more files than a report does');
  const found: Partial<Record<string, IndirectObject>> = {};
  for (let k = 0; k + 1 < list.length; k += 2) {
    const name = textIn(list[k]);
    if (!(wanted as readonly string[]).includes(name)) continue;
    const file = entry(list[k + 1], 'EF', 'F');
    const object = isRef(file) ? byNumber.get(file.ref) : undefined;
    if (object === undefined || found[name] !== undefined) throw notAsWritten(`its ${name} can't be told`);
    found[name] = object;
  }
  const out: Partial<Record<Wanted, Uint8Array>> = {};
  for (const name of wanted) {
    const object = found[name];
    if (object === undefined) throw notAsWritten(`it carries no ${name}`);
    out[name] = await contentOf(object, inflater);
  }
  return out as Record<Wanted, Uint8Array>;
}
