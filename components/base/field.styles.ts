import { css } from 'lit';

/** A field as on a printed form: its name above, the text on a rule, what was read beneath. */
export const field = css`
  label,
  .label {
    display: block;
    padding-bottom: 0.1875rem;
    font-size: var(--small);
    color: var(--muted);
  }

  i {
    font-style: italic;
  }

  sub {
    font-size: 0.75em;
    line-height: 0;
  }

  input,
  select,
  textarea {
    display: block;
    width: 100%;
    min-height: 1.875rem;
    padding: 0.0625rem 0.375rem;
    margin: 0;
    border: 0;
    border-bottom: 1px solid var(--field);
    border-radius: 0;
    background: var(--tint);
    color: var(--ink);
    font: inherit;
  }

  /* Its text is laid out by itself: a keystroke doesn't lay the page out for the field's own sake. */
  input:not([type]) {
    height: 1.875rem;
    contain: strict;
  }

  select {
    padding-inline: 0.125rem;
  }

  option {
    background: var(--paper);
  }

  textarea {
    padding: 0.375rem 0.5rem;
    resize: vertical;
  }

  input:focus-visible,
  select:focus-visible,
  textarea:focus-visible {
    outline: 2px solid var(--accent);
    outline-offset: 0;
    border-color: transparent;
  }

  [aria-invalid='true'] {
    border-bottom: 3px double var(--ink);
  }

  .note {
    max-width: none;
    min-height: 1.35em;
    padding: 0.125rem 0 0 0.375rem;
    font-size: var(--small);
    line-height: 1.35;
    color: var(--muted);
    overflow-wrap: anywhere;
  }

  .problem {
    padding-left: 0;
    color: var(--ink);
  }

  .problem strong {
    font-weight: 700;
  }
`;
