import type { ComparedFigure } from '../recheck/compare-figures.ts';
import type { Recheck } from '../recheck/recheck.ts';
import { version } from '../version.ts';

/** A recheck as JSON: no dossier, and of the figures those that aren't the same. */
export function flatRecheck({ verdict, schema, digest, dossier, report }: Recheck) {
  return {
    verdict,
    version,
    schema,
    digest,
    signOff: dossier.record.signOff.state,
    report:
      report === null
        ? null
        : {
            writtenBy: report.writtenBy,
            digestTrue: true,
            file: report.file,
            added: report.added,
            compared: report.figures.length,
            same: report.figures.filter(({ outcome }) => outcome === 'same').length,
            other: report.figures.filter(({ outcome }) => outcome !== 'same').map(flatFigure),
          },
  };
}

/** What wasn't printed, or isn't computed any more, is left out. */
const flatFigure = ({ name, unit, then, now, outcome }: ComparedFigure) => ({ name, unit, outcome, then, now });
