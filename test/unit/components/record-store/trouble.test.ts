import { describe, expect, it } from 'vitest';
import { whyNotKept } from '../../../../components/record-store/trouble.ts';

describe('whyNotKept(error)', () => {
  it.each([
    ['QuotaExceededError', /^There is no room left/],
    ['SecurityError', /as in a private window/],
    ['UnknownError', /^This can’t be kept \(UnknownError\): download the record/],
  ])('%s: one line that says what to do', (name, words) => {
    expect(whyNotKept(new DOMException('why', name))).toMatch(words);
    expect(whyNotKept(new DOMException('why', name))).not.toMatch(/\n/);
  });
});
