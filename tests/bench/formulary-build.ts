import { spawn } from 'node:child_process';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { performance } from 'node:perf_hooks';

/** Writes the most memory that a process held when it ends, for whoever started it. */
const WATCH = `import { writeFileSync } from 'node:fs';
process.on('exit', () => {
  writeFileSync(process.env.BENCH_MEMORY, String(process.resourceUsage().maxRSS));
});
`;

export interface Measured {
  /** From the start of the process to its end. [s] */
  readonly seconds: number;
  /** Most resident memory of the process, without the ones that it starts. [MB] */
  readonly megabytes: number;
  readonly output: string;
}

/** Runs a Node program in a process of its own. `scratch` is a folder for what watches it. */
export async function measureNode(
  cwd: string,
  args: readonly string[],
  scratch: string,
): Promise<Measured> {
  mkdirSync(scratch, { recursive: true });
  const watch = join(scratch, 'watch.mjs');
  const memory = join(scratch, 'memory.txt');
  writeFileSync(watch, WATCH);
  const start = performance.now();
  const child = spawn(process.execPath, ['--import', watch, ...args], {
    cwd,
    env: { ...process.env, BENCH_MEMORY: memory, ASTRO_TELEMETRY_DISABLED: '1' },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const said = { output: '', problems: '' };
  child.stdout.on('data', (text) => {
    said.output += text;
  });
  child.stderr.on('data', (text) => {
    said.problems += text;
  });
  const status = await new Promise((ended) => child.on('close', ended));
  const seconds = (performance.now() - start) / 1000;
  if (status !== 0) throw new Error(`${args[0]} ended with ${status}:\n${said.problems}`);
  const megabytes = Number(readFileSync(memory, 'utf8')) / 1024;
  return { seconds, megabytes, output: said.output };
}

/** The stages that a build printed, with their times [s]. */
export const stagesOf = (output: string): ReadonlyMap<string, number> =>
  new Map(
    [...output.matchAll(/^ {2}(\w+) +([\d.]+) s$/gm)].map(([, stage = '', seconds]) => [
      stage,
      Number(seconds),
    ]),
  );
