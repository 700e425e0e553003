import { html, type TemplateResult } from 'lit';
import { unsafeHTML } from 'lit/directives/unsafe-html.js';
import type { Figure } from '../../src/figures/figure.ts';
import { toSvg } from '../../src/figures/to-svg.ts';

/** A figure as it stands in the page: the one place where text becomes elements, and only our own writer's text. */
export const drawing = (figure: Figure): TemplateResult => html`${unsafeHTML(toSvg(figure))}`;
