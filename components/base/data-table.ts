import { html, nothing, type TemplateResult } from 'lit';
import type { Rows } from './rows.ts';

/**
 * A table on the page, in a box that scrolls sideways where it must. The first cell of a row names it.
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
