/** Units that a field can have, each with the spellings read (lower case) and an example for messages. */
export const units = {
  Hz: { spellings: ['hz'], example: '151.25M or 151.25 MHz' },
  Ω: { spellings: ['ω', 'ohm', 'ohms', 'r'], example: '50, 4R7 or 1k5' },
  H: { spellings: ['h'], example: '4.7n, 4n7 or 4.7 nH' },
  F: { spellings: ['f'], example: '8.2p, 8p2 or 8.2 pF' },
  W: { spellings: ['w'], example: '2 or 500m' },
  V: { spellings: ['v'], example: '50 or 2.5k' },
  A: { spellings: ['a'], example: '1.5 or 300m' },
  m: { spellings: ['m', 'metre', 'metres', 'meter', 'meters'], example: '0.8 mm' },
  dB: { spellings: ['db'], example: '14' },
} as const;

export type Unit = keyof typeof units;

/** SI prefixes read and written (IEC 60027; K for kilo as in IEC 60062). */
export const prefixes: Readonly<Record<string, number>> = {
  a: -18,
  f: -15,
  p: -12,
  n: -9,
  u: -6,
  m: -3,
  k: 3,
  K: 3,
  M: 6,
  G: 9,
  T: 12,
};
