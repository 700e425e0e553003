import type { Dossier } from '../../src/dossier.ts';
import type { FieldName, Fields } from '../../src/record/fields.ts';
import type { FieldChange } from '../base/field-change.ts';

/** Fields that a search depends on. */
const searched: readonly FieldName[] = [
  'method',
  'frequency',
  'source',
  'source-behaviour',
  'load',
  'load-behaviour',
  'aim',
  'band',
  'block-dc',
  'keep-dc',
  'inductors',
  'capacitors',
  'q',
  'elements',
  'fit-form',
  'shunt-inductor',
  'fit-seed',
];

/** What else changes with a field. */
export function alongWith({ name, value }: FieldChange, dossier: Dossier | null): Fields {
  // Another search is meant: it goes to its end.
  if (searched.includes(name)) return { steps: '' };
  // A set of values is one of a network's, which is chosen with it.
  const chosen = dossier?.chosen ?? null;
  if (name === 'set' && chosen !== null) return { choice: chosen };
  if (name === 'choice' && value !== chosen) return { set: '1' };
  return {};
}
