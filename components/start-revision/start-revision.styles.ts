import { css } from 'lit';

export const styles = css`
  section {
    display: grid;
    gap: 0.25rem 1.5rem;
  }

  .actions {
    align-items: start;
    display: flex;
    flex-wrap: wrap;
    gap: 0.5rem 1rem;
  }

  /* The button stands beside the text that it waits for. */
  @media (min-width: 56.25rem) {
    :host([floating]) section {
      grid-template-columns: minmax(0, 1fr) auto;
    }

    :host([floating]) section > p {
      grid-column: 1 / -1;
      max-width: none;
    }

    :host([floating]) .actions {
      padding-top: 1.25rem;
    }
  }

  textarea {
    min-height: 2.25rem;
  }
`;
