import type { Option } from '../../src/dossier.ts';

/** A requirement that falls short, or that a deviation is written for. */
export interface Deviating {
  readonly subject: string;
  /** Why it falls short; '' where it doesn't, or not any more. */
  readonly why: string;
  /** Why that is accepted, as typed; '' while it isn't. */
  readonly reason: string;
}

const apart = ' = ';

const linesOf = (text: string): readonly { readonly subject: string; readonly reason: string }[] =>
  text
    .split('\n')
    .filter((line) => line.trim() !== '')
    .map((line) => {
      const at = line.indexOf(apart);
      return at < 0
        ? { subject: line.trim(), reason: '' }
        : { subject: line.slice(0, at).trim(), reason: line.slice(at + apart.length) };
    });

/** What falls short of the network chosen, and what else the field of deviations holds. */
export function deviating(text: string, option: Option | undefined): readonly Deviating[] {
  const lines = linesOf(text);
  const short = (option?.checks ?? []).filter(({ verdict }) => verdict === 'falls short');
  const reasonOf = (subject: string): string => lines.find((line) => line.subject === subject)?.reason ?? '';
  return [
    ...short.map(({ subject, reason }) => ({ subject, why: reason, reason: reasonOf(subject) })),
    ...lines
      .filter(({ subject }) => short.every((check) => check.subject !== subject))
      .map(({ subject, reason }) => ({ subject, why: '', reason })),
  ];
}

/** The field with one deviation written anew; without it where no reason is left. A reason takes one line. */
export function withDeviation(text: string, subject: string, reason: string): string {
  const line = reason.trim() === '' ? '' : `${subject}${apart}${reason.replaceAll(/\s*\n\s*/gu, ' ')}`;
  const lines = linesOf(text);
  const written = lines.map((each) => (each.subject === subject ? line : `${each.subject}${apart}${each.reason}`));
  const all = lines.some((each) => each.subject === subject) ? written : [...written, line];
  return all.filter((each) => each !== '').join('\n');
}
