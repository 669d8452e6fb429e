import type { findCost as english } from '../en/find-cost.ts';
import { priceUnit } from '../measures.ts';
import type { SameShape } from '../same-shape.ts';

/** Cost as a property of the finder. Apart from its other words, which stand in every edition's scripts. */
export const findCost: SameShape<typeof english> = {
  group: 'Costo',
  name: 'Costo de los materiales por peso de masa de jabón',
  unit: (currency) => `${currency}/${priceUnit()}`,
};
