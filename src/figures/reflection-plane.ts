import type { Response } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { formatFixed, formatRead } from '../quantity/format.ts';
import { lettering } from './chart-frame.ts';
import { circle, label, line, n, path, rectangle, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';

const radius = 96;
const centre = { x: 112, y: 112 } as const;
const legendX = 236;

/**
 * The reflection coefficient over the sweep in its plane: unit circle, circles of equal magnitude, the circle that the
 * required return loss allows, the trace (heavy within the band) and marks at the design frequency and the band's ends,
 * named beside the plane so that marks close together stay readable. A frequency that the sweep doesn't hold has no mark:
 * between samples the figure would be a guess.
 */
export function reflectionPlane(response: Response, requirement: DesignRecord['requirement']): Figure {
  const at = (re: number, im: number): readonly [number, number] => [centre.x + radius * re, centre.y - radius * im];
  const faint = { stroke: 'faint', width: stroke.hair } as const;
  const shapes: Shape[] = [];
  for (const magnitude of [0.25, 0.5, 0.75]) shapes.push(circle(centre.x, centre.y, radius * magnitude, faint));
  shapes.push(line(centre.x - radius, centre.y, centre.x + radius, centre.y, faint));
  shapes.push(line(centre.x, centre.y - radius, centre.x, centre.y + radius, faint));
  shapes.push(circle(centre.x, centre.y, radius, { stroke: 'muted', width: stroke.thin }));
  for (const magnitude of [0.5, 1]) {
    const [x, y] = at(magnitude, 0);
    shapes.push(label(x + 2, y - 2, formatFixed(magnitude, 1), 6.5, 'start', 'muted'));
  }

  let row = 16;
  const note = (text: string, tone: 'ink' | 'limit' | 'accent' = 'ink'): void => {
    shapes.push(label(legendX + 22, row + 2.8, text, lettering, 'start', tone));
    row += 15;
  };
  const sample = (style: { stroke: 'accent' | 'limit' | 'muted'; width: number; dash?: readonly number[] }): void => {
    shapes.push(line(legendX, row, legendX + 16, row, style));
  };
  const limit = { stroke: 'limit', width: stroke.line, dash: [3, 2] } as const;
  if (requirement.returnLossDb !== null) {
    const allowed = 10 ** (-requirement.returnLossDb / 20);
    shapes.push(circle(centre.x, centre.y, radius * allowed, limit));
    sample(limit);
    note(`required: |Γ| ≤ ${formatFixed(allowed, 3)} (${formatRead(requirement.returnLossDb, 'dB')})`, 'limit');
  }

  const { frequencyHz, gammaRe, gammaIm } = response;
  const trace = (from: number, to: number): string => {
    let d = '';
    for (let index = from; index <= to; index += 1) {
      const [x, y] = at(gammaRe[index] ?? 0, gammaIm[index] ?? 0);
      d += `${d === '' ? 'M' : 'L'}${n(x)} ${n(y)}`;
    }
    return d;
  };
  const thin = { stroke: 'accent', width: stroke.thin, dash: [2, 1.5] } as const;
  const heavy = { stroke: 'accent', width: stroke.heavy } as const;
  const last = frequencyHz.length - 1;
  const band = requirement.bandHz;
  const first = band === null ? 0 : frequencyHz.findIndex((hertz) => hertz >= band.low);
  const final = band === null ? last : frequencyHz.findLastIndex((hertz) => hertz <= band.high);
  if (last > 0) shapes.push(path(trace(0, last), band === null ? heavy : thin));
  if (band !== null) {
    if (first >= 0 && final > first) shapes.push(path(trace(first, final), heavy));
    sample(heavy);
    note('within the band', 'accent');
    sample(thin);
    note('over the sweep', 'accent');
  }

  const sampleAt = (hertz: number): number =>
    frequencyHz.findIndex((frequency) => Math.abs(frequency - hertz) <= 1e-9 * hertz);
  const points: readonly (readonly [number, Mark])[] = [
    ...(band === null ? [] : ([[band.low, 'square']] as const)),
    [requirement.frequencyHz, 'disc'],
    ...(band === null ? [] : ([[band.high, 'ring']] as const)),
  ];
  const words: string[] = [];
  for (const [hertz, mark] of points) {
    const index = sampleAt(hertz);
    if (index < 0) continue;
    const [re, im] = [gammaRe[index] ?? 0, gammaIm[index] ?? 0];
    shapes.push(marker(mark, ...at(re, im)), marker(mark, legendX + 8, row));
    const magnitude = Math.hypot(re, im);
    const angle = magnitude < 5e-4 ? '' : `∠${formatFixed((Math.atan2(im, re) * 180) / Math.PI, 1)}°`;
    const text = `${formatRead(hertz, 'Hz')}: Γ = ${formatFixed(magnitude, 3)}${angle}`;
    note(text);
    words.push(text);
  }
  return {
    width: 420,
    height: 224,
    title: 'Reflection coefficient',
    description: `Reflection coefficient in its plane. ${words.join('; ')}.`,
    shapes,
  };
}

type Mark = 'square' | 'disc' | 'ring';

function marker(mark: Mark, x: number, y: number): Shape {
  if (mark === 'disc') return circle(x, y, 2.8, { fill: 'ink' });
  if (mark === 'ring') return circle(x, y, 3.2, { stroke: 'ink', width: stroke.line });
  return rectangle(x - 2.9, y - 2.9, 5.8, 5.8, { stroke: 'ink', width: stroke.line });
}
