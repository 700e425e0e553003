import { html, type TemplateResult } from 'lit';

/** A relative difference as it is printed: 3.1 × 10⁻¹⁶; 0 stays 0. */
export function powerOfTen(value: number): TemplateResult {
  if (value === 0) return html`0`;
  const [mantissa = '', exponent = '0'] = value.toExponential(1).split('e');
  const power = html`10<sup>${exponent.replace('+', '').replace('-', '−')}</sup>`;
  return mantissa === '1.0' ? power : html`${mantissa} × ${power}`;
}
