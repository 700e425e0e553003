import { changeGroups, type Change, type ChangeGroup } from '../record/change.ts';
import { markdownCell } from './markdown.ts';
import { alignedRows } from './aligned-rows.ts';

const nothing = 'Nothing changed.\n';

/** Changes as plain text for a ticket: a heading for each group, three aligned columns, lines below 100 letters. */
export function differenceText(changes: readonly Change[]): string {
  if (changes.length === 0) return nothing;
  return groupsOf(changes)
    .map(({ group, of }) => {
      const rows = of.map(({ what, before, after }) => [what, before, '->', after]);
      return `${titleOf(group)}\n${alignedRows(rows, [26, 31, 2, 31], '  ')}`;
    })
    .join('\n');
}

/** The same in Markdown: a table for each group. */
export function differenceMarkdown(changes: readonly Change[]): string {
  if (changes.length === 0) return nothing;
  return groupsOf(changes)
    .map(({ group, of }) => {
      const rows = of.map(({ what, before, after }) => `| ${[what, before, after].map(markdownCell).join(' | ')} |`);
      return [`### ${titleOf(group)}`, '', '| What | Before | After |', '| --- | --- | --- |', ...rows, ''].join('\n');
    })
    .join('\n');
}

const groupsOf = (changes: readonly Change[]) =>
  changeGroups
    .map((group) => ({ group, of: changes.filter((change) => change.group === group) }))
    .filter(({ of }) => of.length > 0);

const titleOf = (group: ChangeGroup): string => group.charAt(0).toUpperCase() + group.slice(1);
