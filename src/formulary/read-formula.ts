import type { Root } from 'mdast';
import { type Place, parseYaml, type ReadYaml } from '../reference/yaml.ts';
import type { FormulaRule } from '../words/en/problems-formula.ts';
import type { Problem } from '../words/problem.ts';
import { amountNames } from './amount-names.ts';
import { assembleFormula } from './assemble.ts';
import { checkCharacters, checkReferences } from './checks/characters.ts';
import { checkDirectives } from './checks/directives.ts';
import { checkIds } from './checks/ids.ts';
import { checkLinks, type FormulaLink } from './checks/links.ts';
import { isShallow } from './checks/nesting.ts';
import { checkNumbers } from './checks/numbers.ts';
import { checkRecord } from './checks/record.ts';
import { checkShares } from './checks/shares.ts';
import { checkStages } from './checks/stages.ts';
import { checkStructure } from './checks/structure.ts';
import { checkWater } from './checks/water.ts';
import type { Formula } from './formula.ts';
import { splitFrontmatter } from './frontmatter.ts';
import type { Known } from './known.ts';
import { parseMethod } from './method.ts';
import { type Path, type Report, reportOn } from './report.ts';
import type { Frontmatter } from './schema.ts';
import { checkSchema } from './schema-problems.ts';

/**
 * A formula file as read by itself. `formula` is null where there is any error, and where it names a blend
 * while there are no data to say what is in it.
 */
export interface FormulaRead {
  readonly formula: Formula | null;
  /** In the order of the file. */
  readonly problems: readonly Problem[];
  /** The code as written, also where the formula is not sound: other files are held against it. */
  readonly code: { readonly text: string; readonly place: Place } | null;
  readonly links: readonly FormulaLink[];
}

const FAULT_RULES = {
  syntax: 'formula/yaml',
  tab: 'formula/tab',
  'duplicate-key': 'formula/repeated-key',
  anchor: 'formula/anchor',
  'hidden-character': 'formula/hidden-character',
} as const satisfies Record<ReadYaml['faults'][number]['kind'], FormulaRule>;

/**
 * Reads one formula file from its text and finds everything that is wrong with it. `file` is its name in
 * problems, `known` the ids of the data (`null` where the data cannot be read: ids are then not looked up),
 * `images` the picture files beside it. Never throws for anything in the text.
 */
export function readFormula(
  text: string,
  file: string,
  known: Known | null,
  images: ReadonlySet<string> = new Set(),
): FormulaRead {
  const parts = splitFrontmatter(text);
  if (!parts.ok) {
    const report = reportOn(file, NO_PLACES);
    report.at(parts.place, parts.rule, {
      found: parts.found,
      expected: 'frontmatter between two lines "---", then the text',
      advice: 'begin with a starter file: npm run new',
    });
    return { formula: null, problems: report.problems, code: null, links: [] };
  }
  const yaml = parseYaml(parts.yaml, { firstLine: parts.yamlLine });
  const report = reportOn(file, yaml);
  checkCharacters(text, report);
  const front = checkFrontmatter(yaml, known, report);
  let method: Root | null = null;
  let links: readonly FormulaLink[] = [];
  if (isShallow(parts.body, parts.bodyPlace, report)) {
    method = parseMethod(parts.body);
    checkReferences(method, parts.body, report);
    checkStructure(method, parts.bodyPlace, report);
    links = checkLinks(method, images, report);
    checkDirectives(method, front ? amountNames(front.value, known) : null, report);
  }
  const problems = report.problems.toSorted((a, b) => a.line - b.line || a.column - b.column);
  const code = front?.value.code;
  return {
    problems,
    links,
    code: typeof code === 'string' ? { text: code, place: yaml.placeOf(['code']) } : null,
    formula:
      front && method && problems.length === 0 && (known || !namesBlend(front.sound))
        ? assembleFormula(file, front.sound as Frontmatter, known?.blends ?? NO_BLENDS, {
            method,
            methodText: parts.bodyText,
            places: placesOf(yaml),
          })
        : null,
  };
}

const NO_BLENDS: Known['blends'] = new Map();
const namesBlend = ({ fats = [] }: Partial<Frontmatter>) =>
  fats.some(({ blend }) => blend !== undefined);

const NO_PLACES = {
  placeOf: () => ({ line: 1, column: 1 }),
  placeOfKey: () => ({ line: 1, column: 1 }),
};

function checkFrontmatter(yaml: ReadYaml, known: Known | null, report: Report) {
  for (const fault of yaml.faults) report.at(fault, FAULT_RULES[fault.kind], fault);
  if (yaml.faults.length > 0) return null;
  if (typeof yaml.value !== 'object' || yaml.value === null || Array.isArray(yaml.value)) {
    report.in([], 'formula/frontmatter-not-keys', {
      found: 'frontmatter that is not a list of keys',
      expected: 'lines as "name: Harbour Lamp"',
    });
    return null;
  }
  const value = yaml.value as Readonly<Record<string, unknown>>;
  const sound = checkSchema(value, report);
  checkNumbers(yaml, report);
  checkIds(value, known, report);
  checkShares(sound, report);
  checkWater(sound, report);
  checkStages(sound, report);
  checkRecord(sound, value, report);
  return { value, sound };
}

function placesOf({ value, placeOf }: ReadYaml): Formula['places'] {
  const places = new Map<string, Place>();
  const visit = (part: unknown, path: Path) => {
    if (path.length > 0) places.set(path.join('.'), placeOf(path));
    if (typeof part !== 'object' || part === null) return;
    for (const [key, inner] of Object.entries(part)) {
      visit(inner, [...path, Array.isArray(part) ? Number(key) : key]);
    }
  };
  visit(value, []);
  return places;
}
