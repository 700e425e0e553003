/**
 * The file in which everything kept is taken elsewhere: issued records as they are, drafts as they were typed.
 *
 *   { "schema": "ferrule-records/1", "records": [record, …], "drafts": [{ "sheet", "fields", "stock", "history",
 *     "previous", "asBuilt", "measured" }, …] }
 */
import { formatProblem, InputError, type Problem } from '../../src/quantity/problem.ts';
import { sha256Of } from '../../src/record/canonical.ts';
import { checkRecord } from '../../src/record/check-record.ts';
import type { DesignRecord, Method } from '../../src/record/design-record.ts';
import { readDraft } from '../../src/record/draft.ts';
import { defaults, fieldNames, type Fields } from '../../src/record/fields.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { repeatedName } from '../../src/record/repeated-name.ts';
import { sheets, type Carried } from './entry.ts';

const schema = 'ferrule-records/1';

/** More letters than this are in no field of a sheet. */
const longestText = 100_000;

export interface TypedDraft extends Carried {
  readonly sheet: Method;
  readonly fields: Fields;
}

export interface Collection {
  readonly records: readonly DesignRecord[];
  readonly drafts: readonly TypedDraft[];
}

export const collectionText = ({ records, drafts }: Collection): string =>
  `${JSON.stringify({ schema, records, drafts: drafts.map(plainDraft) }, null, 1)}\n`;

function plainDraft({ sheet, fields, kept, attachments }: TypedDraft) {
  const { history, previous, asBuilt, stock } = kept;
  return {
    sheet,
    fields: Object.fromEntries(
      fieldNames.map((name) => [name, fields[name] ?? defaults[name]] as const).filter(differs),
    ) as Fields,
    stock: [...stock.values()],
    history,
    previous,
    asBuilt,
    measured: [...attachments.values()],
  };
}

const differs = ([name, text]: readonly [keyof Fields, string]): boolean => text !== defaults[name];

/** SHA-256 of a draft: two of the same seal were typed letter for letter alike. */
export const sealOf = (draft: TypedDraft): string => sha256Of(plainDraft(draft));

/** What a file holds, and in one line each what of it can't be used. */
export interface Read extends Collection {
  readonly refused: readonly string[];
}

/**
 * Reads a file of kept records, or of one record. Records of an earlier schema are migrated.
 *
 * @throws InputError where the file as a whole is neither
 */
export function readCollection(text: string): Read {
  const value = parsed(text);
  if (!isObject(value) || value.schema !== schema) {
    if (isObject(value) && typeof value.schema === 'string' && value.schema.startsWith('ferrule-record/')) {
      return { records: [readRecord(text)], drafts: [], refused: [] };
    }
    throw new InputError(noCollection(isObject(value) && typeof value.schema === 'string' ? value.schema : ''));
  }
  const { records = [], drafts = [] } = value;
  if (!Array.isArray(records) || !Array.isArray(drafts)) throw new InputError(noCollection('no list of records'));
  const twice = repeatedName(text);
  if (twice !== null) {
    throw new InputError({
      field: twice,
      read: '',
      why: 'this field is given twice',
      would: 'keep the one that is meant',
    });
  }
  const refused: string[] = [];
  const each = <T>(list: readonly unknown[], what: string, read: (value: unknown) => T): readonly T[] =>
    list.flatMap((one, k) => {
      try {
        return [read(one)];
      } catch (error) {
        // Lists within lists are followed as deep as the machine can go.
        const problems = error instanceof RangeError ? [tooDeep] : error instanceof InputError ? error.problems : null;
        if (problems === null) throw error;
        refused.push(`${what} ${k + 1}${nameOf(one)}: ${inOneLine(problems)}`);
        return [];
      }
    });
  return {
    records: each(records, 'record', (one) => readRecord(JSON.stringify(one))),
    drafts: each(drafts, 'draft', readTyped),
    refused,
  };
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text.replace(/^\uFEFF/u, ''));
  } catch {
    throw new InputError({ ...noCollection(text), why: 'not JSON' });
  }
}

const noCollection = (read: string): Problem => ({
  field: 'file',
  read,
  why: 'neither kept records nor a record',
  would: `give a file of schema ${schema} or a design record`,
});

const tooDeep: Problem = { field: 'record', read: '', why: 'nested too deep', would: 'give a design record' };

/** What can't be used, in one line. */
export function inOneLine([first, ...others]: readonly Problem[]): string {
  const more = others.length === 0 ? '' : ` (and ${others.length} more)`;
  return `${first === undefined ? '' : formatProblem(first)}${more}`;
}

/** Number and revision, where they can be told of what isn't a record. */
function nameOf(value: unknown): string {
  if (!isObject(value)) return '';
  const { number, revision } = isObject(value.identity) ? value.identity : isObject(value.fields) ? value.fields : {};
  const words = [number, revision].filter((each) => typeof each === 'string').map((each) => each.slice(0, 40));
  return words.length === 0 ? '' : ` (${words.join(', revision ')})`;
}

function readTyped(value: unknown): TypedDraft {
  if (!isObject(value)) throw refusal('draft', '', 'not an object', 'give the draft as it was saved');
  const { sheet, fields, stock = [], history, previous, asBuilt, measured = [] } = value;
  const known = sheets.find((each) => each === sheet);
  if (known === undefined) throw refusal('sheet', words(sheet), 'no sheet is called so', `give ${sheets.join(', ')}`);
  if (!isObject(fields)) throw refusal('fields', '', 'not an object', 'give the draft as it was saved');
  if (!Array.isArray(stock)) throw refusal('stock', words(stock), 'not a list', 'give the draft as it was saved');
  if (!Array.isArray(measured))
    throw refusal('measured', words(measured), 'not a list', 'give the draft as it was saved');
  for (const [name, text] of Object.entries(fields)) {
    if (!fieldNames.some((known) => known === name)) {
      throw refusal(name, words(text), 'this field is unknown', 'leave it out or check its spelling');
    }
    if (typeof text !== 'string' || text.length > longestText) {
      throw refusal(name, words(text), 'not a text that a field can hold', 'give the draft as it was saved');
    }
  }
  const state = isObject(asBuilt) && typeof asBuilt.state === 'string' ? asBuilt.state : '';
  const own = checkRecord({
    ...frame,
    history: history ?? [],
    previous: previous ?? null,
    asBuilt: asBuilt ?? null,
    loads: [{ name: state, termination: frame.source }],
  });
  const lists = stock.map(
    (list: unknown) => checkRecord({ ...frame, build: { ...frame.build, stock: list } }).build!.stock!,
  );
  const data = measured.map((each: unknown) => checkRecord({ ...frame, source: each }).source);
  return {
    sheet: known,
    fields: fields as Fields,
    kept: {
      stock: new Map(lists.map((list) => [list.name, list])),
      history: own.history,
      previous: own.previous,
      asBuilt: own.asBuilt,
    },
    attachments: new Map(data.filter((each) => 'measured' in each).map((each) => [each.measured.name, each])),
  };
}

/** A record in which what a draft carries is checked, piece by piece: its own texts may not read as one. */
const frame = readDraft({
  frequency: '1 MHz',
  source: '50',
  load: '50',
  date: '2000-01-01',
  'series-inductor': 'E24',
  'series-capacitor': 'E24',
}).record!;

const refusal = (field: string, read: string, why: string, would: string): InputError =>
  new InputError({ field, read, why, would });

const words = (value: unknown): string => (typeof value === 'string' ? value : '');

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
