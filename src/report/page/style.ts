/** One scale of letter sizes and line heights, pt. Everything on a report's pages is set in one of these. */
export const styles = {
  display: { size: 18, leading: 22 },
  heading: { size: 11, leading: 14 },
  lead: { size: 12, leading: 17 },
  body: { size: 9, leading: 12.5 },
  small: { size: 7.75, leading: 10.5 },
  micro: { size: 6.5, leading: 9 },
} as const;

export type Style = keyof typeof styles;

/** One scale of distances, pt. */
export const space = { hair: 2, tight: 4, near: 8, wide: 12, far: 18 } as const;

/** Widths of rules, pt. */
export const rules = { hair: 0.4, line: 0.8, bar: 2.4 } as const;
