import type { MeasuredTermination } from '../../src/network/termination.ts';
import type { Attachments } from '../../src/record/read-termination.ts';

const key = 'ferrule-measured-data';

/** Measured data that this tab was given before a reload or on another sheet. */
export function recall(): Attachments {
  try {
    return new Map(JSON.parse(sessionStorage.getItem(key) ?? '[]') as [string, MeasuredTermination][]);
  } catch {
    return new Map();
  }
}

/** Keeps them for as long as the tab is open; where there is no room, they last as long as the page. */
export function remember(attachments: Attachments): void {
  try {
    sessionStorage.setItem(key, JSON.stringify([...attachments]));
  } catch {
    sessionStorage.removeItem(key);
  }
}

/** Files that hold measured data, by their ending; any other may be a record. */
export const holdsData = (fileName: string): boolean => /\.(s\d+p|csv|txt)$/iu.test(fileName);

/** The field of the load with one state more, named after its data; as it is where they stand in it already. */
export function withState(load: string, dataName: string): string {
  const lines = load.split('\n').filter((line) => line.trim() !== '');
  if (lines.some((line) => line.slice(line.indexOf('=') + 1).trim() === dataName)) return load;
  const state = lines.length === 0 ? dataName : `${dataName.replaceAll('=', '-')} = ${dataName}`;
  return [...lines, state].join('\n');
}

/** A name for a pasted table that no other has. */
export function tableName(attachments: Attachments): string {
  let count = 1;
  while (attachments.has(count === 1 ? 'table' : `table ${String(count)}`)) count += 1;
  return count === 1 ? 'table' : `table ${String(count)}`;
}
