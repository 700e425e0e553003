/** One of several texts that a field can have, and the words that stand for it. */
export interface Choice {
  readonly value: string;
  readonly words: string;
}
