import * as v from 'valibot';
import type { PrintedFigure } from '../design/printed-figures.ts';
import { notAsWritten, refusal } from './refusal.ts';

/** What a report says of its figures: `figures.json` as src/report writes it. */
export interface PrintedFigures {
  /** Version of Ferrule that wrote it. */
  readonly version: string;
  /** Of the record, its sign-off left out. */
  readonly digest: string;
  /** SHA-256 of the file record.json. */
  readonly recordFile: string;
  readonly figures: readonly PrintedFigure[];
}

/** Of a text that goes to a terminal. */
const printable = v.pipe(v.string(), v.maxLength(500), v.regex(/^[^\p{Cc}\p{Cs}\p{Zl}\p{Zp}]*$/u));
const digest = v.pipe(v.string(), v.regex(/^[0-9a-f]{64}$/u));

const schema = v.strictObject({
  schema: v.literal('ferrule-figures/1'),
  version: v.pipe(v.string(), v.regex(/^\d{1,5}\.\d{1,5}\.\d{1,5}$/u)),
  digest,
  recordFile: digest,
  figures: v.pipe(
    v.array(
      v.strictObject({
        name: printable,
        value: v.union([v.pipe(v.number(), v.finite()), printable, v.boolean(), v.null()]),
        unit: printable,
      }),
    ),
    v.maxLength(50_000),
  ),
});

/** @throws InputError when it isn't such a file, or one of a later Ferrule */
export function readFigures(text: string): PrintedFigures {
  let value: unknown;
  // Lists within lists fill the memory before they can be judged.
  if (/\[\s*\[|[:{]\s*\{/u.test(text) || text.split(/:\s*\[/u, 3).length > 2) throw notFigures();
  try {
    value = JSON.parse(text);
  } catch {
    throw notAsWritten('its figures.json is not JSON');
  }
  const result = v.safeParse(schema, value, { abortEarly: true });
  if (result.success) return result.output;
  if (/"schema":\s*"ferrule-figures\/(?!1")/u.test(text.slice(0, 200))) {
    throw refusal('a later Ferrule wrote it', 'recheck it with that one');
  }
  throw notFigures();
}

const notFigures = () => notAsWritten("its figures.json doesn't hold what a report prints");
