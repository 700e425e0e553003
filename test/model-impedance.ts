import { Complex } from 'complex.js';
import { partsOf, type CircuitModel } from '../src/network/circuit-model.ts';

/** Impedance of a circuit model by complex arithmetic, Ω: the other way than the sweep's real one. */
export function modelImpedance(model: CircuitModel, frequencyHz: number): Complex {
  const { arrangement, r, l, c, c0 } = partsOf(model);
  const omega = 2 * Math.PI * frequencyHz;
  const xl = l === null ? 0 : omega * l;
  const bc = c === null ? 0 : omega * c;
  if (arrangement === 'parallel') return new Complex(1 / r, bc - (l === null ? 0 : 1 / xl)).inverse();
  const series = new Complex(r, xl - (c === null ? 0 : 1 / bc));
  return c0 === null
    ? series
    : series
        .inverse()
        .add(new Complex(0, omega * c0))
        .inverse();
}
