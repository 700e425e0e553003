import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
  }

  h3 {
    margin: 1.25rem 0 0.375rem;
  }

  .identity {
    display: grid;
    grid-template-columns: repeat(3, minmax(0, 1fr));
    gap: 0.25rem 1.25rem;
  }

  .identity .wide {
    grid-column: 1 / -1;
  }

  .actions {
    display: flex;
    flex-wrap: wrap;
    align-items: center;
    gap: 0.625rem 1rem;
    margin-top: 0.75rem;
  }

  difference-table {
    margin-top: 1rem;
  }

  .ticket {
    min-height: 1.75rem;
  }

  p.ticket {
    margin-top: 0.75rem;
  }

  .paper {
    display: flex;
    gap: 1rem;
  }

  .paper label {
    display: inline-flex;
    align-items: center;
    gap: 0.375rem;
    min-height: 1.5rem;
    color: var(--ink);
    font-size: var(--size);
  }

  .paper input {
    width: 1rem;
    height: 1rem;
    min-height: 0;
    accent-color: var(--accent);
  }

  label.button {
    font-size: var(--size);
    color: var(--ink);
  }

  label.button:focus-within {
    outline: 2px solid var(--accent);
    outline-offset: 2px;
  }

  .said {
    min-height: 1.5em;
    margin-top: 0.5rem;
  }

  .digest {
    max-width: none;
    color: var(--muted);
    font-size: var(--small);
  }

  code {
    font: inherit;
    overflow-wrap: anywhere;
  }

  @container (max-width: 34rem) {
    .identity {
      grid-template-columns: repeat(2, minmax(0, 1fr));
    }

    .identity .wide {
      grid-column: 1 / -1;
    }
  }

  @container (max-width: 20rem) {
    .identity {
      grid-template-columns: minmax(0, 1fr);
    }
  }
`;
