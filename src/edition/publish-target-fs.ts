import { existsSync, statSync } from 'node:fs';
import { dirname, join, relative, resolve, sep } from 'node:path';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';
import { readEdition } from './read-edition-fs.ts';
import { mayBeReplaced } from './swap-fs.ts';

/** What speaks against putting the edition of a shop from one folder in the place of another. */
export function targetProblems(from: string, to: string, shop: string): readonly Problem[] {
  const at = (found: string, expected: string, advice = '') => [
    editionProblem({ file: to }, 'edition/target', { found, expected, advice }),
  ];
  const target = resolve(to);
  const parent = dirname(target);
  if (holds(target, resolve(from)) || holds(resolve(from), target)) {
    return at('the folder of the edition itself', 'another folder');
  }
  if (parent === target || !existsSync(parent)) {
    return at(
      parent === target ? 'the root of a disk' : 'a folder whose parent is not there',
      'a folder in one that is there',
      'is the disk mounted? on a stick give a folder on it, as /media/stick/handbook',
    );
  }
  if (!existsSync(target)) return [];
  if (!statSync(target).isDirectory()) return at('a file', 'a folder');
  if (statSync(target).dev !== statSync(parent).dev) {
    const advice = `give a folder on it, as ${join(to, 'handbook')}`;
    return at('the root of a disk', 'a folder that can be renamed', advice);
  }
  if (!mayBeReplaced({ current: target })) {
    return at('a folder with other things in it', 'no folder, an empty one, or a handbook');
  }
  const there = existsSync(join(target, 'edition.json')) ? readEdition(target) : null;
  if (there?.ok && there.edition.shop !== shop) {
    return [
      editionProblem({ file: to }, 'edition/edition-of-another-shop', {
        found: `an edition of "${there.edition.shop}"`,
        expected: `one of "${shop}", or nothing`,
        advice: 'give another folder',
      }),
    ];
  }
  return [];
}

/** Whether `inner` is `outer` or lies within it. */
function holds(outer: string, inner: string): boolean {
  const path = relative(outer, inner);
  return path === '' || !(path === '..' || path.startsWith(`..${sep}`) || resolve(path) === path);
}
