import type { DesignRecord } from './design-record.ts';

/** Most bytes of a name without its ending, in UTF-8: file systems take 255 for the whole. */
const longest = 200;
/** What some systems take for a device, whatever ending follows. */
const device = /^(?:con|prn|aux|nul|com[0-9¹²³]|lpt[0-9¹²³])(?:\.|$)/iu;

/**
 * Name of a document's file, from its number and revision: "TG-041_A.pdf". Letters and digits of any script, dots and
 * hyphens; whatever else stands in the number becomes a hyphen. Never empty, and never a device's name.
 *
 * @param ending "pdf", without its dot
 */
export function fileName({ identity: { number, revision } }: DesignRecord, ending: string): string {
  const stem = shortened([safe(number), safe(revision)].filter((text) => text !== '').join('_')) || 'design';
  return `${device.test(stem) ? `design-${stem}` : stem}.${ending}`;
}

const safe = (text: string): string =>
  trimmed(text.normalize('NFC').replace(/[^\p{L}\p{M}\p{N}.-]+/gu, '-')).replace(/^\p{M}+/u, '');

const trimmed = (text: string): string => text.replace(/^[-.]+|[-.]+$/gu, '');

/** As many of the letters as fit, none of them halved. */
function shortened(text: string): string {
  const encoder = new TextEncoder();
  let bytes = 0;
  let kept = '';
  for (const letter of text) {
    bytes += encoder.encode(letter).length;
    if (bytes > longest) return trimmed(kept);
    kept += letter;
  }
  return kept;
}
