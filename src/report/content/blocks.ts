import type { Dossier } from '../../dossier.ts';
import type { Block } from '../page/block.ts';
import { ceiling } from './ceiling.ts';
import { cautions, references, signOff } from './closing.ts';
import { network } from './network.ts';
import { options } from './options.ts';
import { assumptions, requirement } from './requirement.ts';
import { response } from './response.ts';
import { terminations } from './terminations.ts';
import { titleBlock } from './title-block.ts';
import { verdict } from './verdict.ts';
import { bandwidth, verification } from './verification.ts';

const inOrder = [
  titleBlock,
  verdict,
  requirement,
  terminations,
  assumptions,
  ceiling,
  options,
  network,
  response,
  verification,
  bandwidth,
  cautions,
  references,
  signOff,
];

/** A report from its title block to its sign-off, as content without places. */
export const blocks = (dossier: Dossier): readonly Block[] => inOrder.flatMap((part) => part(dossier));
