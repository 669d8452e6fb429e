import { parseArgs } from 'node:util';
import { didYouMean } from '../reference/nearest.ts';

/** One option: `value` names what it takes (`DIR`), `null` makes it a switch. */
export interface Option {
  readonly value: string | null;
  readonly about: string;
}

/** What a command takes. `files` names its further arguments and how many there may be. */
export interface Usage<Name extends string> {
  readonly command: string;
  readonly about: string;
  readonly options: Readonly<Record<Name, Option>>;
  readonly files?: { readonly name: string; readonly least: number; readonly most: number };
}

export type Arguments<Name extends string> =
  | {
      readonly ok: true;
      /** Given options; a switch that is set is `''`. */
      readonly given: Readonly<Partial<Record<Name, string>>>;
      readonly files: readonly string[];
    }
  /** What to print and the status to end with: help that was asked for is no failure. */
  | { readonly ok: false; readonly text: string; readonly status: 0 | 1 };

/** Options that most commands share. */
export const FOLDERS = {
  formulas: { value: 'DIR', about: 'folder of formula files (formulas)' },
  data: { value: 'DIR', about: "the shop's data, over the reference data (data)" },
} as const satisfies Record<string, Option>;

const NO_FILES = { name: '', least: 0, most: 0 };

/** Reads the arguments of a command. Never prints and never throws. */
export function readArguments<Name extends string>(
  args: readonly string[],
  usage: Usage<Name>,
): Arguments<Name> {
  const { options, files: { name, least, most } = NO_FILES } = usage;
  const refuse = (text: string): Arguments<Name> => ({
    ok: false,
    text: `${text}\n\n${help(usage)}`,
    status: 1,
  });
  const { tokens } = parseArgs({
    args: [...args],
    options: Object.fromEntries(
      Object.entries<Option>(options).map(([option, { value }]) => [
        option,
        { type: value === null ? ('boolean' as const) : ('string' as const) },
      ]),
    ),
    strict: false,
    allowPositionals: true,
    tokens: true,
  });
  const given: Partial<Record<Name, string>> = {};
  const files: string[] = [];
  for (const token of tokens) {
    if (token.kind === 'positional') files.push(token.value);
    if (token.kind !== 'option') continue;
    if (token.name === 'help' || token.rawName === '-h') {
      return { ok: false, text: help(usage), status: 0 };
    }
    if (!Object.hasOwn(options, token.name)) {
      const near = didYouMean(token.name, Object.keys(options), '');
      return refuse(`There is no option ${token.rawName}${near === '' ? '.' : `; ${near}`}`);
    }
    const { value } = options[token.name as Name];
    if (value !== null && !token.value) return refuse(`${token.rawName} needs a value, ${value}.`);
    if (value === null && token.value !== undefined) {
      return refuse(`${token.rawName} takes no value.`);
    }
    if (given[token.name as Name] !== undefined) return refuse(`${token.rawName} is given twice.`);
    given[token.name as Name] = token.value ?? '';
  }
  if (files.length < least) return refuse(`${name} is missing.`);
  if (files.length > most) return refuse(`"${files[most]}" is one argument too many.`);
  return { ok: true, given, files };
}

function help<Name extends string>({ command, about, options, files }: Usage<Name>): string {
  const lines = Object.entries<Option>(options).map(([option, { value, about }]) => {
    const form = `--${option}${value === null ? '' : ` ${value}`}`;
    return `  ${form.padEnd(18)} ${about}`;
  });
  const more = files ? ` ${files.name}` : '';
  return [`npm run ${command} --${more} [options]`, about, '', ...lines].join('\n');
}
