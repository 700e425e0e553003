import type { Complex } from 'complex.js';

/** How two parts that stand for one arm are joined; null: a part alone. */
export type Pair = 'in series' | 'in parallel' | null;

/** Fractions of what the arm bears that one of its parts does. */
export interface Share {
  readonly volts: number;
  readonly amps: number;
  readonly watts: number;
}

const whole: Share = { volts: 1, amps: 1, watts: 1 };

/**
 * In series the parts share the current and divide the voltage as their impedances; in parallel they share the voltage
 * and divide the current as their admittances. Heat goes as |I|²·R of each.
 *
 * @param impedances of the arm's parts, one or more, Ω
 */
export function shares(impedances: readonly Complex[], pair: Pair): Share[] {
  if (pair === null) return impedances.map(() => whole);
  const along = pair === 'in series' ? impedances : impedances.map((z) => z.inverse());
  const total = along.reduce((sum, each) => sum.add(each)).abs();
  const divided = along.map((each) => each.abs() / total);
  const amps = pair === 'in series' ? divided.map(() => 1) : divided;
  const heats = impedances.map(({ re }, k) => amps[k]! ** 2 * re);
  const heat = heats.reduce((sum, each) => sum + each, 0);
  return divided.map((part, k) => ({
    volts: pair === 'in series' ? part : 1,
    amps: amps[k]!,
    watts: heat === 0 ? 0 : heats[k]! / heat,
  }));
}
