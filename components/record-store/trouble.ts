/** Why something isn't kept, in one line that says what to do. */
export function whyNotKept(error: unknown): string {
  const name = error instanceof Error ? error.name : '';
  if (name === 'QuotaExceededError') {
    return 'There is no room left to keep this: free space on the disk, or delete records that are no longer needed.';
  }
  if (refusals.has(name)) {
    return 'This browser keeps nothing here, as in a private window: download the record before you close it.';
  }
  return `This can’t be kept (${name === '' ? String(error) : name}): download the record before you close it.`;
}

/** What browsers answer where a site may keep nothing. */
const refusals = new Set(['SecurityError', 'InvalidStateError', 'NotAllowedError']);

/** What is typed isn't lost with it. */
export const stillHere = 'What you typed stays on this page and in its address.';
