import { describe, expect, it } from 'vitest';
import { cyclesIn, importsIn, sourceFiles } from './imports.ts';

/**
 * The house from top to bottom: a floor imports from itself and from those above it. Rooms on one floor don't know
 * each other.
 */
const floors = [
  ['src/version.ts'],
  ['src/quantity/'],
  ['src/measured/'],
  ['src/network/'],
  ['src/synthesis/'],
  ['src/parts/'],
  ['src/evidence/'],
  ['src/record/'],
  ['src/dossier.ts'],
  ['src/design/'],
  ['src/design.ts'],
  ['src/figures/'],
  ['src/report/'],
  ['src/recheck/'],
  ['src/cli/', 'src/workers/', 'src/styles/'],
  ['components/'],
  ['src/layouts/'],
  ['src/pages/'],
];

/** Packages that only one part of the house knows. */
const keepers = [
  { packages: /^node:/, room: /^src\/cli\// },
  { packages: /^(pdf-lib|@pdf-lib\/)/, room: /^src\/report\// },
  { packages: /^lit\b/, room: /^components\// },
  { packages: /^astro\b/, room: /^src\/(layouts|pages)\// },
];

const files = sourceFiles();
const imports = files.flatMap(importsIn);
const roomOf = (path: string) => floors.flat().find((room) => path.startsWith(room));
const floorOf = (room: string) => floors.findIndex((rooms) => rooms.includes(room));
const inHouse = (path: string) => roomOf(path) !== undefined;

describe('the house', () => {
  it('has a room for every file', () => {
    expect(files.filter((file) => !inHouse(file))).toEqual([]);
  });

  it('imports only downwards', () => {
    const upward = imports.filter(({ from, to }) => {
      const [here, there] = [roomOf(from), roomOf(to)];
      if (here === undefined || there === undefined || here === there) return false;
      return floorOf(there) >= floorOf(here);
    });
    expect(upward).toEqual([]);
  });

  it('has no import cycle', () => {
    expect(cyclesIn(imports)).toEqual([]);
  });

  it.each(keepers)('imports $packages only in $room', ({ packages, room }) => {
    expect(imports.filter(({ from, to }) => packages.test(to) && !room.test(from))).toEqual([]);
  });
});

describe('cyclesIn(imports)', () => {
  it('names the files of a cycle in order', () => {
    const ring = [
      { from: 'a', to: 'b' },
      { from: 'b', to: 'c' },
      { from: 'c', to: 'b' },
    ];
    expect(cyclesIn(ring)).toEqual([['b', 'c', 'b']]);
  });

  it('finds none where two ways lead to one file', () => {
    const diamond = [
      { from: 'a', to: 'b' },
      { from: 'a', to: 'c' },
      { from: 'b', to: 'd' },
      { from: 'c', to: 'd' },
    ];
    expect(cyclesIn(diamond)).toEqual([]);
  });
});
