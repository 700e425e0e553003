import { deflateSync } from 'node:zlib';
import { canonical, digestOf } from '../../../src/record/canonical.ts';
import { figuresFile, recordFile, type Attachment } from '../../../src/report/attachments.ts';
import { emptySeal, sealed } from '../../../src/report/pdf/seal.ts';
import { version } from '../../../src/version.ts';
import { container } from '../recheck/container.ts';
import { demo } from '../report/records.ts';

/** A PDF made to do harm, sealed by whoever made it where that takes it further in. */
export interface HostileReport {
  readonly what: string;
  readonly name: string;
  readonly bytes: () => Uint8Array | Promise<Uint8Array>;
}

const record = demo('tide-gauge');
const digest = digestOf(record);
const figures = figuresFile({ version, digest, record }, []);
const files = [recordFile(record), figures];

const zeros = (megabytes: number): Buffer => deflateSync(Buffer.alloc(megabytes * 1_000_000), { level: 1 });
const stream = (entries: string, content: Uint8Array): Buffer =>
  Buffer.concat([
    Buffer.from(`<< ${entries} /Length ${content.length} >>\nstream\n`),
    content,
    Buffer.from('\nendstream'),
  ]);

/** Objects as they are given, numbered from 2; the root is number 2. */
function raw(...objects: readonly (string | Buffer)[]): Uint8Array {
  const packet = Buffer.from(`<ferrule:digest>${digest}</ferrule:digest>${emptySeal}`);
  const id = `[<${digest.slice(0, 32)}> <${digest.slice(0, 32)}>]`;
  const all = [
    stream('/Type /Metadata', packet),
    ...objects,
    stream(`/Type /XRef /Root 2 0 R /ID ${id}`, Buffer.alloc(1)),
  ];
  const parts = all.flatMap((object, k) => [
    Buffer.from(`\n${k + 1} 0 obj\n`),
    Buffer.isBuffer(object) ? object : Buffer.from(object),
    Buffer.from('\nendobj'),
  ]);
  return sealed(Buffer.concat([Buffer.from('%PDF-1.7'), ...parts, Buffer.from('\nstartxref\n0\n%%EOF')]));
}

const catalog = (names: string): string => `<< /Type /Catalog /Names << /EmbeddedFiles << /Names ${names} >> >> >>`;
const both = '[(record.json) 3 0 R (figures.json) 4 0 R]';
const file = (number: number): string => `<< /EF << /F ${number} 0 R >> >>`;
const deflated = ({ text }: Attachment): Buffer => stream('/Filter /FlateDecode', deflateSync(text));
const packedObjects = (count: number, first: number, content: string): Buffer =>
  stream(`/Type /ObjStm /N ${count} /First ${first} /Filter /FlateDecode`, deflateSync(content));

export const hostileReports: readonly HostileReport[] = [
  {
    what: 'a record that unpacks to 200 MB',
    name: 'bomb.pdf',
    bytes: () => raw(catalog(both), file(5), file(6), stream('/Filter /FlateDecode', zeros(200)), deflated(files[1]!)),
  },
  {
    what: 'objects that unpack to 100 MB',
    name: 'packed.pdf',
    bytes: () => raw(catalog(both), stream('/Type /ObjStm /N 1 /First 4 /Filter /FlateDecode', zeros(100))),
  },
  {
    what: 'a bomb in a bomb',
    name: 'twice.pdf',
    bytes: () =>
      raw(catalog(both), file(5), file(6), stream('/Filter [/FlateDecode /FlateDecode]', deflateSync(zeros(100)))),
  },
  {
    what: 'a hundred small bombs',
    name: 'bombs.pdf',
    bytes: () => raw(catalog(both), ...new Array<Buffer>(100).fill(packedObjects(0, 0, ' '.repeat(7_000_000)))),
  },
  {
    what: 'objects that refer to themselves',
    name: 'loop.pdf',
    bytes: () => raw('<< /Type /Catalog /Names 2 0 R /EmbeddedFiles 2 0 R >>', '3 0 R', '4 0 R'),
  },
  {
    what: 'names that go round in a circle',
    name: 'kids.pdf',
    bytes: () => raw('<< /Names << /EmbeddedFiles 3 0 R >> >>', '<< /Kids [3 0 R] >>'),
  },
  {
    what: 'a hundred thousand lists within each other',
    name: 'deep.pdf',
    bytes: () => raw('['.repeat(100_000) + ']'.repeat(100_000)),
  },
  {
    what: 'a hundred thousand dictionaries that never end',
    name: 'deeper.pdf',
    bytes: () => raw('<</A '.repeat(100_000)),
  },
  {
    what: 'ten thousand attached files',
    name: 'files.pdf',
    bytes: () => raw(catalog(`[${'(record.json) 3 0 R '.repeat(10_000)}]`), file(4), deflated(files[0]!)),
  },
  {
    what: 'three million numbers',
    name: 'numbers.pdf',
    bytes: () => raw(`[${'1 '.repeat(3_000_000)}]`),
  },
  {
    what: 'a hundred thousand objects',
    name: 'objects.pdf',
    bytes: () => raw(...new Array<string>(100_000).fill('1')),
  },
  {
    what: 'ten thousand objects that are all the same eight million characters',
    name: 'overlaid.pdf',
    bytes: () => {
      const head = Array.from({ length: 10_000 }, (_, k) => `${k + 10} 0`).join(' ');
      return raw(catalog(both), packedObjects(10_000, head.length + 1, `${head} (${'a'.repeat(7_000_000)})`));
    },
  },
  {
    what: 'ten thousand objects behind the same blanks',
    name: 'blanks.pdf',
    bytes: () => {
      const head = Array.from({ length: 10_000 }, (_, k) => `${k + 10} 0`).join(' ');
      return raw(catalog(both), packedObjects(10_000, head.length + 1, `${head} ${' '.repeat(7_000_000)}1`));
    },
  },
  {
    what: 'a stream longer than the file',
    name: 'longer.pdf',
    bytes: () => raw('<< /Length 999999999999 >>\nstream\nx\nendstream'),
  },
  {
    what: 'a stream of less than nothing',
    name: 'backwards.pdf',
    bytes: () => raw('<< /Length -400 >>\nstream\nx\nendstream'),
  },
  {
    what: 'nineteen million parentheses',
    name: 'open.pdf',
    bytes: () => raw('('.repeat(19_000_000)),
  },
  {
    what: 'half a million signs of less',
    name: 'less.pdf',
    bytes: () => raw(`[${'<0'.repeat(500_000)}`),
  },
  {
    what: 'nineteen million bytes that all but begin a seal',
    name: 'seals.pdf',
    bytes: () => Buffer.from(`%PDF-1.7\n${'<ferrule:sea'.repeat(1_580_000)}`),
  },
  {
    what: 'a million places for a seal',
    name: 'places.pdf',
    bytes: () => Buffer.from(`%PDF-1.7\n${'<ferrule:seal>'.repeat(1_000_000)}`),
  },
  {
    what: 'a seal of more bytes than any disk holds',
    name: 'length.pdf',
    bytes: () => Buffer.from(`%PDF-1.7\n${emptySeal.replace('0000000000', '9999999999')}`),
  },
  {
    what: 'a million objects added by somebody',
    name: 'added.pdf',
    bytes: async () => Buffer.concat([await container(files, digest), Buffer.from('\n1 0 obj 1'.repeat(1_000_000))]),
  },
  {
    what: 'a bomb added by somebody',
    name: 'signed.pdf',
    bytes: async () =>
      Buffer.concat([
        await container(files, digest),
        Buffer.from('\n99 0 obj\n'),
        stream('/Type /ObjStm /N 1 /First 4 /Filter /FlateDecode', zeros(100)),
        Buffer.from('\nendobj\n'),
      ]),
  },
  {
    what: 'figures without end',
    name: 'figures.pdf',
    bytes: () =>
      container(
        [
          files[0]!,
          {
            ...figures,
            text: figures.text.replace(
              '[',
              `[${new Array<string>(200_000).fill('{"name":"","value":0,"unit":""}').join()}`,
            ),
          },
        ],
        digest,
      ),
  },
  {
    what: 'lists within lists where figures belong',
    name: 'nested.pdf',
    bytes: () => container([files[0]!, { ...figures, text: figures.text.replace('[', '['.repeat(1_000_000)) }], digest),
  },
  {
    what: 'a forged digest and a record that goes with it',
    name: 'forged.pdf',
    bytes: () =>
      container([files[0]!, { ...figures, text: figures.text.replaceAll(digest, 'a'.repeat(64)) }], 'a'.repeat(64)),
  },
  {
    what: 'a record of another design',
    name: 'other.pdf',
    bytes: () => container([{ ...files[0]!, text: canonical(demo('power-stage')) }, figures], digest),
  },
];
