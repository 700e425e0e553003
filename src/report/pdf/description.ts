/** What the file says of itself. */
export interface Description {
  readonly title: string;
  readonly subject: string;
  readonly author: string;
  readonly creator: string;
  /** Of its text, as BCP 47 has it. */
  readonly language: string;
  /** 64 hex digits; the file's identifier is made of it. */
  readonly digest: string;
  /** Date of issue; null: none is written. */
  readonly date: Date | null;
}
