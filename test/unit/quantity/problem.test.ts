import { describe, expect, it } from 'vitest';
import { formatProblem, InputError } from '../../../src/quantity/problem.ts';

const problem = { field: 'load', read: 'abc', why: 'not an impedance', would: 'write it as 9.4-j61' };

describe('formatProblem(problem)', () => {
  it('says what was read, why it will not do and what would', () => {
    expect(formatProblem(problem)).toBe('load "abc": not an impedance; write it as 9.4-j61');
  });

  it('shows no quotes where nothing was read', () => {
    expect(formatProblem({ ...problem, read: '' })).toBe('load: not an impedance; write it as 9.4-j61');
  });

  it('cuts what is long, between characters', () => {
    const line = formatProblem({ ...problem, read: `${'x'.repeat(59)}😀 and more` });
    expect(line).toMatch(/^load "x{59}\uFFFD?…": not/);
    expect(line.isWellFormed()).toBe(true);
  });

  it('looks at no more of a whole file than it shows', () => {
    expect(formatProblem({ ...problem, read: ' '.repeat(10_000) + 'x' })).toBe(
      'load "…": not an impedance; write it as 9.4-j61',
    );
    expect(formatProblem({ ...problem, read: 'a\n'.repeat(10_000) })).toMatch(/^load "(a ){30}…": not/u);
  });

  it('shows half a character as one that is missing', () => {
    expect(formatProblem({ ...problem, read: 'a\ud83d' })).toContain('"a\ufffd"');
  });

  it.each(['field', 'read', 'why'] as const)(
    'keeps control characters and new lines of the %s off the line',
    (part) => {
      const line = formatProblem({ ...problem, [part]: 'a\nb\u001b[31m\u0085\u2028c' });
      expect(line).toContain('a b [31m c');
      expect(line).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]/u);
    },
  );

  it.each(['field', 'why'] as const)('cuts a %s that quotes at length', (part) => {
    expect(formatProblem({ ...problem, [part]: 'x'.repeat(10_000) }).length).toBeLessThan(300);
  });
});

describe('InputError(...problems)', () => {
  it('carries its problems and tells them all in its message', () => {
    const error = new InputError(problem, { ...problem, field: 'source' });
    expect(error.problems).toHaveLength(2);
    expect(error.message).toBe(`${formatProblem(problem)} | ${formatProblem({ ...problem, field: 'source' })}`);
    expect(error.name).toBe('InputError');
  });
});
