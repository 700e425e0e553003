import type { MeasuredData } from './measured.ts';

/**
 * Measured data as a record holds it, as a Touchstone 1.1 one-port file (IBIS Open Forum): reflection coefficient as
 * real and imaginary parts, every digit of it.
 */
export function onePortFile(data: MeasuredData): string {
  const { name, sha256, samples, referenceOhm, frequencyHz, re, im } = data;
  const comments = [
    `Read from ${name}, SHA-256 ${sha256}`,
    `${String(frequencyHz.length)} of its ${String(samples)} samples`,
  ];
  const rows = frequencyHz.map((hertz, k) => [hertz, re[k]! + 0, im[k]! + 0].map(String).join(' '));
  const head = comments.map((line) => `! ${line.replace(/[^\x20-\x7e]/gu, '?')}`);
  return `${[...head, `# Hz S RI R ${String(referenceOhm)}`, ...rows].join('\n')}\n`;
}
