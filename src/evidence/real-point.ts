import { Complex } from 'complex.js';
import { heat, type Borne, type Branches } from './branch.ts';
import { carry } from './carry.ts';

/** A ladder between its terminations at one frequency, for the power available. W. */
export interface RealPoint {
  /** Impedance seen from the source, Ω. */
  readonly seen: Complex;
  /** What each arm bears, source side first. */
  readonly arms: readonly Borne[];
  readonly loadW: number;
  /** Into the network. */
  readonly inputW: number;
  /** Heat in all arms. */
  readonly lostW: number;
  /** |V − I·ZS*|²/(8·RS): what of the available power comes back. */
  readonly reflectedW: number;
  /** Transducer gain: loadW over the available power, 0 to 1. */
  readonly gain: number;
  /** Of what enters the network, the part that the load gets: loadW / (loadW + lostW), no difference of terms; 0 to 1. */
  readonly efficiency: number;
}

/**
 * Voltages, currents and powers with 1 A in the load carried back to the source, then scaled to the open-circuit
 * voltage of a source of that available power: ES = √(8·RS·P), peak.
 *
 * @param ladder     at the frequency in question
 * @param source     impedance at that frequency, Ω; `load` likewise
 * @param availableW > 0, W
 */
export function realPoint(ladder: Branches, source: Complex, load: Complex, availableW: number): RealPoint {
  const carried = carry(ladder, load, new Complex(1, 0));
  const scale = new Complex(Math.sqrt(8 * source.re * availableW), 0).div(carried.volts.add(carried.amps.mul(source)));
  const arms = carried.arms.map(({ volts, amps }, k): Borne => {
    const through = amps.mul(scale);
    return { volts: volts.mul(scale), amps: through, watts: heat(through, ladder.arms[k]!.z) };
  });
  const volts = carried.volts.mul(scale);
  const amps = carried.amps.mul(scale);
  const loadW = heat(scale, load);
  const lostW = arms.reduce((sum, { watts }) => sum + watts, 0);
  return {
    seen: volts.div(amps),
    arms,
    loadW,
    inputW: (volts.re * amps.re + volts.im * amps.im) / 2,
    lostW,
    reflectedW: volts.sub(amps.mul(source.conjugate())).abs() ** 2 / (8 * source.re),
    gain: loadW / availableW,
    efficiency: loadW / (loadW + lostW),
  };
}
