/** What can't be used, in the three parts that every message has: what was read, why it won't do, what would. */
export interface Problem {
  /** Dotted path of the field in the record, or the name of the field on the sheet. */
  readonly field: string;
  /** What was read, as typed; '' when nothing was given. */
  readonly read: string;
  readonly why: string;
  readonly would: string;
}

/** Thrown at a boundary (reading a field, a record, an option); carries one problem or several. */
export class InputError extends Error {
  readonly problems: readonly Problem[];
  constructor(...problems: readonly Problem[]) {
    super(problems.map(formatProblem).join(' | '));
    this.name = 'InputError';
    this.problems = problems;
  }
}

/**
 * One line for page, command line and report: `load "abc": not an impedance; write it as 9.4-j61`. Field and reason may
 * quote what was read too.
 */
export function formatProblem({ field, read, why, would }: Problem): string {
  const shown = oneLine(read, 60);
  return `${oneLine(field, 60)}${shown === '' ? '' : ` "${shown}"`}: ${oneLine(why, 120)}; ${would}`;
}

function oneLine(text: string, longest: number): string {
  // A text may be a whole file; what follows its beginning isn't shown.
  const beginning = text.slice(0, 20 * longest);
  // eslint-disable-next-line no-control-regex -- control characters from a file must not reach a terminal
  const line = beginning.replace(/[\s\u0000-\u001f\u007f-\u009f]+/gu, ' ').trim();
  const whole = line.length <= longest && beginning.length === text.length;
  return whole ? line.toWellFormed() : `${line.slice(0, longest).toWellFormed()}…`;
}
