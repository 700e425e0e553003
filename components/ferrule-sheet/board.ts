import { measuredTermination } from '../../src/measured/measured-termination.ts';
import type { MeasuredData } from '../../src/measured/measured.ts';
import { InputError, formatProblem } from '../../src/quantity/problem.ts';
import { count } from '../base/words.ts';

/** More than this isn't read, bytes. */
const most = 200_000_000;

/** What was measured on the finished board, and what is said of it; null: why the file can't be used. */
export async function readBoard(
  file: File,
): Promise<{ readonly measured: MeasuredData | null; readonly words: string }> {
  const refuse = (why: string) => ({ measured: null, words: `${file.name} can’t be read${why}` });
  if (file.size > most) return refuse(': it is larger than 200 MB; keep the band that matters');
  const ports = /\.s(\d+)p$/iu.exec(file.name)?.[1] ?? '1';
  if (ports !== '1') {
    return refuse(': it has several ports; measure the one at the source with the load attached, and give a .s1p');
  }
  try {
    const { measured } = measuredTermination(await file.text(), file.name, 1);
    return { measured, words: `${measured.name}: ${count(measured.samples, 'sample')}.` };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return refuse(`. ${formatProblem(error.problems[0]!)}`);
  }
}
