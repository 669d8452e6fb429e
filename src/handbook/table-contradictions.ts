import { type Curve, interpolate } from '../chemistry/interpolate.ts';
import type { Reference, TableSet } from '../reference/reference.ts';
import { TABLES, type TableName } from '../reference/tables.ts';
import { words } from '../words/catalogue.ts';
import { sourceName } from './names.ts';

/** Two sets of one table that both say something of the same lye, where they lie furthest apart. */
export interface TableContradiction {
  readonly table: TableName;
  readonly solute: string;
  readonly temperature: string | null;
  /** The set that a model reads, or the first where none is read. */
  readonly used: string;
  readonly other: string;
  /** `at 20 °C`, or at infinite dilution. */
  readonly where: string;
  readonly values: string;
  /** Of the used one. [%] */
  readonly difference: number;
  readonly why: string;
}

/** Every set that a model reads against every other of the same solute and temperature, where they differ. */
export function tableContradictions(reference: Reference): readonly TableContradiction[] {
  return (Object.keys(TABLES) as TableName[]).flatMap((table) => {
    const sets = reference.tables.sets[table];
    return sets.flatMap((base, index) => {
      const alike = sets.filter((set) => sameSubject(set, base));
      // where no model reads any, the first stands for them
      const isBase = base.used || (base === alike[0] && !alike.some(({ used }) => used));
      if (!isBase) return [];
      return alike
        .filter((other) => other !== base && !(other.used && sets.indexOf(other) < index))
        .flatMap((other) => contradiction(table, base, other, reference) ?? []);
    });
  });
}

const sameSubject = (a: TableSet, b: TableSet): boolean =>
  a.solute === b.solute && a.temperature === b.temperature;

interface Apart {
  /** `null` at infinite dilution. */
  readonly x: number | null;
  readonly used: number;
  readonly other: number;
}

function contradiction(
  table: TableName,
  first: TableSet,
  other: TableSet,
  reference: Reference,
): TableContradiction | null {
  const widest = furthestApart(first, other);
  if (widest === null) return null;
  const text = words.contradictionsPage;
  const [xUnit, yUnit] = TABLES[table];
  const unit = (name: string) => text.units[name] ?? name;
  const cited = ({ source, how, extrapolated }: TableSet) =>
    [
      sourceName(reference, source),
      words.frame.how[how],
      ...(extrapolated ? [text.extrapolated] : []),
    ].join('; ');
  return {
    table,
    solute: text.solutes[first.solute],
    temperature: first.temperature === null ? null : text.atTemperature(first.temperature),
    used: cited(first),
    other: cited(other),
    where: widest.x === null ? text.atInfiniteDilution : text.at(widest.x, unit(xUnit)),
    values: text.against(widest.used, widest.other, unit(yUnit)),
    difference: (100 * (widest.other - widest.used)) / widest.used,
    why: first.used ? text.tableReasons[table] : text.noneRead,
  };
}

/** Where the two differ most, at the points of either that the other reaches; `null` where nowhere. */
export function furthestApart(first: TableSet, other: TableSet): Apart | null {
  const places = new Set([...first.points, ...other.points].map(([x]) => x));
  const pairs: Apart[] = [...places].flatMap((x) => {
    const used = valueAt(first.points, x);
    const against = valueAt(other.points, x);
    return used === null || against === null ? [] : [{ x, used, other: against }];
  });
  if (first.infiniteDilution !== null && other.infiniteDilution !== null) {
    pairs.push({ x: null, used: first.infiniteDilution, other: other.infiniteDilution });
  }
  const distance = ({ used, other: against }: Apart) => Math.abs(used - against);
  const widest = pairs.sort((a, b) => distance(b) - distance(a))[0];
  return widest && distance(widest) > 0 ? widest : null;
}

/** As `interpolate`, and the point itself where a set has no more than one. */
const valueAt = (points: Curve, x: number): number | null =>
  interpolate(points, x) ?? points.find(([at]) => at === x)?.[1] ?? null;
