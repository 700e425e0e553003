/** A file made to do harm: to hang, to fill the memory, to smuggle something in, or to be told in more than a line. */
export interface HostileFile {
  readonly what: string;
  /** File name, by whose ending it goes to a reader: .s1p, .s2p, .txt (a table), .csv (a stock list), .json (a record). */
  readonly name: string;
  readonly text: () => string;
}

const million = 1_000_000;
const touchstone = (lines: string): string => `# MHz S RI R 50\n${lines}`;
const stock = (lines: string): string => `name,kind,value\n${lines}`;
/** A record of nothing but what is given. */
const record = (fields: string): string => `{"schema":"ferrule-record/2",${fields}}`;

export const hostileFiles: readonly HostileFile[] = [
  // Touchstone
  {
    what: 'a picture',
    name: 'board.s1p',
    text: () => `\u0089PNG\r\n\u001a\n\u0000\u0000\u0000\rIHDR${'\u0000\u00ff'.repeat(million)}`,
  },
  {
    what: 'five million characters and no line end',
    name: 'long.s1p',
    text: () => `# MHz S RI R 50 ${'R'.repeat(5 * million)}`,
  },
  { what: 'a line of two million numbers', name: 'wide.s1p', text: () => touchstone('1 '.repeat(2 * million)) },
  { what: 'a million comments and no data', name: 'comments.s1p', text: () => '! nothing\n'.repeat(million) },
  { what: 'numbers beyond all bounds', name: 'huge.s1p', text: () => touchstone('100 1e400 0\n101 0 0\n') },
  { what: 'numbers that JavaScript alone reads', name: 'hex.s1p', text: () => touchstone('0x64 0.1 0\n101 0 0\n') },
  { what: 'NaN for a value', name: 'nan.s1p', text: () => touchstone('100 NaN 0\n101 0 0\n') },
  { what: 'an amplifier', name: 'active.s1p', text: () => touchstone('100 1.5 0\n101 0 0\n') },
  { what: 'a reference of nothing', name: 'zero.s1p', text: () => '# MHz S RI R 0\n100 0 0\n101 0 0\n' },
  {
    what: 'a thousand million frequencies announced',
    name: 'count.s1p',
    text: () =>
      '[Version] 2.0\n# MHz S RI R 50\n[Number of Ports] 1\n[Number of Frequencies] 999999999\n[Network Data]\n1 0 0\n2 0 0\n[End]\n',
  },
  { what: 'more ports than fit', name: 'ports.s99999999p', text: () => touchstone('1 0 0\n2 0 0\n') },
  {
    what: 'a keyword that rewrites the terminal',
    name: 'escape.s1p',
    text: () => '[\u001b[2J\u001b]0;owned\u0007\n]\n# MHz S RI R 50\n1 0 0\n2 0 0\n',
  },
  { what: 'a keyword without an end', name: 'bracket.s1p', text: () => `[${'['.repeat(5 * million)}` },
  {
    what: 'time running backwards after many samples',
    name: 'back.s1p',
    text: () => touchstone(Array.from({ length: 50_000 }, (_, k) => `${String(k + 1)} 0 0`).join('\n') + '\n1 0 0\n'),
  },
  // a table
  { what: 'a table of a single endless cell', name: 'cell.txt', text: () => `f/MHz R X\n${'1'.repeat(6 * million)}` },
  { what: 'a table of line ends of the other kind', name: 'ends.txt', text: () => `${'\u2028'.repeat(million)}#` },
  { what: 'a table of separators', name: 'separators.txt', text: () => `f/MHz R X\n${'\t;,'.repeat(million)}` },
  { what: 'a table of carriage returns', name: 'returns.txt', text: () => '\r'.repeat(2 * million) },
  { what: 'a table of blanks', name: 'blanks.txt', text: () => `f/MHz R X\n1${' '.repeat(4 * million)}x` },
  { what: 'a table of lone surrogates', name: 'surrogates.txt', text: () => 'f/MHz R X\n1 \ud800 \udfff\n' },
  { what: 'a table whose units are a riddle', name: 'units.txt', text: () => `f/${'MHz '.repeat(million)}\n1 2` },
  // a stock list
  { what: 'a quotation mark that never closes', name: 'quote.csv', text: () => stock(`"${'a,b\n'.repeat(million)}`) },
  { what: 'a list of a million parts', name: 'parts.csv', text: () => stock('L,inductor,1n\n'.repeat(million)) },
  {
    what: 'a list of nine thousand lines that are all wrong',
    name: 'wrong.csv',
    text: () => stock('x,y,z,w\n'.repeat(9_000)),
  },
  { what: 'a heading of a million columns', name: 'columns.csv', text: () => `${'name,'.repeat(million)}\n` },
  { what: 'a line of a million cells', name: 'cells.csv', text: () => stock(`L,inductor,1n${',x'.repeat(million)}\n`) },
  {
    what: 'a value of a million digits',
    name: 'digits.csv',
    text: () => stock(`L,inductor,${'9'.repeat(million)}n\n`),
  },
  { what: 'a list with NULs', name: 'nul.csv', text: () => stock('L\u0000,inductor,1n\n') },
  {
    what: 'a formula for a spreadsheet and a column called __proto__',
    name: 'proto.csv',
    text: () => 'name,kind,value,__proto__\n=cmd|calc,inductor,1n,x\n',
  },
  // a record
  {
    what: 'a hundred thousand lists within each other',
    name: 'deep.json',
    text: () => '['.repeat(100_000) + ']'.repeat(100_000),
  },
  {
    what: 'a hundred thousand objects within each other',
    name: 'deeper.json',
    text: () => '{"a":'.repeat(100_000) + '1' + '}'.repeat(100_000),
  },
  { what: 'a list that never ends', name: 'open.json', text: () => '['.repeat(2 * million) },
  { what: 'a million numbers where a record belongs', name: 'numbers.json', text: () => `[${'0,'.repeat(million)}0]` },
  {
    what: 'a hundred thousand unknown fields',
    name: 'fields.json',
    text: () => record(Array.from({ length: 100_000 }, (_, k) => `"x${String(k)}":0`).join(',')),
  },
  {
    what: 'ten thousand load states',
    name: 'loads.json',
    text: () => record(`"loads":[${'{"name":"","termination":{"r":-1,"x":0,"behaviour":"series"}},'.repeat(10_000)}0]`),
  },
  {
    what: 'a number beyond all bounds',
    name: 'infinite.json',
    text: () => record('"requirement":{"frequencyHz":1e400}'),
  },
  {
    what: 'a field called __proto__',
    name: 'proto.json',
    text: () => record('"__proto__":{"polluted":true},"constructor":{"prototype":{"polluted":true}}'),
  },
  { what: 'a field given twice', name: 'twice.json', text: () => record('"aim":"conjugate","aim":"reflectionless"') },
  {
    what: 'the same field a hundred thousand times',
    name: 'many.json',
    text: () => record(new Array<string>(100_000).fill('"aim":0').join(',')),
  },
  {
    what: 'a title of two million letters',
    name: 'title.json',
    text: () => record(`"identity":{"title":"${'A'.repeat(2 * million)}"}`),
  },
  {
    what: 'a title of lone surrogates and controls',
    name: 'letters.json',
    text: () => record('"identity":{"title":"\\ud800\\u0000\\u001b[2J"}'),
  },
  { what: 'a name with a line end in it', name: 'lines.json', text: () => record('"first\\nsecond\\u2028third":0') },
  { what: 'a string of a million quotation marks', name: 'marks.json', text: () => `"${'\\"'.repeat(million)}` },
  {
    what: 'a million backslashes',
    name: 'slashes.json',
    text: () => `{"${'\\\\'.repeat(million)}":"${'\\\\'.repeat(million / 4)}","a":1}`,
  },
  {
    what: 'a schema of tomorrow',
    name: 'tomorrow.json',
    text: () => '{"schema":"ferrule-record/999999999999999999999"}',
  },
  {
    what: "another program's schema",
    name: 'other.json',
    text: () => '{"schema":{"toString":1},"$ref":"http://example.com/"}',
  },
  {
    what: 'revisions within revisions',
    name: 'previous.json',
    text: () => `${'{"schema":"ferrule-record/2","previous":'.repeat(20_000)}null${'}'.repeat(20_000)}`,
  },
  { what: 'nothing', name: 'nothing.json', text: () => '' },
  { what: 'null', name: 'null.json', text: () => 'null' },
];
