import { css } from 'lit';

export const styles = css`
  .tools {
    display: flex;
    flex-wrap: wrap;
    align-items: end;
    gap: 0.75rem 1rem;
  }

  .search {
    flex: 1 1 18rem;
    max-width: 36rem;
  }

  .tools :is(input[type='search'], button, .button) {
    min-height: 2.75rem;
  }

  label.button {
    font-size: var(--size);
    color: var(--ink);
    padding-bottom: 0.25rem;
  }

  label.button:focus-within {
    outline: 2px solid var(--accent);
    outline-offset: 2px;
  }

  .said {
    max-width: none;
    min-height: 1.5em;
    margin-block: 0.75rem;
    overflow-wrap: anywhere;
  }

  .refused {
    margin-bottom: 1rem;
    padding-left: 0.875rem;
    border-left: 3px double var(--ink);
  }

  .refused li {
    max-width: none;
    padding-block: 0.125rem;
    overflow-wrap: anywhere;
  }

  .none {
    max-width: none;
    padding-block: 1.5rem;
    border-block: 1px solid var(--hairline);
  }

  h2 {
    font-size: 1.0625rem;
    overflow-wrap: anywhere;
  }

  .id {
    margin-right: 0.75rem;
    color: var(--accent);
  }

  li {
    max-width: none;
  }

  .document {
    padding-block: 0.875rem 0.75rem;
    border-top: 1px solid var(--ink);
  }

  .document h2 {
    padding-bottom: 0.375rem;
  }

  .document:last-child {
    border-bottom: 1px solid var(--ink);
  }

  .deleted {
    margin-bottom: 1.25rem;
    padding: 0.625rem 0.875rem;
    background: var(--tint);
  }

  .deleted h2 {
    font-size: var(--size);
  }

  .deleted li {
    display: flex;
    flex-wrap: wrap;
    align-items: center;
    justify-content: space-between;
    gap: 0 1rem;
    overflow-wrap: anywhere;
  }

  .deleted button {
    min-height: 2.75rem;
  }
`;
