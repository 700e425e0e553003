import { css } from 'lit';

/** A ruled table as in a printed calculation: a line above and below, hairlines between, figures to the right. */
export const table = css`
  .scroll {
    overflow-x: auto;
  }

  table {
    width: 100%;
    border-collapse: collapse;
    border-block: 1px solid var(--ink);
  }

  caption {
    padding-bottom: 0.375rem;
    text-align: left;
    font-weight: 700;
  }

  th,
  td {
    padding: 0.4rem 1rem 0.4rem 0;
    text-align: left;
    vertical-align: baseline;
    font-weight: 400;
  }

  th:last-child,
  td:last-child {
    padding-right: 0;
  }

  thead th {
    color: var(--muted);
    font-size: var(--small);
    line-height: 1.35;
    vertical-align: bottom;
    border-bottom: 1px solid var(--ink);
  }

  tbody + tbody,
  tbody tr + tr {
    border-top: 1px solid var(--hairline);
  }

  .number {
    text-align: right;
    white-space: nowrap;
  }
`;
