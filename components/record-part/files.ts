import type { Dossier } from '../../src/dossier.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';

export type Paper = 'a4' | 'letter';

export const recordFile = (record: DesignRecord): Blob =>
  new Blob([`${JSON.stringify(record, null, 2)}\n`], { type: 'application/json' });

/** The chosen network as a two-port file, or its sweep as comma-separated values; null where there is no network. */
export async function exportFile(dossier: Dossier, kind: 's2p' | 'csv'): Promise<Blob | null> {
  const { chosenTwoPort, sweepCsv } = await import('../../src/design/exports.ts');
  const text = kind === 's2p' ? chosenTwoPort(dossier) : sweepCsv(dossier);
  return text === null ? null : new Blob([text], { type: kind === 's2p' ? 'text/plain' : 'text/csv' });
}

/** The report; its writer and the fonts are fetched when one is asked for, not before. */
export async function reportFile(dossier: Dossier, paper: Paper): Promise<Blob> {
  const [{ report }, regular, bold] = await Promise.all([
    import('../../src/report/report.ts'),
    font('regular'),
    font('bold'),
  ]);
  const bytes = await report(dossier, { paper, fonts: { regular, bold } });
  return new Blob([new Uint8Array(bytes)], { type: 'application/pdf' });
}

async function font(weight: 'regular' | 'bold'): Promise<Uint8Array> {
  const answer = await fetch(`${import.meta.env.BASE_URL}fonts/ferrule-${weight}.ttf`);
  if (!answer.ok) throw new Error(`the font can't be fetched (${String(answer.status)}); connect once and try again`);
  return new Uint8Array(await answer.arrayBuffer());
}
