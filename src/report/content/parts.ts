/** Numbers of a report's parts, for their headings and for the sentences that refer to them. */
export const parts = {
  requirement: 1,
  terminations: 2,
  assumptions: 3,
  ceiling: 4,
  options: 5,
  network: 6,
  response: 7,
  verification: 8,
  bandwidth: 9,
  cautions: 10,
  deviations: 11,
  references: 12,
  files: 13,
  history: 14,
  signOff: 15,
} as const;
