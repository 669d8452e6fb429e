import type { Curve } from '../chemistry/interpolate.ts';
import type { LyeHeatTables } from '../chemistry/lye-heat.ts';
import type { Cation } from '../chemistry/materials.ts';
import type { Reference, TableSet } from './reference.ts';
import type { DataReport } from './report.ts';
import type { RawTable } from './schema/table.ts';

/** The tables that the models use, by file name, with the units that their axes must have. */
export const TABLES = {
  'heat-of-solution': ['mol/mol', 'kJ/mol'],
  'heat-capacity': ['% (m/m)', 'J/(g K)'],
  density: ['% (m/m)', 'g/mL'],
  solubility: ['degC', '% (m/m)'],
  'boiling-point': ['% (m/m)', 'degC'],
  crystallisation: ['% (m/m)', 'degC'],
} as const satisfies Record<string, readonly [x: string, y: string]>;
export type TableName = keyof typeof TABLES;

const SOLUTE: Readonly<Record<Cation, string>> = {
  Na: 'sodium-hydroxide',
  K: 'potassium-hydroxide',
};

/** Axes in the units expected, points by rising x. */
export function checkTable(name: TableName, table: RawTable, report: DataReport): void {
  for (const [index, axis] of (['x', 'y'] as const).entries()) {
    const expected = TABLES[name][index] ?? '';
    if (table[axis].unit !== expected) {
      report.in([axis, 'unit'], 'data/unknown-word', {
        found: `unit "${table[axis].unit}"`,
        expected: `"${expected}"`,
        advice: 'convert the points to that unit',
      });
    }
  }
  for (const [set, { points = [] }] of table.sets.entries()) {
    for (const [index, [x]] of points.entries()) {
      const before = points[index - 1];
      if (before && x <= before[0]) {
        report.in(['sets', set, 'points', index], 'data/table-order', {
          found: `${x} after ${before[0]}`,
          expected: 'rising values of x',
          advice: 'sort the points and look for a slipped digit',
        });
      }
    }
  }
}

/** What the models take: the first set of each solute, all heat capacities at 25 degC inside their fit. */
export function modelTables(
  opened: Readonly<Record<TableName, { readonly value: RawTable }>>,
): Reference['tables'] {
  const sets = (name: TableName, cation: Cation) =>
    opened[name].value.sets.filter(({ solute }) => solute === SOLUTE[cation]);
  const first = (name: TableName, cation: Cation): Curve => sets(name, cation)[0]?.points ?? [];
  const capacities = (cation: Cation) =>
    sets('heat-capacity', cation).filter(
      ({ temperature, extrapolated }) => temperature === 25 && extrapolated !== true,
    );
  const heats = (cation: Cation) => {
    const all = sets('heat-of-solution', cation);
    return all[0]?.points ? all : [];
  };
  const heat = (cation: Cation): LyeHeatTables => ({
    heatOfSolution: heats(cation)[0]?.points ?? [],
    newerSetAdds: newerSetAdds(heats(cation).map((set) => set['infinite-dilution'])),
    heatCapacities: capacities(cation).map(({ points = [] }) => points),
    saturation: first('solubility', cation),
    boilingPoint: first('boiling-point', cation),
  });
  const cited = (used: RawTable['sets']) =>
    used.map(({ source, at, how }) => ({ source, at, how }));
  const used = new Set(
    (['Na', 'K'] as const).flatMap((cation) => [
      ...FIRST_IS_USED.flatMap((name) => sets(name, cation).slice(0, 1)),
      ...heats(cation).slice(0, 1),
      ...hottestLimit(heats(cation)),
      ...capacities(cation),
    ]),
  );
  const setsOf = (name: TableName) =>
    opened[name].value.sets.map((set) => tableSet(set, used.has(set)));
  return {
    lyeHeat: { Na: heat('Na'), K: heat('K') },
    lyeDensity: { Na: first('density', 'Na'), K: first('density', 'K') },
    crystallisation: { Na: first('crystallisation', 'Na'), K: first('crystallisation', 'K') },
    lyeHeatSources: { Na: cited(heats('Na')), K: cited(heats('K')) },
    heatCapacitySources: { Na: cited(capacities('Na')), K: cited(capacities('K')) },
    sets: {
      'heat-of-solution': setsOf('heat-of-solution'),
      'heat-capacity': setsOf('heat-capacity'),
      density: setsOf('density'),
      solubility: setsOf('solubility'),
      'boiling-point': setsOf('boiling-point'),
      crystallisation: setsOf('crystallisation'),
    },
  };
}

/** How far the highest limit at infinite dilution lies above that of the first set, which has the points. */
const newerSetAdds = ([own, ...others]: readonly (number | undefined)[]): number =>
  own === undefined ? 0 : Math.max(0, ...others.map((limit = own) => limit - own));

/** Tables of which a model reads the first set of a solute and no other. */
const FIRST_IS_USED = ['density', 'solubility', 'boiling-point', 'crystallisation'] as const;

/** The set whose limit lies highest, where that is not the first one. */
const hottestLimit = ([own, ...others]: RawTable['sets']): RawTable['sets'] =>
  others
    .filter((set) => (set['infinite-dilution'] ?? 0) > (own?.['infinite-dilution'] ?? 0))
    .sort((a, b) => (b['infinite-dilution'] ?? 0) - (a['infinite-dilution'] ?? 0))
    .slice(0, 1);

const tableSet = (set: RawTable['sets'][number], used: boolean): TableSet => ({
  solute: set.solute,
  source: set.source,
  at: set.at,
  how: set.how,
  note: set.note ?? null,
  temperature: set.temperature ?? null,
  extrapolated: set.extrapolated ?? false,
  infiniteDilution: set['infinite-dilution'] ?? null,
  points: set.points ?? [],
  used,
});
