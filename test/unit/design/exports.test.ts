import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import { chosenTwoPort, sweepCsv } from '../../../src/design/exports.ts';
import { readTouchstone } from '../../../src/measured/read-touchstone.ts';
import { ladderInput } from '../../../src/network/ladder-input.ts';
import { recordOf } from '../record-of.ts';

const dossier = design(
  recordOf({
    frequency: '100M',
    source: '50',
    load: 'free = 12-j40\n"in, hand" = 9-j44',
    band: '98M..102M',
    title: 'Füße "und" Ω',
  }),
);
const none = design(recordOf({ method: 'pi', frequency: '100M', source: '50', load: '1k', q: '2' }));

describe('chosenTwoPort(dossier)', () => {
  const text = chosenTwoPort(dossier)!;

  it('is a Touchstone 1.1 file in plain ASCII: title, digest, option line, nine numbers a line', () => {
    expect(text).toMatch(/^[\n\x20-\x7e]*$/u);
    const lines = text.trimEnd().split('\n');
    expect(lines[0]).toMatch(/^! F\?\?e "und" \?, /u);
    expect(lines[1]).toContain(dossier.digest);
    expect(lines[3]).toBe('# Hz S RI R 50');
    for (const line of lines.slice(4)) expect(line.split(' ')).toHaveLength(9);
    expect(lines).toHaveLength(4 + dossier.responses[0]!.frequencyHz.length);
  });

  it('reads back as the chosen network seen from both ends', () => {
    const { arms } = dossier.options.find(({ id }) => id === dossier.chosen)!;
    for (const port of [1, 2] as const) {
      const { frequencyHz, re, im } = readTouchstone(text, 'network.s2p', port);
      expect([...frequencyHz]).toEqual(dossier.responses[0]!.frequencyHz);
      frequencyHz.forEach((hz, k) => {
        const z = ladderInput(port === 1 ? arms : arms.toReversed(), new Complex(50, 0), hz);
        const gamma = z.sub(50).div(z.add(50));
        expect(Math.hypot(re[k]! - gamma.re, im[k]! - gamma.im)).toBeLessThan(1e-12);
      });
    }
  });

  it('is null where there is no network', () => {
    expect(chosenTwoPort(none)).toBeNull();
  });
});

describe('sweepCsv(dossier)', () => {
  const text = sweepCsv(dossier)!;

  /** RFC 4180: CRLF, quotes doubled. */
  const parse = (csv: string): string[][] =>
    csv
      .split('\r\n')
      .slice(0, -1)
      .map((line) =>
        [...line.matchAll(/(?:^|,)(?:"((?:[^"]|"")*)"|([^,"]*))/gu)].map(([, quoted, plain]) =>
          quoted === undefined ? plain! : quoted.replaceAll('""', '"'),
        ),
      );

  it("has the frequency and a block of columns for each state, in the record's order", () => {
    const [head, ...rows] = parse(text);
    const order = dossier.record.loads.map(({ name }) => name);
    const responses = dossier.responses.toSorted((a, b) => order.indexOf(a.state) - order.indexOf(b.state));
    const [first, second] = order;
    const columns = [
      'return loss dB',
      'VSWR',
      'mismatch loss dB',
      'transducer gain dB',
      'reflection re',
      'reflection im',
    ];
    expect(head).toEqual([
      'frequency Hz',
      ...columns.map((name) => `${first!}: ${name}`),
      ...columns.map((name) => `${second!}: ${name}`),
    ]);
    expect([first, second].toSorted()).toEqual(['"in, hand"', 'free'].toSorted());
    expect(rows).toHaveLength(dossier.responses[0]!.frequencyHz.length);
    rows.forEach((row, k) => {
      expect(row.map(Number)).toEqual([
        dossier.responses[0]!.frequencyHz[k],
        ...responses.flatMap(({ returnLossDb, vswr, mismatchLossDb, transducerGainDb, gammaRe, gammaIm }) => [
          returnLossDb[k]!,
          vswr[k]!,
          mismatchLossDb[k]!,
          transducerGainDb[k]!,
          gammaRe[k]!,
          gammaIm[k]!,
        ]),
      ]);
    });
  });

  it('is null where there is no network', () => {
    expect(sweepCsv(none)).toBeNull();
  });
});
