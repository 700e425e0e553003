import { chosenTwoPort, sweepCsv } from '../design/exports.ts';
import { printedFigures, type PrintedFigure } from '../design/printed-figures.ts';
import type { Dossier } from '../dossier.ts';
import { onePortFile } from '../measured/one-port-file.ts';
import { isMeasured } from '../network/termination.ts';
import { stockCsv } from '../parts/stock-csv.ts';
import { canonical, sha256Of } from '../record/canonical.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** A file that travels in the report. */
export interface Attachment {
  /** Safe on every system: letters and digits of ASCII, dots, hyphens and underscores. */
  readonly name: string;
  /** What it is, for whoever finds it in the report. */
  readonly description: string;
  readonly mediaType: string;
  /** Its relation to the report (ISO 32000-2, 14.13): what it was made from, data shown in it, or more of the same. */
  readonly relation: 'Source' | 'Data' | 'Supplement';
  readonly text: string;
}

/** Everything that reproduces the design, the record first. */
export function attachments(dossier: Dossier): readonly Attachment[] {
  const { record } = dossier;
  const sweep = sweepCsv(dossier);
  const twoPort = chosenTwoPort(dossier);
  const stock = stockUsed(dossier);
  return [
    recordFile(record),
    figuresFile(dossier, printedFigures(dossier)),
    ...(sweep === null ? [] : [file('sweep.csv', 'Sweep of the chosen network', 'text/csv', 'Data', sweep)]),
    ...(twoPort === null
      ? []
      : [file('network.s2p', 'Chosen network as a Touchstone two-port file', 'text/plain', 'Supplement', twoPort)]),
    ...(stock === null ? [] : [file('stock.csv', 'Lines used of the stock list', 'text/csv', 'Source', stock)]),
    ...measuredFiles(record),
  ];
}

const file = (
  name: string,
  description: string,
  mediaType: string,
  relation: Attachment['relation'],
  text: string,
): Attachment => ({ name, description, mediaType, relation, text });

export const recordFile = (record: DesignRecord): Attachment =>
  file('record.json', 'Design record in its RFC 8785 form', 'application/json', 'Source', canonical(record));

/**
 * What was printed, for a later version to be compared with; one figure a line. The record's digest leaves its sign-off
 * out, that of the file `record.json` nothing.
 */
export function figuresFile(
  { version, digest, record }: Pick<Dossier, 'version' | 'digest' | 'record'>,
  figures: readonly PrintedFigure[],
): Attachment {
  const head = [
    '"schema":"ferrule-figures/1"',
    `"version":${JSON.stringify(version)}`,
    `"digest":"${digest}"`,
    `"recordFile":"${sha256Of(record)}"`,
  ];
  const lines = figures.map((figure) => JSON.stringify(figure)).join(',\n');
  const text = `{${head.join(',')},"figures":[\n${lines}\n]}\n`;
  return file('figures.json', 'Figures printed in this report', 'application/json', 'Data', text);
}

function stockUsed({ record, options, chosen }: Dossier): string | null {
  const built = options.find(({ id }) => id === chosen)?.built;
  const used = record.build?.stock?.parts.filter(({ name, kind }) =>
    built?.parts.some(({ from, part }) => from === name && part === kind),
  );
  return used === undefined || used.length === 0 ? null : stockCsv(used);
}

function measuredFiles({ source, loads, asBuilt }: DesignRecord): readonly Attachment[] {
  const ends = [
    { of: 'the source', termination: source },
    ...loads.map(({ name, termination }) => ({ of: name === '' ? 'the load' : `the load, ${name}`, termination })),
  ];
  const measured = [
    ...ends.flatMap(({ of, termination }) => (isMeasured(termination) ? [{ of, data: termination.measured }] : [])),
    ...(asBuilt === null ? [] : [{ of: 'the finished board', data: asBuilt.measured }]),
  ];
  const names = new Set<string>();
  return measured.map(({ of, data }) => {
    const name = unlike(names, safe(data.name));
    return file(`${name}.s1p`, `Measured data of ${of}: ${data.name}`, 'text/plain', 'Source', onePortFile(data));
  });
}

/** A name of at most 60 characters that no system stumbles over. */
function safe(name: string): string {
  const stem = name.replace(/\.(?:s\dp|csv|txt)$/iu, '');
  return (
    stem
      .replace(/[^\w]+/gu, '-')
      .slice(0, 60)
      .replace(/^-+|-+$/gu, '') || 'measured'
  );
}

/** The name, numbered where another file has it already. */
function unlike(names: Set<string>, name: string): string {
  let free = name;
  for (let k = 2; names.has(free.toLowerCase()); k += 1) free = `${name}-${String(k)}`;
  names.add(free.toLowerCase());
  return free;
}
