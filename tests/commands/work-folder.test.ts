import { mkdirSync, mkdtempSync, readdirSync, rmSync, statSync, utimesSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { basename, join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { workFolder } from '../../src/commands/work-folder.ts';

const project = mkdtempSync(join(tmpdir(), 'project-'));
afterAll(() => rmSync(project, { recursive: true, force: true }));

test('what a killed build has left goes after a day, and a build at work is left alone', () => {
  const killed = workFolder(project);
  const atWork = workFolder(project);
  mkdirSync(join(project, '.cache/cards'));
  const longAgo = new Date(Date.now() - 25 * 60 * 60 * 1000);
  for (const path of [killed, join(project, '.cache/cards')]) utimesSync(path, longAgo, longAgo);
  const next = workFolder(project);
  expect(readdirSync(join(project, '.cache')).sort()).toEqual(
    ['cards', basename(atWork), basename(next)].sort(),
  );
});

test('a handbook is as readable as any folder that the user makes', () => {
  const usual = join(project, 'usual');
  mkdirSync(usual);
  expect(statSync(workFolder(project)).mode).toBe(statSync(usual).mode);
});
