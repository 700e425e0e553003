import { css } from 'lit';

export const styles = css`
  ol {
    border-bottom: 1px solid var(--hairline);
  }

  .option {
    display: grid;
    grid-template-columns: 1.75rem minmax(0, 1fr);
    max-width: none;
    /* One network's figures cost the others no layout; the focus ring at the edge keeps its room. */
    contain: content;
    overflow-clip-margin: 6px;
    padding: 0.875rem 0;
    border-top: 1px solid var(--hairline);
  }

  .option:first-child {
    border-top: 0;
    padding-top: 0.25rem;
  }

  input {
    width: 1.125rem;
    height: 1.125rem;
    margin: 0.2rem 0 0;
    accent-color: var(--accent);
  }

  .content {
    display: flex;
    flex-wrap: wrap;
    gap: 0.25rem 1.5rem;
  }

  .drawing {
    flex: none;
    max-width: 100%;
    cursor: pointer;
  }

  .drawing svg {
    display: block;
    max-width: 100%;
    height: auto;
    zoom: 1.35;
  }

  .text {
    flex: 1 1 24rem;
    min-width: min(100%, 16rem);
  }

  .long .text {
    flex-basis: 100%;
  }

  .head {
    display: flex;
    flex-wrap: wrap;
    align-items: baseline;
    gap: 0 0.75rem;
  }

  .head > :last-child {
    margin-left: auto;
  }

  .title {
    font-weight: 700;
    cursor: pointer;
  }

  .tag {
    padding: 0 0.4em;
    border: 1px solid var(--accent);
    color: var(--accent);
    font-size: var(--small);
    line-height: 1.4;
  }

  .values {
    display: flex;
    flex-wrap: wrap;
    gap: 0 1.25rem;
    max-width: none;
  }

  .real {
    display: flex;
    flex-wrap: wrap;
    gap: 0 1.25rem;
    max-width: none;
    margin-top: 0.5rem;
  }

  .real .muted {
    font-size: var(--small);
  }

  .real + dl {
    margin-top: 0.125rem;
  }

  dl {
    display: grid;
    grid-template-columns: repeat(auto-fill, minmax(8.25rem, 1fr));
    gap: 0.375rem 1rem;
    margin-top: 0.5rem;
    font-size: var(--small);
    line-height: 1.35;
  }

  dt {
    color: var(--muted);
  }

  dt sub {
    font-size: 0.75em;
    line-height: 0;
  }

  .form {
    max-width: none;
    margin-top: 0.375rem;
    color: var(--muted);
    font-size: var(--small);
  }

  .form::first-letter,
  .absent dt::first-letter,
  .reason::first-letter {
    text-transform: uppercase;
  }

  .reason {
    max-width: 72ch;
    margin-top: 0.25rem;
    font-size: var(--small);
    line-height: 1.4;
  }

  .minimum {
    margin-bottom: 0.75rem;
  }

  .states {
    max-width: none;
    margin-top: 0.375rem;
    font-size: var(--small);
    line-height: 1.4;
  }

  .alone {
    grid-template-columns: minmax(0, 1fr);
    border-bottom: 1px solid var(--hairline);
  }

  .alone .title,
  .alone .drawing {
    cursor: default;
  }

  .notice {
    margin-bottom: 1rem;
    padding-left: 0.75rem;
    border-left: 3px solid var(--ink);
    font-weight: 700;
  }

  h3 {
    margin-top: 1.25rem;
  }

  .absent {
    display: block;
    margin-top: 0.25rem;
  }

  .absent div {
    max-width: 72ch;
    margin-top: 0.375rem;
  }

  .absent dt {
    color: var(--ink);
  }

  .absent dd {
    color: var(--muted);
  }

  .others {
    margin-top: 0.75rem;
  }

  .others ol {
    margin-top: 0.75rem;
  }

  summary {
    min-height: 1.5rem;
    font-weight: 700;
    cursor: pointer;
  }

  area-field {
    margin-top: 1.25rem;
  }
`;
