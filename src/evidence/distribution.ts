/** How a part's value is distributed within its tolerance; `normal`: standard deviation a third of it, cut off at it. */
export const distributions = ['uniform', 'triangular', 'normal'] as const;
export type Distribution = (typeof distributions)[number];
