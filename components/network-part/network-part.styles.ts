import { css } from 'lit';

export const styles = css`
  .drawing {
    overflow-x: auto;
    padding-block: 0.25rem 0.75rem;
  }

  .drawing svg {
    display: block;
    zoom: 1.35;
    margin-inline: auto;
  }

  .columns {
    display: grid;
    grid-template-columns: repeat(auto-fit, minmax(min(100%, 19rem), 1fr));
    gap: 1.5rem 2.5rem;
  }

  .line {
    display: flex;
    flex-wrap: wrap;
    justify-content: space-between;
    align-items: baseline;
    gap: 0 1rem;
  }

  dl {
    border-block: 1px solid var(--ink);
  }

  dl div {
    display: flex;
    justify-content: space-between;
    gap: 0 1rem;
    padding: 0.4rem 0;
  }

  dl div + div {
    border-top: 1px solid var(--hairline);
  }

  dt {
    flex: none;
    color: var(--muted);
  }

  dd {
    margin-left: auto;
    text-align: right;
  }

  h3 {
    padding-block: 0.25rem;
  }

  .cautions {
    margin-top: 0.125rem;
    font-size: var(--small);
    line-height: 1.45;
  }

  .cautions li {
    max-width: 76ch;
    margin-top: 0.375rem;
    padding-left: 0.75rem;
    border-left: 3px solid var(--field);
  }

  .columns + h3 {
    margin-top: 1.25rem;
  }
`;
