import { version } from '../version.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { roundingWords, type ComparedFigure } from './compare-figures.ts';
import { figureWords } from './figure-words.ts';
import type { Recheck, RecheckedReport } from './recheck.ts';

/** A line of the outcome: what it is of, and what is said. */
export type Fact = readonly [label: string, words: string];

/** The outcome in a sentence. */
export function verdictWords({ verdict, report }: Recheck): string {
  if (report === null) return 'Computed: a record alone holds no printed figure to compare with.';
  if (verdict === 'same') return 'Same: every figure is what was printed.';
  if (verdict === 'within rounding') return 'Same within rounding: no figure is another than was printed.';
  const { figures, writtenBy } = report;
  const count = figures.filter(({ outcome }) => outcome === 'differs').length;
  return count === 0
    ? `Differs: the figures are the same, but the file is not what Ferrule ${writtenBy} writes for this record; its pages may have been changed.`
    : `Differs: ${count} of ${figures.length} figures ${count === 1 ? 'is' : 'are'} not what was printed.`;
}

/** What a reviewer asks of a report that comes back: which document, by what, whether it is whole, how far it has come. */
export function facts(recheck: Recheck): readonly Fact[] {
  const { dossier, schema, digest, report } = recheck;
  const { record } = dossier;
  const { title, number, revision } = record.identity;
  const document = [number, revision === '' ? '' : `revision ${revision}`, title].filter((text) => text !== '');
  return [
    ['Document', document.join(', ') || 'not identified'],
    ...(report === null ? [] : ([['Written by', `Ferrule ${report.writtenBy}`]] as const)),
    ['Rechecked by', `Ferrule ${version}`],
    ['Digest', report === null ? digest : `true, ${digest}`],
    ['Record', schema === record.schema ? schema : `${schema}, read as ${record.schema}`],
    ...(report === null ? [] : ofReport(report)),
    ['Sign-off', signOffWords(record)],
  ];
}

const ofReport = ({ figures, file, writtenBy, added }: RecheckedReport): readonly Fact[] => [
  ['Figures', countWords(figures)],
  ['File', fileWords(file, writtenBy)],
  [
    'Added since',
    added === null
      ? 'nothing'
      : `${added.bytes} bytes, with ${added.signatures} digital signature${added.signatures === 1 ? '' : 's'}; a PDF reader tells whether they hold`,
  ],
];

function fileWords(file: RecheckedReport['file'], writtenBy: string): string {
  if (file === 'same') return 'whole, byte for byte what this version writes';
  if (file === 'same pages')
    return 'whole, on every page what this version writes; attached tables differ in last digits';
  if (file === 'other pages') return 'not what this version writes';
  return `whole; not compared page for page, as ${writtenBy === version ? 'figures differ' : 'another version wrote it'}`;
}

function countWords(figures: readonly ComparedFigure[]): string {
  const count = (outcome: ComparedFigure['outcome']) => figures.filter((figure) => figure.outcome === outcome).length;
  return `${figures.length} compared: ${count('same')} the same, ${count('within rounding')} within rounding (${roundingWords}), ${count('differs')} different`;
}

function signOffWords({ signOff }: DesignRecord): string {
  const signed = (['prepared', 'checked', 'approved'] as const)
    .filter((what) => signOff[what].name.trim() !== '')
    .map((what) => `${what} by ${[signOff[what].name, signOff[what].date].filter((text) => text !== '').join(', ')}`);
  return [signOff.state, ...(signed.length === 0 ? ['no names'] : signed)].join('; ');
}

/** The outcome as plain text: a verdict, the facts, one line for every figure that isn't the same. */
export function recheckText(recheck: Recheck): string {
  const lines = facts(recheck).map(([label, words]) => `${label}: ${words}`);
  const figures = (recheck.report?.figures ?? [])
    .filter(({ outcome }) => outcome !== 'same')
    .map((figure) => {
      const { then, now } = figureWords(figure);
      return `${figure.outcome === 'differs' ? 'differs' : 'within rounding'}: ${figure.name}: ${then} then, ${now} now`;
    });
  return `${[verdictWords(recheck), ...lines, ...figures].join('\n')}\n`;
}
