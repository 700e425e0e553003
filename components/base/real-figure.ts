import { html, type TemplateResult } from 'lit';
import type { Built, Option } from '../../src/dossier.ts';
import { verdictMark } from '../verdict-mark/verdict-mark.ts';

/** A figure of an option with real parts, or that it is still on its way. */
export function realFigure({ built }: Option, figure: (built: Built) => string | null): string | TemplateResult {
  if (built === null) return html`<span aria-hidden="true">…</span><span class="unseen">not worked out yet</span>`;
  return figure(built) ?? '–';
}

/** The verdict on a network; while it is of exact values and real parts are asked for, it is no more than that. */
export const optionVerdict = ({ meets, built }: Option, real: boolean): TemplateResult =>
  real && built === null
    ? verdictMark('not assessed', `exact values ${meets ? 'meet' : 'fall short'}`)
    : verdictMark(meets ? 'meets' : 'falls short');
