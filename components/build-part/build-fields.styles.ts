import { css } from 'lit';

export const styles = css`
  legend {
    padding: 0;
  }

  .asked {
    display: flex;
    flex-wrap: wrap;
    gap: 0 1.5rem;
    margin-bottom: 0.75rem;
  }

  .asked legend {
    width: 100%;
  }

  .answer {
    display: inline-flex;
    gap: 0.5rem;
    padding: 0.25rem 0;
    min-height: 1.5rem;
    color: var(--ink);
    font-size: var(--size);
    line-height: 1.35;
    cursor: pointer;
  }

  .answer input {
    flex: none;
    width: 1rem;
    height: 1rem;
    min-height: 0;
    margin-top: 0.15em;
    accent-color: var(--accent);
  }

  .kinds {
    display: grid;
    grid-template-columns: repeat(auto-fit, minmax(min(100%, 19rem), 1fr));
    gap: 0.5rem 2.5rem;
  }

  .kind {
    display: grid;
    grid-template-columns: minmax(0, 1.5fr) minmax(0, 1fr) minmax(0, 1fr);
    gap: 0.25rem 1rem;
    align-content: start;
  }

  .kind legend {
    margin-bottom: 0.125rem;
    font-weight: 700;
  }

  .stock {
    display: grid;
    grid-template-columns: repeat(auto-fit, minmax(min(100%, 19rem), 1fr));
    gap: 0.5rem 2.5rem;
    margin-bottom: 0.75rem;
  }

  .stock strong {
    color: var(--ink);
    overflow-wrap: anywhere;
  }

  .actions {
    display: flex;
    flex-wrap: wrap;
    gap: 0.5rem;
  }

  .actions button,
  label.button {
    padding: 0.25rem 0.75rem;
    font-size: var(--small);
    color: var(--ink);
  }

  label.button:focus-within {
    outline: 2px solid var(--accent);
    outline-offset: 2px;
  }

  .said {
    font-size: var(--small);
    line-height: 1.4;
    overflow-wrap: anywhere;
  }

  .said p,
  .said li {
    max-width: none;
    margin-top: 0.25rem;
  }

  .said ul {
    max-height: 12rem;
    margin-top: 0.25rem;
    padding-left: 0.75rem;
    border-left: 3px solid var(--ink);
    overflow-y: auto;
  }

  details {
    border-top: 1px solid var(--hairline);
  }

  details:last-of-type {
    border-bottom: 1px solid var(--hairline);
  }

  summary {
    padding: 0.375rem 0;
    min-height: 1.5rem;
    font-weight: 700;
    cursor: pointer;
  }

  summary .muted {
    margin-left: 0.5rem;
    font-size: var(--small);
    font-weight: 400;
  }

  .group {
    display: grid;
    grid-template-columns: repeat(auto-fill, minmax(min(100%, 13rem), 1fr));
    gap: 0.25rem 1.5rem;
    padding-bottom: 0.75rem;
  }

  @media (pointer: coarse) {
    summary,
    .answer {
      min-height: 2.75rem;
      padding-block: 0.625rem;
    }

    .actions button,
    label.button {
      min-height: 2.75rem;
    }
  }
`;
