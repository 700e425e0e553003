import { css } from 'lit';

export const styles = css`
  section {
    display: grid;
    gap: 0.25rem 1.5rem;
  }

  .actions {
    display: flex;
    flex-wrap: wrap;
    gap: 0.5rem 1rem;
  }

  textarea {
    min-height: 2.25rem;
  }
`;
