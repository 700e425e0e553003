import { Complex } from 'complex.js';
import type { Aim } from '../network/termination.ts';

/** Impedance to be seen from the source: ZS* for the conjugate aim, ZS for the reflectionless one. Ω. */
export const targetOf = (source: Complex, aim: Aim): Complex =>
  aim === 'conjugate' ? new Complex(source.re, source.im === 0 ? 0 : -source.im) : source;
