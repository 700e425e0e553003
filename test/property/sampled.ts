import type { CircuitModel } from '../../src/network/circuit-model.ts';
import { modelImpedance } from '../model-impedance.ts';

/** R, L and C that resonate at f0 with the Q given: half-power band f0/Q, of the load by itself. */
export function resonant(kind: 'rlc-series' | 'rlc-parallel', r: number, q: number, f0: number): CircuitModel {
  const omega0 = 2 * Math.PI * f0;
  return kind === 'rlc-series'
    ? { model: kind, values: [r, (q * r) / omega0, 1 / (omega0 * q * r)] }
    : { model: kind, values: [r, r / (omega0 * q), q / (omega0 * r)] };
}

/** A Touchstone file of a model's reflection in 50 Ω. */
export function sampled(model: CircuitModel, hz: readonly number[]): string {
  const rows = hz.map((f) => {
    const z = modelImpedance(model, f);
    const gamma = z.sub(50).div(z.add(50));
    return `${String(f)} ${String(gamma.re)} ${String(gamma.im)}`;
  });
  return ['# Hz S RI R 50', ...rows].join('\n');
}
