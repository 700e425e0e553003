import type { Option } from '../../src/dossier.ts';

/** "3 of 12 networks worked out with real parts", and what the figures of the others are. */
export function progressWords(
  options: readonly Pick<Option, 'built'>[],
  realParts: 'at work' | 'stopped' | 'whole',
): string {
  const done = options.filter(({ built }) => built !== null).length;
  const all = options.length;
  if (all === 0) return 'There is no network to work out with real parts.';
  const networks = all === 1 ? 'network' : 'networks';
  if (realParts === 'whole')
    return `${all === 1 ? 'The' : `All ${String(all)}`} ${networks} worked out with real parts`;
  const far = `${String(done)} of ${String(all)} ${networks} worked out with real parts`;
  return realParts === 'stopped' ? `Stopped: ${far}; figures of the others are of exact values` : `${far}…`;
}
