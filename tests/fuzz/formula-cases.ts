import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse, stringify } from 'yaml';
import { readFormulaFile } from '../../src/formulary/formulas-fs.ts';
import { knownFrom } from '../../src/formulary/known.ts';
import { type FormulaRead, readFormula } from '../../src/formulary/read-formula.ts';
import type { Chance } from '../support/chance.ts';
import { packagedReference } from '../support/packaged-reference.ts';
import { computedFaults } from './computed-faults.ts';
import { edgeFormula } from './edge-formula.ts';
import { PAYLOADS } from './hostile-values.ts';
import { mutateBytes } from './mutate-bytes.ts';
import { mutateValue } from './mutate-value.ts';
import { problemFaults } from './problem-faults.ts';
import type { Case } from './run.ts';

const reference = packagedReference();
const known = knownFrom(reference);
const ids = [known.fats, known.blends, known.additives, known.liquids, known.batches].flatMap(
  (map) => [...map.keys()],
);
const FILES = readdirSync('formulas')
  .filter((name) => name.endsWith('.md'))
  .map((name) => readFileSync(join('formulas', name)));
const PARTS = FILES.map((bytes) => {
  const [, front = '', body = ''] = bytes.toString('utf8').split(/^---$/m);
  return { front, body };
});
/** A formula of the demo with other values in its frontmatter: refused with a place in the file, or sound. */
export function otherValues(random: Chance): Case {
  const input = withOtherValues(random);
  return { faults: faultsOf(readFormula(input, 'a.md', known), input), input };
}

/** A formula at the edges of what is allowed: refused with a place in the file, or sound. */
export function edges(random: Chance): Case {
  const input = edgeFormula(known, random);
  return { faults: faultsOf(readFormula(input, 'a.md', known), input), input };
}

/** The same of a formula file whose bytes were damaged, written to `file` and read from there. */
export function otherBytes(random: Chance, file: string): Case {
  const bytes = mutateBytes(random.pick(FILES), random);
  writeFileSync(file, bytes);
  const input = bytes.toString('utf8');
  return { faults: faultsOf(readFormulaFile(file, known), input.replace(/^\uFEFF/, '')), input };
}

function faultsOf({ formula, problems }: FormulaRead, text: string): readonly string[] {
  if (!formula) {
    return problems.length === 0
      ? ['refused without a reason']
      : problems.flatMap((problem) => problemFaults(problem, text));
  }
  return computedFaults(formula, reference, text);
}

function withOtherValues(random: Chance): string {
  const { front, body } = random.pick(PARTS);
  const value: unknown = parse(front);
  mutateValue(value, random, ids);
  const written = random.pick([
    () => stringify(value, { lineWidth: 0 }),
    () => stringify(value, { collectionStyle: 'flow' }),
    () => JSON.stringify(value),
    () => escaped(JSON.stringify(value)),
    () => `${front}\n${stringify({ [random.pick(PAYLOADS)]: value })}`,
  ])();
  return `---\n${written.trim()}\n---\n${random.below(3) === 0 ? otherText(body, random) : body}`;
}

/** What is not plain ASCII written as escapes, which the eye passes over and YAML turns back. */
const escaped = (json: string) =>
  json.replace(/[^ -~]/g, (unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`);

function otherText(body: string, random: Chance): string {
  const at = random.below(body.length);
  const payload = random.pick(PAYLOADS);
  const piece = random.pick([payload, `\n\n${payload}\n\n`, ` :weight[${random.pick(ids)}] `]);
  return body.slice(0, at) + piece + body.slice(at);
}
