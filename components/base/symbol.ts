import { html, type TemplateResult } from 'lit';

/** A symbol of the trade as printed: the letter italic, the rest as its index. `symbol('ZS')` is Z with index S. */
export const symbol = (text: string): TemplateResult => html`<i>${text.slice(0, 1)}</i><sub>${text.slice(1)}</sub>`;
