/** Where a kind of part comes from: exact values, a preferred series (IEC 60063), the stock list, or wound by hand. */
export const origins = ['exact', 'E6', 'E12', 'E24', 'E48', 'E96', 'E192', 'stock', 'wound'] as const;
export type Origin = (typeof origins)[number];
