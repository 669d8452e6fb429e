import type { Formulary } from '../../formulary/formulary.ts';
import type { Prices } from '../../reference/prices-fs.ts';
import type { FinderData, Property } from '../../search/finder/finder-data.ts';
import { words } from '../../words/catalogue.ts';
import { costProperty } from './cost-property.ts';
import { traitsOf } from './finder-traits.ts';
import { NUMBER_PROPERTIES } from './number-properties.ts';

/** Acids below this in every formula are traces of the standards' ranges. [percent of the fatty acids] */
const LEAST_ACID = 0.5;

/** All that the finder knows of a formulary. Cost is in it only where prices are handed in. */
export function finderData(formulary: Formulary, prices: Prices | null): FinderData {
  const { formulas } = formulary;
  const properties = NUMBER_PROPERTIES.map(
    ({ id, group, format, decimals, value }): Property => ({
      id,
      name: words.findWords.properties[id][0],
      unit: words.findWords.properties[id][1],
      group: words.findWords.groups[group],
      format,
      decimals,
      values: formulas.map((computed) => rounded(value(computed), decimals)),
    }),
  );
  return {
    codes: formulas.map(({ document }) => document.code),
    names: formulas.map(({ document }) => document.name),
    properties: [
      ...properties,
      ...acidProperties(formulary),
      ...(prices ? [costProperty(formulary, prices)] : []),
    ],
    traits: traitsOf(formulary),
  };
}

function acidProperties({ formulas, reference }: Formulary): readonly Property[] {
  const acids = [
    ...new Set(formulas.flatMap(({ document }) => Object.keys(document.profile?.acids ?? {}))),
  ].sort((a, b) => carbons(a) - carbons(b) || (a < b ? -1 : 1));
  return acids
    .map((acid): Property => {
      const values = formulas.map(({ document }) =>
        document.profile ? rounded(document.profile.acids[acid] ?? 0, 1) : null,
      );
      return {
        id: acid.toLowerCase().replaceAll(':', '-'),
        name: `${reference.acids.get(acid)?.name ?? acid} ${acid}`,
        unit: words.findWords.percent,
        group: words.findWords.groups.acids,
        format: 'number',
        decimals: 1,
        values,
      };
    })
    .filter(({ values }) => values.some((value) => (value ?? 0) >= LEAST_ACID));
}

const rounded = (value: number | null, decimals: number) =>
  value === null ? null : Number(value.toFixed(decimals)) + 0;

/** 18 of `C18:1-OH`. */
const carbons = (acid: string) => Number(/^C(\d+)/.exec(acid)?.[1] ?? 0);
