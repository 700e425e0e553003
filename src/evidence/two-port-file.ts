import type { Arm } from '../network/arm.ts';
import { ladderScattering } from './s-parameters.ts';

/**
 * A network as a Touchstone 1.1 two-port file (IBIS Open Forum): port 1 at the source, S-parameters as real and
 * imaginary parts in 50 Ω.
 *
 * @param frequencyHz ascending
 * @param comments    lines put at the head
 */
export function twoPortFile(arms: readonly Arm[], frequencyHz: readonly number[], comments: readonly string[]): string {
  const rows = frequencyHz.map((hz) => {
    const { s11, s21, s12, s22 } = ladderScattering(arms, hz, 50);
    return [hz, ...[s11, s21, s12, s22].flatMap(({ re, im }) => [re + 0, im + 0])].map(String).join(' ');
  });
  const head = comments.map((line) => `! ${line.replace(/[^\x20-\x7e]/gu, '?')}`);
  return `${[...head, '# Hz S RI R 50', ...rows].join('\n')}\n`;
}
