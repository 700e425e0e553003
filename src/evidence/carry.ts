import { Complex } from 'complex.js';
import type { Branches } from './branch.ts';

/** Peak phasors along a ladder: across and through each arm, and at the source's terminals. */
export interface Carried {
  readonly arms: readonly { readonly volts: Complex; readonly amps: Complex }[];
  readonly volts: Complex;
  /** Into the network. */
  readonly amps: Complex;
}

/**
 * A voltage and a current at the load carried back to the source, arm by arm: a series arm adds to the voltage, a shunt
 * arm and the stray of each node to the current.
 *
 * @param volts at the load, V
 * @param amps  into the load, A
 */
export function carry({ arms, strayB }: Branches, volts: Complex, amps: Complex): Carried {
  const stray = new Complex(0, strayB);
  let v = volts;
  let i = amps.add(v.mul(stray));
  const along = arms.toReversed().map(({ arm, z }) => {
    if (arm === 'shunt') {
      const through = v.div(z);
      i = i.add(through);
      return { volts: v, amps: through };
    }
    const across = i.mul(z);
    const through = i;
    v = v.add(across);
    i = i.add(v.mul(stray));
    return { volts: across, amps: through };
  });
  return { arms: along.reverse(), volts: v, amps: i };
}
