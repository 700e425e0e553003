import type { Dossier } from '../../dossier.ts';
import type { Attachment } from '../attachments.ts';
import type { Block } from '../page/block.ts';
import { ceiling } from './ceiling.ts';
import { cautions, references } from './closing.ts';
import { changes } from './changes.ts';
import { contents } from './contents.ts';
import { dc } from './dc.ts';
import { deviations } from './deviations.ts';
import { files } from './files.ts';
import { finishedBoard } from './finished-board.ts';
import { history } from './history.ts';
import { network } from './network.ts';
import { options } from './options.ts';
import { assumptions, requirement } from './requirement.ts';
import { response } from './response.ts';
import { signOff } from './sign-off.ts';
import { stress } from './stress.ts';
import { terminations } from './terminations.ts';
import { titleBlock } from './title-block.ts';
import { tolerance } from './tolerance.ts';
import { verdict } from './verdict.ts';
import { bandwidth, verification } from './verification.ts';
import { winding } from './winding.ts';

/** The numbered parts that speak of the design, in their order. */
const ofDesign = [
  requirement,
  terminations,
  assumptions,
  ceiling,
  options,
  network,
  response,
  verification,
  bandwidth,
  tolerance,
  stress,
  dc,
  winding,
  finishedBoard,
  cautions,
  deviations,
  references,
];

/** A report from its title block to its sign-off, as content without places. */
export function blocks(dossier: Dossier, attached: readonly Attachment[]): readonly Block[] {
  const parts = [
    ...ofDesign.flatMap((part) => part(dossier)),
    ...files(attached),
    ...changes(dossier),
    ...history(dossier),
    ...signOff(dossier),
  ];
  return [...titleBlock(dossier), ...contents(dossier, parts), ...verdict(dossier), ...parts];
}
