import { printedFigures } from '../design/printed-figures.ts';
import type { Dossier } from '../dossier.ts';
import { report, type ReportOptions } from '../report/report.ts';
import { compareFigures, type ComparedFigure } from './compare-figures.ts';
import type { Found } from './found.ts';
import type { Additions } from './pdf/additions.ts';
import { Inflater } from './pdf/inflate.ts';
import { objectsOf } from './pdf/objects.ts';
import { sameBytes, sameDrawing } from './pdf/same-drawing.ts';

/** What a report or a record came to when it was computed anew. */
export interface Recheck {
  /** `recomputed`: a record alone, which holds no figure to compare with. */
  readonly verdict: 'same' | 'within rounding' | 'differs' | 'recomputed';
  /** Today's dossier of the record. */
  readonly dossier: Dossier;
  /** Of the schema in which the record was written. */
  readonly schema: string;
  /** Of the record, as written; where a report states it, that is true. */
  readonly digest: string;
  /** null: a record alone. */
  readonly report: RecheckedReport | null;
}

export interface RecheckedReport {
  /** Version of Ferrule that wrote it. */
  readonly writtenBy: string;
  readonly figures: readonly ComparedFigure[];
  /**
   * The file beside the one that this version writes: every byte the same; the same on every page, with other last digits
   * in attached tables; or other pages. null: not to be expected, because another version wrote it or figures differ.
   */
  readonly file: 'same' | 'same pages' | 'other pages' | null;
  readonly added: Additions | null;
}

/**
 * Compares what a file says with what its record gives today.
 *
 * @param dossier of the file's record
 * @param fonts   in which reports are set
 */
export async function recheck(found: Found, dossier: Dossier, fonts: ReportOptions['fonts']): Promise<Recheck> {
  const { schema, digest } = found;
  if (found.report === null) return { verdict: 'recomputed', dossier, schema, digest, report: null };
  const { printed, paper, written, added } = found.report;
  const figures = compareFigures(printed.figures, printedFigures(dossier));
  const all = (outcome: ComparedFigure['outcome']): boolean => figures.every((figure) => figure.outcome === outcome);
  const agrees = figures.every(({ outcome }) => outcome !== 'differs');
  const comparable = printed.version === dossier.version && agrees;
  const file = comparable ? await compareFiles(written, await report(dossier, { paper, fonts })) : null;
  const differs = !agrees || file === 'other pages';
  return {
    verdict: differs ? 'differs' : all('same') ? 'same' : 'within rounding',
    dossier,
    schema,
    digest,
    report: { writtenBy: printed.version, figures, file, added },
  };
}

async function compareFiles(written: Uint8Array, now: Uint8Array): Promise<'same' | 'same pages' | 'other pages'> {
  if (sameBytes(written, now)) return 'same';
  const inflater = new Inflater();
  const [then, today] = [await objectsOf(written, inflater), await objectsOf(now, inflater)];
  return sameDrawing(then, today) ? 'same pages' : 'other pages';
}
