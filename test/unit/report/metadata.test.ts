import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { describe, expect, it } from 'vitest';
import type { Dossier } from '../../../src/dossier.ts';
import { report } from '../../../src/report/report.ts';
import { dossierOf, fonts } from './records.ts';

/** What the XMP packet says, as another program reads it. */
async function packetOf(dossier: Dossier): Promise<(name: string) => unknown> {
  const task = getDocument({ data: await report(dossier, { paper: 'a4', fonts }), verbosity: 0 });
  const { metadata } = await (await task.promise).getMetadata();
  await task.destroy();
  return (name) => (metadata as { get(name: string): unknown } | null)?.get(name) ?? null;
}

describe('the XMP packet of a report (ISO 16684-1)', () => {
  it('says what the information dictionary says', async () => {
    const packet = await packetOf(dossierOf('tide-gauge'));
    expect(packet('dc:title')).toBe('Tide-gauge telemetry: transmitter to stub whip');
    expect(packet('dc:description')).toBe('Design report TGT-RF-014 revision A');
    expect(packet('dc:language')).toBe('en');
    expect(packet('xmp:createdate')).toBe('2026-11-30T00:00:00Z');
    expect(packet('xmp:modifydate')).toBe('2026-11-30T00:00:00Z');
  });

  it('holds any title, and no date where the record has none', async () => {
    const packet = await packetOf(
      dossierOf('tide-gauge', ({ identity }) => ({
        identity: { ...identity, title: 'R&D <whip> "A" \u0001潮位計', date: '' },
      })),
    );
    expect(packet('dc:title')).toBe('R&D <whip> "A" 潮位計');
    expect(packet('xmp:createdate')).toBeNull();
  });

  it('claims no conformance that is not proved', async () => {
    const packet = await packetOf(dossierOf('tide-gauge'));
    expect([packet('pdfuaid:part'), packet('pdfaid:part')]).toEqual([null, null]);
  });
});
