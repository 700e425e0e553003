import { describe, expect, it } from 'vitest';
import { toSvg } from '../../../src/figures/to-svg.ts';

const figure = {
  width: 100,
  height: 50,
  title: 'Gain & <loss>',
  description: 'A "line"',
  shapes: [
    { kind: 'path', d: 'M0 0L10 10', stroke: 'accent', width: 1.1, dash: [3, 2] },
    { kind: 'text', x: 1, y: 2, text: '|Γ| < 1', size: 8, anchor: 'end', tone: 'muted', bold: true },
  ],
} as const;

describe('toSvg(figure)', () => {
  it('is an image with a name and a description, its letters escaped', () => {
    const svg = toSvg(figure);
    expect(svg).toContain('role="img"');
    expect(svg).toContain('<title>Gain &amp; &lt;loss&gt;</title><desc>A &quot;line&quot;</desc>');
    expect(svg).toContain('>|Γ| &lt; 1</text>');
  });

  it('takes its colours from custom properties by attributes alone', () => {
    const svg = toSvg(figure);
    expect(svg).toContain('stroke="var(--accent, ');
    expect(svg).toContain('fill="var(--muted, ');
    expect(svg).not.toContain('style=');
  });
});
