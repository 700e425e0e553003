import { html, nothing, type TemplateResult } from 'lit';

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

/**
 * The same on the page, in a box that scrolls sideways where it must. The first cell of a row names it.
 *
 * @param label names the box
 * @param bars  one a row, 0 to 1: a size that the figures say too
 */
export function dataTable(label: string, { columns, rows }: Rows, bars: readonly number[] = []): TemplateResult {
  return html`<div class="scroll" tabindex="0" role="group" aria-label=${label}>
    <table>
      <thead>
        <tr>
          ${columns.map(({ name, figure: right }) => html`<th scope="col" class=${right ? 'number' : ''}>${name}</th>`)}
          ${bars.length === 0 ? nothing : html`<td class="bar" aria-hidden="true"></td>`}
        </tr>
      </thead>
      <tbody>
        ${rows.map(
          ([first = '', ...cells], row) =>
            html`<tr>
              <th scope="row">${first}</th>
              ${cells.map((text, k) => html`<td class=${columns[k + 1]?.figure === true ? 'number' : ''}>${text}</td>`)}
              ${bars.length === 0 ? nothing : bar(bars[row] ?? 0)}
            </tr>`,
        )}
      </tbody>
    </table>
  </div>`;
}

const bar = (size: number): TemplateResult =>
  html`<td class="bar" aria-hidden="true"><div .style=${`width: ${String(Math.round(size * 1000) / 10)}%`}></div></td>`;
