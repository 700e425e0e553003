import type { Dossier } from '../dossier.ts';
import { twoPortFile } from '../evidence/two-port-file.ts';

/** The chosen network over the span shown, as a Touchstone two-port file; null where there is none. */
export function chosenTwoPort({ options, chosen, responses, record, digest, version }: Dossier): string | null {
  const option = options.find(({ id }) => id === chosen);
  const [response] = responses;
  if (option === undefined || response === undefined) return null;
  const { number, revision, title } = record.identity;
  return twoPortFile(option.arms, response.frequencyHz, [
    `${title}, ${number} revision ${revision}: ${option.title}`,
    `Ferrule ${version}, record SHA-256 ${digest}`,
    'Ideal parts; port 1 at the source, port 2 at the load',
  ]);
}

/** The chosen network's sweep as comma-separated values (RFC 4180), one block of columns a load state in the record's order; null where there is none. */
export function sweepCsv({ responses, record }: Dossier): string | null {
  const [first] = responses;
  if (first === undefined) return null;
  const place = (state: string): number => record.loads.findIndex(({ name }) => name === state);
  const columns = responses
    .toSorted((a, b) => place(a.state) - place(b.state))
    .flatMap((response) => {
      const of = response.state === '' ? '' : `${response.state}: `;
      return [
        [`${of}return loss dB`, response.returnLossDb],
        [`${of}VSWR`, response.vswr],
        [`${of}mismatch loss dB`, response.mismatchLossDb],
        [`${of}transducer gain dB`, response.transducerGainDb],
        [`${of}reflection re`, response.gammaRe],
        [`${of}reflection im`, response.gammaIm],
      ] as const;
    });
  const quoted = (text: string): string => (/[",\r\n]/u.test(text) ? `"${text.replaceAll('"', '""')}"` : text);
  const head = ['frequency Hz', ...columns.map(([name]) => quoted(name))].join(',');
  const rows = first.frequencyHz.map((hz, k) => [hz, ...columns.map(([, values]) => values[k]!)].join(','));
  return `${[head, ...rows].join('\r\n')}\r\n`;
}
