import type { weightBreaches as english } from '../en/weight-breaches.ts';
import { expectedMass } from '../measures.ts';
import { fixed } from '../numbers.ts';

type Numbers = Readonly<Record<string, number>>;

/** One of the numbers of a breach, as it is shown. */
export const numberOf = (numbers: Numbers, name: string, decimals = 2): string => {
  const value = numbers[name];
  return value === undefined ? '?' : fixed(value, decimals);
};

/** Why a size has no weights, by the rule that was left. Apart from the others, as scripts of pages say these too. */
export const weightBreaches: typeof english = {
  'size-too-small-for-scale': (n) =>
    `Redondear al escalón de la balanza movería el sobreengrasado de ${numberOf(n, 'written')} % a ${numberOf(n, 'weighed')} %, más de los ${numberOf(n, 'allowed')} puntos que permite el taller. El tamaño es demasiado pequeño para esta balanza.`,
  'weight-below-scale-step': () =>
    'Una de las pesadas es menor que medio escalón de la balanza y se redondearía a nada.',
  'weight-above-scale-capacity': (n) =>
    `Una de las pesadas sería de ${expectedMass(n.mass ?? Number.NaN)}, más de los ${expectedMass(n.capacity ?? Number.NaN)} que admite la balanza.`,
  'nothing-sure-to-saponify': () =>
    'Con todos los errores en contra no queda en la olla nada que consuma con seguridad el álcali.',
  'stock-weaker-than-lye': () =>
    'La solución de reserva ya contiene más agua de la que pide la fórmula. No se puede hacer más concentrada añadiendo agua.',
  'liquids-need-more-alkali-than-they-leave-water-for': () =>
    'La grasa y el ácido de los líquidos necesitan más álcali del que puede llevar el agua restante.',
  'losses-out-of-range': () => 'Las pérdidas fijadas para este tamaño no dejan nada que verter.',
};
