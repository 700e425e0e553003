import { css } from 'lit';

export const styles = css`
  p {
    display: flex;
    flex-wrap: wrap;
    gap: 0.4rem 0.8rem;
    align-items: center;
    margin: 0 0 1rem;
    max-width: 44rem;
  }
`;
