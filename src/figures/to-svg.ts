import type { Figure, Shape, Tone } from './figure.ts';
import { n } from './draw.ts';

/** Fallbacks are the colours of the printed report; a page's custom properties override them, in dark mode too. */
const colours: Record<Tone, string> = {
  ink: 'var(--ink, #16191d)',
  muted: 'var(--muted, #565d66)',
  faint: 'var(--faint, #c9cdd2)',
  accent: 'var(--accent, #0b5a6b)',
  limit: 'var(--limit, #16191d)',
};

const escape = (text: string): string =>
  text.replace(/[&<>"]/gu, (letter) => ({ '&': '&amp;', '<': '&lt;', '>': '&gt;' })[letter] ?? '&quot;');

function element(shape: Shape): string {
  if (shape.kind === 'text') {
    const weight = shape.bold ? ' font-weight="700"' : '';
    return (
      `<text x="${n(shape.x)}" y="${n(shape.y)}" font-size="${n(shape.size)}" text-anchor="${shape.anchor}" ` +
      `fill="${colours[shape.tone]}"${weight}>${escape(shape.text)}</text>`
    );
  }
  const fill = shape.fill === undefined ? 'none' : colours[shape.fill];
  const opacity = shape.fillOpacity === undefined ? '' : ` fill-opacity="${n(shape.fillOpacity)}"`;
  const drawn =
    shape.stroke === undefined
      ? ''
      : ` stroke="${colours[shape.stroke]}" stroke-width="${n(shape.width ?? 1)}" stroke-linejoin="round"` +
        (shape.dash === undefined ? '' : ` stroke-dasharray="${shape.dash.map(n).join(' ')}"`);
  return `<path d="${shape.d}" fill="${fill}"${opacity}${drawn}/>`;
}

/**
 * A figure as one SVG element: an image to assistive technology, named by its title and described in words. Colours
 * come from presentation attributes, which a Content-Security-Policy without inline styles allows.
 */
export function toSvg(figure: Figure): string {
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" role="img" viewBox="0 0 ${n(figure.width)} ${n(figure.height)}" ` +
    `width="${n(figure.width)}" height="${n(figure.height)}">` +
    `<title>${escape(figure.title)}</title><desc>${escape(figure.description)}</desc>` +
    `${figure.shapes.map(element).join('')}</svg>`
  );
}
