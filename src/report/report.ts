import type { Dossier } from '../dossier.ts';
import { attachments } from './attachments.ts';
import { blocks } from './content/blocks.ts';
import { stateWords } from './content/state.ts';
import { missingNote } from './content/title-block.ts';
import { orNotStated, titleOf } from './content/words.ts';
import type { Block } from './page/block.ts';
import { documentElement } from './page/element.ts';
import { frameOf } from './page/frame.ts';
import { addFurniture } from './page/furniture.ts';
import { lettering, missing, type Lettering } from './page/lettering.ts';
import { paginate } from './page/paginate.ts';
import type { Piece } from './page/piece.ts';
import { setBlock } from './page/set-block.ts';
import { readTypeface } from './page/typeface.ts';
import { writePdf } from './pdf/write-pdf.ts';

export interface ReportOptions {
  readonly paper: 'a4' | 'letter';
  /** TrueType files of the two weights. */
  readonly fonts: { readonly regular: Uint8Array; readonly bold: Uint8Array };
}

/**
 * The design report of a dossier, as a PDF file. The same dossier gives the same bytes: dates come from the record,
 * never from a clock.
 *
 * @throws RangeError when a font isn't a TrueType file with a character map
 */
export async function report(dossier: Dossier, { paper, fonts }: ReportOptions): Promise<Uint8Array> {
  const faces = { regular: readTypeface(fonts.regular), bold: readTypeface(fonts.bold) };
  const letters = noting(lettering(faces.regular, faces.bold));
  const frame = frameOf(paper);
  const width = frame.right - frame.left;
  const { record, digest, version } = dossier;
  const { identity, signOff } = record;
  const attached = attachments(dossier);
  const structure = documentElement();
  const set = (block: Block): readonly Piece[] => setBlock(block, frame.left, width, letters, structure);
  const pieces = blocks(dossier, attached).flatMap(set);
  if (letters.lacks()) pieces.push(...set(missingNote(missing)));
  const sheets = paginate(pieces, frame.top, frame.bottom);
  const number = identity.number.trim() === '' ? 'No document number' : identity.number;
  addFurniture(
    sheets,
    frame,
    {
      number,
      revision: orNotStated(identity.revision),
      state: stateWords[signOff.state].mark,
      draft: signOff.state === 'draft',
      title: titleOf(record),
      foot: `Ferrule ${version}, SHA-256 of the record ${digest}`,
    },
    letters,
  );
  const author = signOff.prepared.name.trim() || identity.owner.trim();
  const description = {
    title: titleOf(record),
    subject: `Design report ${identity.number} revision ${identity.revision}`.replace(/\s+/gu, ' ').trim(),
    author,
    creator: `Ferrule ${version}`,
    language: 'en',
    digest,
    date: dateOf(identity.date),
  };
  const contents = {
    sheets,
    size: [frame.width, frame.height],
    structure,
    attachments: attached,
    description,
  } as const;
  return writePdf(contents, faces, letters);
}

/** Lettering that remembers whether a character had to be replaced. */
function noting(letters: Lettering): Lettering & { readonly lacks: () => boolean } {
  let lacks = false;
  return {
    width: letters.width,
    printable: (text) => {
      const out = letters.printable(text);
      if (out.includes(missing) && !text.includes(missing)) lacks = true;
      return out;
    },
    lacks: () => lacks,
  };
}

/** Midnight UTC of an ISO 8601 calendar date; null where there is none. */
function dateOf(date: string): Date | null {
  const time = /^\d{4}-\d{2}-\d{2}$/u.test(date) ? Date.parse(`${date}T00:00:00Z`) : Number.NaN;
  return Number.isNaN(time) ? null : new Date(time);
}
