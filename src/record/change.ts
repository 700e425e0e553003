/** What a change is about, in the order in which changes are told. */
export const changeGroups = [
  'identity',
  'requirement',
  'terminations',
  'method',
  'parts',
  'selection',
  'deviations',
  'as built',
  'sign-off',
  'results',
  'verdicts',
] as const;
export type ChangeGroup = (typeof changeGroups)[number];

/** One thing that is otherwise than before, in the engineer's words and units; `before` and `after` never look the same. */
export interface Change {
  readonly group: ChangeGroup;
  /** "Band" */
  readonly what: string;
  readonly before: string;
  readonly after: string;
}
