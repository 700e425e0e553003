/** Words with symbols in them, `R_T` or `Γ`, as HTML: letter italic, index below. Words hold no mark-up of their own. */
export const inline = (text: string): string =>
  text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replace(/(\d) (?=[GMkmµnp]?(?:Hz|Ω|H|F|dB|%))/gu, '$1\u00a0')
    .replace(/ ([=≤]) /gu, '\u00a0$1\u00a0')
    .replace(/\b([A-Za-z])_([A-Za-z0-9]+)/gu, '<i>$1</i><sub>$2</sub>');
