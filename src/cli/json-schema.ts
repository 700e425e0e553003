import { toJsonSchema, type JsonSchema } from '@valibot/to-json-schema';
import type { GenericSchema } from 'valibot';
import { recordSchema } from '../record/schema.ts';

function withoutHead({ $schema: _, ...rest }: JsonSchema): JsonSchema {
  return rest;
}

/** The record's JSON Schema as text. Rules between fields (the band holds the design frequency) are not in it. */
export function jsonSchema(): string {
  const schema = toJsonSchema(recordSchema, {
    errorMode: 'ignore',
    // A termination is chosen by its fields; to a reader of the schema it is one of its forms.
    overrideSchema: ({ valibotSchema }) =>
      'forms' in valibotSchema
        ? {
            anyOf: (valibotSchema.forms as GenericSchema[]).map((form) =>
              withoutHead(toJsonSchema(form, { errorMode: 'ignore' })),
            ),
          }
        : 'self' in valibotSchema
          ? { $ref: '#' }
          : undefined,
  });
  const { $schema, ...rest } = schema;
  const head = {
    $schema,
    title: 'Ferrule design record, version 2',
    description:
      'Inputs and decisions of one matching-network design, never results. SI units: Hz, Ω, H, F, W; return loss in dB.',
  };
  return `${JSON.stringify({ ...head, ...rest }, null, 2)}\n`;
}
