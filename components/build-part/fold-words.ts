import { defaults, type FieldName } from '../../src/record/fields.ts';
import type { FieldState } from '../base/field-state.ts';

/** What a field is about, in front of its value. */
const short: Partial<Record<FieldName, string>> = {
  'q-slope-inductor': 'slope of QL',
  'q-slope-capacitor': 'slope of QC',
  'self-resonance': 'self-resonance',
  esl: 'ESL',
  stray: 'stray',
  lead: 'leads',
  distribution: '',
  'source-spread': 'source ±',
  'load-spread': 'load ±',
  samples: 'networks drawn:',
  seed: 'seed',
  'least-yield': 'yield at least',
  mismatch: 'VSWR up to',
  derating: 'ratings used to',
  'rated-voltage': '',
  'rated-current': '',
  'rated-heat': '',
  wire: 'wire',
  former: 'form',
  gap: 'gap',
};

/** Fields that say something even when they hold what they hold by default. */
const always: readonly FieldName[] = ['distribution', 'samples', 'seed', 'derating', 'wire', 'former', 'gap'];

/** What fields folded away hold, in a line: those that were changed, and those that always matter. */
export function foldWords(names: readonly FieldName[], { fields, understood }: FieldState): string {
  const said = names.flatMap((name) => {
    const text = fields[name] ?? defaults[name];
    const read = understood[name] ?? text;
    // Nothing of a thing is nothing to tell, however it was written.
    const nothing = text.trim() === '' || text === defaults[name] || /^0(?:\.0)? /u.test(read);
    return nothing && !always.includes(name) ? [] : [`${short[name] ?? ''} ${read}`.trim().replace('± ', '±')];
  });
  return said.length === 0 ? 'none assumed' : said.join('; ');
}
