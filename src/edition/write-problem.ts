import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';

/** What the file system's error codes mean to somebody who writes a file. */
const REASONS: Readonly<Record<string, readonly [found: string, advice: string]>> = {
  ENOSPC: ['a full disk', 'make room and run the command again'],
  EDQUOT: ['a full quota', 'make room and run the command again'],
  EFBIG: ['a file larger than the system allows', 'raise the limit and run the command again'],
  EROFS: ['a read-only disk', 'give a place that can be written'],
  EACCES: ['no permission to write', 'look at the permissions of the folder'],
  EPERM: ['no permission to write', 'look at the permissions of the folder'],
  ENOENT: ['a folder that is not there', 'make the folder first'],
  ENOTDIR: ['a file where a folder should be', 'give another place'],
  EBUSY: ['a file or folder in use', 'close what uses it and run the command again'],
};

/**
 * The problem of a file or folder that could not be written; what was there stands as it was.
 *
 * @throws the error itself where it is not one of the file system's.
 */
export function writeProblem(file: string, error: unknown): Problem {
  const code = error instanceof Error && 'code' in error ? String(error.code) : null;
  if (code === null) throw error;
  const [found, advice] = REASONS[code] ?? [`an error of the file system (${code})`, ''];
  return editionProblem({ file }, 'edition/cannot-write', {
    found,
    expected: 'a place to write to; what was there stands as it was',
    advice,
  });
}
