import { toJsonSchema } from '@valibot/to-json-schema';
import { recordSchema } from '../record/schema.ts';

/** The record's JSON Schema as text. Rules between fields (the band holds the design frequency) are not in it. */
export function jsonSchema(): string {
  const schema = toJsonSchema(recordSchema, { errorMode: 'ignore' });
  const { $schema, ...rest } = schema;
  const head = {
    $schema,
    title: 'Ferrule design record, version 1',
    description:
      'Inputs and decisions of one matching-network design, never results. SI units: Hz, Ω, H, F, W; return loss in dB.',
  };
  return `${JSON.stringify({ ...head, ...rest }, null, 2)}\n`;
}
