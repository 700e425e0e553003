import { css } from 'lit';

/** What every element of the sheet shares: measure of boxes, text, links, buttons, focus. */
export const base = css`
  *,
  *::before,
  *::after {
    box-sizing: border-box;
  }

  :host {
    display: block;
  }

  :host([hidden]),
  [hidden] {
    display: none !important;
  }

  h2,
  h3,
  p,
  ol,
  ul,
  dl,
  dd,
  figure,
  fieldset {
    margin: 0;
    padding: 0;
    border: 0;
  }

  ol,
  ul {
    list-style: none;
  }

  h3 {
    font-size: var(--size);
    font-weight: 700;
  }

  p,
  li {
    max-width: var(--measure);
  }

  a {
    color: var(--accent);
    text-underline-offset: 0.2em;
    text-decoration-thickness: 1px;
  }

  button,
  .button {
    display: inline-flex;
    align-items: center;
    min-height: 2.25rem;
    padding: 0.25rem 0.875rem;
    border: 1px solid var(--field);
    border-radius: 2px;
    background: var(--paper);
    color: var(--ink);
    font: inherit;
    cursor: pointer;
  }

  button:hover,
  .button:hover {
    border-color: var(--ink);
    background: var(--tint);
  }

  button.main {
    border-color: var(--accent);
    background: var(--accent);
    color: var(--on-accent);
  }

  button.main:hover {
    border-color: var(--ink);
    background: var(--ink);
    color: var(--paper);
  }

  button[aria-disabled='true'],
  button.main[aria-disabled='true'] {
    border: 1px dashed var(--field);
    background: none;
    color: var(--muted);
    cursor: default;
  }

  :focus-visible {
    outline: 2px solid var(--accent);
    outline-offset: 2px;
  }

  .muted {
    color: var(--muted);
  }

  .small {
    font-size: var(--small);
  }

  .value {
    white-space: nowrap;
  }

  .unseen {
    position: absolute;
    width: 1px;
    height: 1px;
    overflow: hidden;
    clip-path: inset(50%);
    white-space: nowrap;
  }
`;
