import { readFileSync, statSync } from 'node:fs';
import { basename, resolve } from 'node:path';
import { parseArgs } from 'node:util';
import { measuredTermination } from '../measured/measured-termination.ts';
import type { MeasuredTermination } from '../network/termination.ts';
import { readStockList } from '../parts/read-stock-list.ts';
import type { StockList } from '../parts/stock.ts';
import { InputError } from '../quantity/problem.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { readDraft } from '../record/draft.ts';
import { asksForParts, fieldNames, tellsOfParts, type FieldName, type Fields } from '../record/fields.ts';
import { nothingKept } from '../record/kept.ts';
import { readRecord } from '../record/read-record.ts';

/** Files are named from where the person stands: npm changes the folder and says where it was. */
export const fromHere = (path: string): string => resolve(process.env['INIT_CWD'] ?? '.', path);

/**
 * The record that a command line describes: a file's name, or the fields as options.
 *
 * @param args  arguments after the command
 * @param extra names of the command's own text options
 * @throws InputError with what was read, why it won't do and what would
 */
export function readArguments<Extra extends string = never>(
  args: readonly string[],
  extra: readonly Extra[] = [],
): { readonly record: DesignRecord; readonly options: Partial<Record<Extra, string>> } {
  const { values, positionals } = parse(args, extra);
  const options: Partial<Record<Extra, string>> = {};
  for (const name of extra) {
    const value = values[name];
    if (value !== undefined) options[name] = value;
  }
  const typed = Object.keys(values).filter((name) => !(extra as readonly string[]).includes(name));
  if (positionals.length > 1) {
    throw problem(positionals.slice(1).join(' '), 'more than one record is named', 'give one file');
  }
  const [file] = positionals;
  if (file === undefined) {
    if (typed.length === 0) {
      throw problem('', 'nothing is asked', 'give --frequency, --source and --load, or a record file');
    }
    return { record: fromFields(values as Typed), options };
  }
  if (typed.length > 0) {
    throw problem(`--${typed[0]!}`, 'a record holds all of its fields', 'give a record or options, not both');
  }
  return { record: readRecord(readTextFile(file)), options };
}

function parse(
  args: readonly string[],
  extra: readonly string[],
): {
  values: Partial<Record<string, string>>;
  positionals: readonly string[];
} {
  const names = [...fieldNames, 'behaviour', 'tolerance', ...extra];
  const known = new Set<string>(names);
  // A value that begins with a minus sign, as in --load -5, is a value: joined so that it isn't taken for an option.
  const joined: string[] = [];
  const given = new Set<string>();
  for (let k = 0; k < args.length; k += 1) {
    const here = args[k]!;
    const name = here.startsWith('--') ? here.slice(2) : '';
    const option = name.split('=')[0]!;
    // Several loads are several states of it.
    if (given.has(option) && option !== 'load')
      throw problem(`--${option}`, 'this option is given twice', 'keep the one that is meant');
    if (known.has(option)) given.add(option);
    if (extra.includes('ticket-text') && name === 'ticket' && (args[k + 1]?.startsWith('--') ?? true)) {
      // Without a value it isn't the number of the title block but the summary for it.
      joined.push('--ticket-text=yes');
    } else if (extra.includes('ticket-markdown') && name === 'ticket-markdown') {
      joined.push('--ticket-markdown=yes');
    } else if (name === 'block-dc' && !['yes', 'no'].includes(args[k + 1] ?? '')) {
      joined.push('--block-dc=yes');
    } else if (known.has(name)) {
      const next = args[k + 1];
      if (next === undefined || next.startsWith('--')) throw problem(here, 'no value follows', 'give one after it');
      joined.push(`${here}=${next}`);
      k += 1;
    } else if (here.startsWith('-') && !known.has(option)) {
      throw problem(
        here,
        'this option is unknown',
        'give --frequency, --source, --load or another that README.md lists',
      );
    } else joined.push(here);
  }
  const parsed = parseArgs({
    args: joined,
    allowPositionals: true,
    options: Object.fromEntries(names.map((name) => [name, { type: 'string' as const, multiple: name === 'load' }])),
  });
  const values = Object.fromEntries(
    Object.entries(parsed.values).map(([name, value]) => [
      name,
      Array.isArray(value) ? value.join('\n') : String(value),
    ]),
  );
  return { values, positionals: parsed.positionals };
}

/** Options that only some methods use: given with another, one would do nothing without a word. */
const methodsUsing: Partial<Record<FieldName, readonly string[]>> = {
  sections: ['cascade', 'equal-ripple', 'all'],
  q: ['pi', 'tee', 'all'],
  elements: ['fitted', 'all'],
};

/** The method of a command line that names none. */
const methodMeant = ({ sections, elements }: Fields): string =>
  sections !== undefined ? 'cascade' : elements !== undefined ? 'fitted' : 'two-element';

function checkMethod(method: string, fields: Fields): void {
  for (const [name, methods] of Object.entries(methodsUsing)) {
    const given = fields[name as FieldName];
    if (given === undefined || methods.includes(method)) continue;
    throw problem(
      given,
      `the method ${method} doesn't use it`,
      `leave it out, or use --method ${methods[0]!}`,
      `--${name}`,
    );
  }
}

/** Fields as options, and those that stand for two of them. */
type Typed = Fields & { readonly behaviour?: string; readonly tolerance?: string };

/** Of real parts nothing can be said where none are asked for. */
function checkParts(fields: Fields, tolerance: string | undefined): void {
  if (asksForParts.some((name) => (fields[name] ?? '').trim() !== '')) return;
  const [name] = tellsOfParts.filter((each) => fields[each] !== undefined && each !== 'seed');
  const told = tolerance === undefined ? name : 'tolerance';
  if (told === undefined) return;
  throw problem(
    tolerance ?? fields[name!]!,
    'it tells of real parts and none are asked for',
    'give --series-inductor, --series-capacitor (as E24) or --stock too',
    `--${told}`,
  );
}

function fromFields({ behaviour, tolerance, ...fields }: Typed): DesignRecord {
  const method = fields.method ?? methodMeant(fields);
  checkMethod(method, fields);
  checkParts(fields, tolerance);
  const lists = new Map<string, StockList>();
  const attachments = new Map<string, MeasuredTermination>();
  const { record, problems } = readDraft(
    {
      date: new Date().toISOString().slice(0, 10),
      method,
      ...(behaviour === undefined ? {} : { 'source-behaviour': behaviour, 'load-behaviour': behaviour }),
      ...(tolerance === undefined ? {} : { 'tolerance-inductor': tolerance, 'tolerance-capacitor': tolerance }),
      ...(fields.seed === undefined ? {} : { 'fit-seed': fields.seed }),
      ...fields,
      ...(fields.stock === undefined ? {} : { stock: attachStock(fields.stock, lists) }),
      ...(fields.source === undefined ? {} : { source: attach('source', fields.source, attachments) }),
      ...(fields.load === undefined
        ? {}
        : {
            load: fields.load
              .split('\n')
              .map((state) => attach('load', state, attachments))
              .join('\n'),
          }),
    },
    attachments,
    { ...nothingKept, stock: lists },
  );
  if (record !== null) return record;
  // A problem is told of the option that was typed, once.
  const typed = (field: string): string =>
    tolerance !== undefined && field.startsWith('tolerance-')
      ? '--tolerance'
      : field === 'fit-seed' && fields['fit-seed'] === undefined
        ? '--seed'
        : `--${field}`;
  const told = problems.map((found) => ({ ...found, field: typed(found.field) }));
  throw new InputError(...told.filter(({ field }, k) => told.findIndex((each) => each.field === field) === k));
}

/** `NAME=FILE.s1p`, `FILE.s2p port 2`, `FILE.csv`: reads the file and leaves the name by which its data are known. */
function attach(end: string, text: string, attachments: Map<string, MeasuredTermination>): string {
  const match = /^([^=]*=)?\s*(.+?\.(?:s\d+p|csv|tsv|txt))(?:\s+port\s+(\d+))?\s*$/iu.exec(text);
  if (match === null) return text;
  const [, state = '', file = '', port = '1'] = match;
  if (port !== '1' && port !== '2')
    throw problem(text, 'a two-port has ports 1 and 2', 'choose one of them', `--${end}`);
  try {
    const termination = measuredTermination(readTextFile(file), basename(file), port === '1' ? 1 : 2);
    attachments.set(termination.measured.name, termination);
    return `${state}${termination.measured.name}`;
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(...error.problems.map((found) => ({ ...found, field: `--${end} ${file}, ${found.field}` })));
  }
}

/** Reads a stock list and leaves the name by which it is known. */
function attachStock(file: string, lists: Map<string, StockList>): string {
  try {
    const list = readStockList(readTextFile(file), basename(file));
    lists.set(list.name, list);
    return list.name;
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(...error.problems.map((found) => ({ ...found, field: `--stock ${file}, ${found.field}` })));
  }
}

/** Longest file read as text, bytes. */
const mostBytes = 512e6;

/** @throws InputError when it can't be read */
export function readTextFile(file: string): string {
  const path = fromHere(file);
  try {
    if (statSync(path).size > mostBytes) throw problem(file, 'over 512 MB', 'give a smaller file', 'file');
    return readFileSync(path, 'utf8');
  } catch (error) {
    if (error instanceof InputError) throw error;
    const code = (error as NodeJS.ErrnoException).code;
    const why =
      code === 'ENOENT'
        ? 'no such file'
        : code === 'EISDIR'
          ? 'this is a folder'
          : `it can't be read (${code ?? 'unknown'})`;
    throw problem(file, why, 'give the path of a file', 'file');
  }
}

const problem = (read: string, why: string, would: string, field = 'command line'): InputError =>
  new InputError({ field, read, why, would });
