import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
    padding-block: 0.125rem;
    border-top: 1px solid var(--hairline);
  }

  .line {
    display: grid;
    grid-template-columns: 8rem 8.5rem 6.5rem minmax(0, 1fr) auto;
    align-items: center;
    gap: 0 1rem;
  }

  a {
    display: flex;
    align-items: center;
    min-height: 2.75rem;
    overflow-wrap: anywhere;
  }

  .kept {
    color: var(--muted);
    font-size: var(--small);
  }

  /* The same act stands below the same, where an issued revision has one less. */
  .acts {
    display: grid;
    grid-template-columns: 4rem 3.5rem 5.5rem 2.75rem;
    gap: 0 1.25rem;
  }

  .acts button {
    min-width: 2.75rem;
    min-height: 2.75rem;
    padding: 0;
    border: 0;
    background: none;
    color: var(--accent);
    font-size: var(--small);
    text-decoration: underline;
    text-decoration-thickness: 1px;
    text-underline-offset: 0.2em;
  }

  .acts button:hover {
    color: var(--ink);
  }

  p {
    overflow-wrap: anywhere;
  }

  .note {
    padding: 0 0 0.375rem;
  }

  form {
    display: grid;
    grid-template-columns: minmax(0, 2fr) minmax(0, 1fr) auto auto;
    align-items: end;
    gap: 0.5rem 1rem;
    padding-block: 0.25rem 0.75rem;
  }

  form p {
    max-width: none;
  }

  form :is(input, button) {
    min-height: 2.75rem;
  }

  form input {
    height: 2.75rem;
  }

  @container (max-width: 52rem) {
    .line,
    .acts {
      display: flex;
      flex-wrap: wrap;
    }

    a {
      flex: 1;
    }

    .kept,
    .acts {
      flex-basis: 100%;
    }

    span:empty {
      display: none;
    }
  }

  @container (max-width: 34rem) {
    form {
      grid-template-columns: auto minmax(0, 1fr);
      justify-items: start;
    }

    form p {
      grid-column: 1 / -1;
      width: 100%;
    }
  }
`;
