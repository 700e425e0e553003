import type { Dossier } from '../dossier.ts';
import { canonical } from '../record/canonical.ts';

/** A file that travels in the report. */
export interface Attachment {
  /** Safe on every system: letters and digits of ASCII, dots and hyphens. */
  readonly name: string;
  /** What it is, for whoever finds it in the report. */
  readonly description: string;
  readonly mediaType: string;
  /** Its relation to the report (ISO 32000-2, 14.13): what it was made from, data shown in it, or more of the same. */
  readonly relation: 'Source' | 'Data' | 'Supplement';
  readonly text: string;
}

/** Everything that reproduces the design. */
export function attachments(dossier: Dossier): readonly Attachment[] {
  return [
    {
      name: 'record.json',
      description: 'Design record in its RFC 8785 form',
      mediaType: 'application/json',
      relation: 'Source',
      text: canonical(dossier.record),
    },
  ];
}
