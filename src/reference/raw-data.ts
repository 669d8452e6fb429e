import type { z } from 'zod';
import { languageOf } from '../words/languages.ts';
import type { Problem } from '../words/problem.ts';
import { DATA_LANGUAGE, type DataFile, languageFile } from './data-files.ts';
import type { AlkaliRecord } from './material-records.ts';
import { type OpenedFile, openFile } from './open-file.ts';
import { dataProblem } from './report.ts';
import { blendsSchema } from './schema/blends.ts';
import { cautionsSchema } from './schema/cautions.ts';
import {
  acidsSchema,
  additivesSchema,
  alkaliSchema,
  elementsSchema,
  liquidsSchema,
} from './schema/chemicals.ts';
import { fatSchema, type RawFat } from './schema/fat.ts';
import { languageSchema } from './schema/language.ts';
import { lotsSchema } from './schema/lots.ts';
import { shopSchema } from './schema/shop.ts';
import { soapGradesSchema } from './schema/soap-grades.ts';
import { sourcesSchema } from './schema/sources.ts';
import { type RawTable, tableSchema } from './schema/table.ts';
import { TABLES, type TableName } from './tables.ts';

export const ALKALIS = [
  'sodium-hydroxide',
  'potassium-hydroxide',
] as const satisfies readonly AlkaliRecord['id'][];

/** What one file may be at this stage: read and in its form, or not (and its problems are told). */
type Raw<S extends z.ZodType> = OpenedFile<z.infer<S>> | null;

/** Every data file by itself, before anything is looked up across files. */
export interface RawData {
  readonly sources: Raw<typeof sourcesSchema>;
  /** `undefined` where the shop has no sources beside the packaged ones. */
  readonly ownSources: Raw<typeof sourcesSchema> | undefined;
  readonly elements: Raw<typeof elementsSchema>;
  readonly acids: Raw<typeof acidsSchema>;
  readonly additives: Raw<typeof additivesSchema>;
  readonly liquids: Raw<typeof liquidsSchema>;
  readonly cautions: Raw<typeof cautionsSchema>;
  readonly soapGrades: Raw<typeof soapGradesSchema>;
  readonly shop: Raw<typeof shopSchema>;
  /** `undefined` where the shop speaks the language that the packaged data are written in. */
  readonly language: Raw<typeof languageSchema> | undefined;
  /** `undefined` where the shop keeps no lots. */
  readonly lots: Raw<typeof lotsSchema> | undefined;
  /** `undefined` where the shop keeps no blends. */
  readonly blends: Raw<typeof blendsSchema> | undefined;
  readonly alkalis: readonly {
    readonly id: AlkaliRecord['id'];
    readonly opened: Raw<typeof alkaliSchema>;
  }[];
  readonly tables: Readonly<Record<TableName, OpenedFile<RawTable> | null>>;
  readonly fats: readonly {
    readonly id: string;
    readonly file: string;
    readonly opened: OpenedFile<RawFat> | null;
  }[];
  /** All that could be opened, for checks that look at every file. */
  readonly opened: readonly OpenedFile<unknown>[];
}

/** Opens every file with its schema. `folder` names the place of files that are missing; `locale` as `referenceFrom`. */
export function openAll(
  files: readonly DataFile[],
  {
    folder,
    locale,
    problems,
  }: {
    readonly folder: string;
    readonly locale: string | null;
    readonly problems: Problem[];
  },
): RawData {
  const byName = new Map(files.map((file) => [file.name, file]));
  const opened: OpenedFile<unknown>[] = [];
  const open = <T>(name: string, schema: z.ZodType<T>): OpenedFile<T> | null => {
    const file = byName.get(name);
    if (!file) {
      problems.push(
        dataProblem(`${folder}/${name}`, { line: 1, column: 1 }, 'data/missing-file', {
          found: 'no such file',
          expected: `"${name}" in the data folder`,
          advice: 'put it back, or copy the packaged one',
        }),
      );
      return null;
    }
    const result = openFile(file, schema, problems);
    if (result) opened.push(result);
    return result;
  };
  const shop = open('shop.yaml', shopSchema);
  const language = languageOf(locale ?? shop?.value.locale ?? DATA_LANGUAGE);
  return {
    sources: open('sources.yaml', sourcesSchema),
    ownSources: byName.has('own-sources.yaml')
      ? open('own-sources.yaml', sourcesSchema)
      : undefined,
    elements: open('elements.yaml', elementsSchema),
    acids: open('acids.yaml', acidsSchema),
    additives: open('additives.yaml', additivesSchema),
    liquids: open('liquids.yaml', liquidsSchema),
    cautions: open('cautions.yaml', cautionsSchema),
    soapGrades: open('soap-grades.yaml', soapGradesSchema),
    shop,
    language: language === DATA_LANGUAGE ? undefined : open(languageFile(language), languageSchema),
    lots: byName.has('lots.yaml') ? open('lots.yaml', lotsSchema) : undefined,
    blends: byName.has('blends.yaml') ? open('blends.yaml', blendsSchema) : undefined,
    alkalis: ALKALIS.map((id) => ({ id, opened: open(`alkalis/${id}.yaml`, alkaliSchema) })),
    tables: Object.fromEntries(
      Object.keys(TABLES).map((name) => [name, open(`tables/${name}.yaml`, tableSchema)]),
    ) as RawData['tables'],
    fats: files
      .filter(({ name }) => name.startsWith('fats/'))
      .map(({ name, file }) => ({
        id: name.slice('fats/'.length, -'.yaml'.length),
        file,
        opened: open(name, fatSchema),
      })),
    opened,
  };
}
