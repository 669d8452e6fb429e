import { spawnSync } from 'node:child_process';
import { expect, test } from 'vitest';

test('a day that is not in the calendar is refused, and is not compared with the dates of lots', () => {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['src/commands/run.js', 'check', '--as-of', '2026-02-30'],
    { encoding: 'utf8' },
  );
  expect({ status, stdout, stderr }).toEqual({
    status: 1,
    stdout: '',
    stderr: '--as-of: "2026-02-30" is no date. Write it like 2026-12-01.\n',
  });
});
