import type { Arm } from '../network/arm.ts';
import { dcPath } from '../network/dc-path.ts';

type End = 'source' | 'load';
const ends: readonly End[] = ['source', 'load'];

export interface DcRequirement {
  /** Ends that carry DC, which the network must not short to ground. */
  readonly keepDc: 'none' | End | 'both';
  /** DC must be blocked between source and load. */
  readonly blockDc: boolean;
}

/**
 * What direct current does in a network, which of its parts could serve the bias too, and where that is at odds with
 * what is required; in sentences.
 *
 * @param arms        source side first
 * @param designators in their order
 */
export function biasWords(
  arms: readonly Omit<Arm, 'value'>[],
  designators: readonly string[],
  { keepDc, blockDc }: DcRequirement,
): string[] {
  const { blocked, sourceShorted, loadShorted } = dcPath(arms);
  const shorted = { source: sourceShorted, load: loadShorted };
  const shorts = {
    source: shortsFrom(arms, designators),
    load: shortsFrom(arms.toReversed(), designators.toReversed()),
  };
  const blocks = designators.filter((_, k) => arms[k]?.arm === 'series' && arms[k].part === 'capacitor');
  const nearest = { source: blocks[0], load: blocks[blocks.length - 1] };
  const words: string[] = [];

  if (!blocked && !sourceShorted) {
    words.push('No part blocks DC or shorts it to ground: DC passes from source to load.');
  } else if (!blocked) {
    words.push(`DC at the source and at the load: shorted to ground by ${list(shorts.source)}.`);
  } else {
    for (const end of ends) {
      words.push(
        shorted[end]
          ? `DC at the ${end}: shorted to ground by ${list(shorts[end])}.`
          : `DC at the ${end}: open, ends at ${nearest[end]!}.`,
      );
    }
  }

  if (!blocked && sourceShorted) words.push(feedWords(shorts.source, 'both ends'));
  else for (const end of ends) if (shorted[end]) words.push(feedWords(shorts[end], `the ${end}`));

  if (blocked) words.push(blockWords(blocks));

  for (const end of ends) {
    if (shorted[end] && (keepDc === end || keepDc === 'both')) {
      words.push(
        `Conflict: the ${end} carries DC, and ${list(shorts[end])} would short it, unless bypassed to ground by a capacitor instead of grounded.`,
      );
    }
  }
  if (blockDc && !blocked) {
    words.push(
      'Conflict: DC must be blocked, and no series capacitor does it; a separate blocking capacitor is needed.',
    );
  }
  return words;
}

/** Shunt inductors that DC reaches from the first arm's side before a series capacitor. */
function shortsFrom(arms: readonly Omit<Arm, 'value'>[], designators: readonly string[]): readonly string[] {
  const block = arms.findIndex(({ arm, part }) => arm === 'series' && part === 'capacitor');
  return designators.filter(
    (_, k) => (block < 0 || k < block) && arms[k]?.arm === 'shunt' && arms[k].part === 'inductor',
  );
}

/** Every short that is left grounded would carry the feed away, so that all are bypassed and any one feeds. */
function feedWords(shorts: readonly string[], to: string): string {
  return shorts.length === 1
    ? `${shorts[0]!} could carry the bias feed to ${to} if its cold end is bypassed to ground instead of grounded: no separate choke.`
    : `${list(shorts, 'or')} could carry the bias feed to ${to} if the cold ends of ${list(shorts)} are bypassed to ground instead of grounded: no separate choke.`;
}

const blockWords = (blocks: readonly string[]): string =>
  blocks.length === 1
    ? `${blocks[0]!} serves as the block between source and load: no separate blocking capacitor.`
    : `${list(blocks)} each serve as a block between source and load: no separate blocking capacitor.`;

/** "L1", "L1 and L2", "L1, L2 and L3" */
function list(names: readonly string[], word: 'and' | 'or' = 'and'): string {
  const last = names[names.length - 1]!;
  return names.length === 1 ? last : `${names.slice(0, -1).join(', ')} ${word} ${last}`;
}
