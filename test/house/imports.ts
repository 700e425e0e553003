import { globSync, readFileSync } from 'node:fs';
import { posix } from 'node:path';
import ts from 'typescript';

const root = new URL('../..', import.meta.url);

/** One import statement: `from` is a path in the project; `to` too when it is relative, else a package's name. */
export interface Import {
  readonly from: string;
  readonly to: string;
}

/** Paths from the project's root, with forward slashes. */
export function sourceFiles(): readonly string[] {
  return globSync('{src,components}/**/*.{ts,mjs,astro,css}', { cwd: root })
    .map((path) => path.replaceAll('\\', '/'))
    .sort();
}

/** Imports of types count like any other: what a folder must know of is what it depends on. */
export function importsIn(file: string): readonly Import[] {
  if (file.endsWith('.css')) return [];
  const text = readFileSync(new URL(file, root), 'utf8');
  const code = file.endsWith('.astro') ? scriptsOf(text) : text;
  return ts
    .preProcessFile(code, true, true)
    .importedFiles.map(({ fileName }) => fileName.replace(/\?.*$/, ''))
    .map((to) => ({ from: file, to: to.startsWith('.') ? posix.join(posix.dirname(file), to) : to }));
}

/** An Astro file's code: what stands between the fences at its head and in its script elements. */
function scriptsOf(text: string): string {
  const head = /^---\n([\s\S]*?)\n---/.exec(text)?.[1] ?? '';
  const scripts = [...text.matchAll(/<script\b[^>]*>([\s\S]*?)<\/script>/g)].map((match) => match[1]);
  return [head, ...scripts].join('\n');
}

/** Every cycle found from a depth-first walk, as the files on it in order, the first one repeated at the end. */
export function cyclesIn(imports: readonly Import[]): readonly (readonly string[])[] {
  const next = new Map<string, string[]>();
  for (const { from, to } of imports) next.set(from, [...(next.get(from) ?? []), to]);
  const done = new Set<string>();
  const cycles: string[][] = [];
  const walk = (file: string, path: readonly string[]): void => {
    const start = path.indexOf(file);
    if (start >= 0) cycles.push([...path.slice(start), file]);
    if (start >= 0 || done.has(file)) return;
    for (const to of next.get(file) ?? []) walk(to, [...path, file]);
    done.add(file);
  };
  for (const file of next.keys()) walk(file, []);
  return cycles;
}
