import { html, type TemplateResult } from 'lit';

/** Links to numbered formulas in the basis of calculation. */
export const basisLinks = (numbers: readonly string[]): readonly TemplateResult[] =>
  numbers.map((number) => html`<a href="${import.meta.env.BASE_URL}basis/#${number}">${number}</a> `);
