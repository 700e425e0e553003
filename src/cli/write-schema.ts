import { writeFileSync } from 'node:fs';
import { jsonSchema } from './json-schema.ts';

/** Writes the published JSON Schema of the record from the schema that reads records. */
writeFileSync(new URL('../../public/schema/ferrule-record-2.json', import.meta.url), jsonSchema());
