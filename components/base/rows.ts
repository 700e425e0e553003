/** A table as plain texts, so that what is shown and what is copied are the same. */
export interface Rows {
  /** Names of the columns; those of figures stand to the right. */
  readonly columns: readonly { readonly name: string; readonly figure: boolean }[];
  readonly rows: readonly (readonly string[])[];
}

export const column = (name: string): Rows['columns'][number] => ({ name, figure: false });
export const figure = (name: string): Rows['columns'][number] => ({ name, figure: true });

/** For a spreadsheet: one row a line under the names of its columns, apart by tabs. */
export const rowsText = ({ columns, rows }: Rows): string =>
  [columns.map(({ name }) => name), ...rows].map((cells) => cells.join('\t')).join('\n');
