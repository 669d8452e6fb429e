import type { FinderData, Property } from '../search/finder/finder-data.ts';
import type { FinderState } from '../search/finder/state.ts';

const USUAL = ['superfat', 'lowest-superfat', 'iodine-value', 'lye-concentration'];

/** The chosen columns; without a choice the usual ones and those that a range is set for. */
export function shownColumns(
  data: FinderData,
  { columns, ranges }: FinderState,
): readonly Property[] {
  const usual = (id: string) => USUAL.includes(id) || ranges[id] !== undefined;
  return data.properties.filter(({ id }) => (columns ? columns.includes(id) : usual(id)));
}

/** The state with one column more or less. */
export function withColumn(
  data: FinderData,
  state: FinderState,
  id: string,
  shown: boolean,
): FinderState {
  const others = shownColumns(data, state)
    .map((property) => property.id)
    .filter((each) => each !== id);
  return { ...state, columns: shown ? [...others, id] : others };
}
