import { css, html, type TemplateResult } from 'lit';

export type Verdict = 'meets' | 'falls short' | 'not assessed';

/** A tick, a cross, a dash: told apart by shape, and always with words. */
const marks = {
  meets: 'M1.5 6.5 4.5 9.5 10.5 2.5',
  'falls short': 'M2 2 10 10M10 2 2 10',
  'not assessed': 'M2 6H10',
} as const;

/** @param words  instead of the verdict's own name */
export function verdictMark(verdict: Verdict, words: string = verdict): TemplateResult {
  return html`<span class="verdict" data-verdict=${verdict}
    ><svg viewBox="0 0 12 12" aria-hidden="true"><path d=${marks[verdict]} /></svg> <span>${words}</span></span
  >`;
}

export const verdictStyles = css`
  .verdict {
    display: inline-flex;
    align-items: baseline;
    gap: 0.4em;
  }

  .verdict svg {
    flex: none;
    width: 0.75em;
    height: 0.75em;
    fill: none;
    stroke: currentColor;
    stroke-width: 2;
  }

  .verdict[data-verdict='falls short'] {
    font-weight: 700;
  }

  .verdict[data-verdict='not assessed'] {
    color: var(--muted);
  }
`;
