import type { breachText as english } from '../en/breaches.ts';
import { expectedMass } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

type Numbers = Parameters<typeof english>[1];

const of = (numbers: Numbers, name: string, decimals = 2) => {
  const value = numbers[name];
  return value === undefined ? '?' : fixed(value, decimals);
};

/** Why there is no number, by the rule that was left. */
const reasons: Readonly<Record<string, (numbers: Numbers) => string>> = {
  'size-too-small-for-scale': (n) =>
    `Redondear al escalón de la balanza movería el sobreengrasado de ${of(n, 'written')} % a ${of(n, 'weighed')} %, más de los ${of(n, 'allowed')} puntos que permite el taller. El tamaño es demasiado pequeño para esta balanza.`,
  'weight-below-scale-step': () =>
    'Una de las pesadas es menor que medio escalón de la balanza y se redondearía a nada.',
  'weight-above-scale-capacity': (n) =>
    `Una de las pesadas sería de ${expectedMass(n.mass ?? Number.NaN)}, más de los ${expectedMass(n.capacity ?? Number.NaN)} que admite la balanza.`,
  'nothing-sure-to-saponify': () =>
    'Con todos los errores en contra no queda en la olla nada que consuma con seguridad el álcali.',
  'scale-not-known': () => 'Los datos del taller no indican ninguna balanza para este tamaño.',
  'stock-weaker-than-lye': () =>
    'La solución de reserva ya contiene más agua de la que pide la fórmula. No se puede hacer más concentrada añadiendo agua.',
  'liquids-need-more-alkali-than-they-leave-water-for': () =>
    'La grasa y el ácido de los líquidos necesitan más álcali del que puede llevar el agua restante.',
  'composition-not-known': (n) =>
    `No se conocen los ácidos grasos del ${of(n, 'percentOfFats', 1)} % de las grasas, y medio perfil no es un perfil.`,
  'iodine-value-not-known': () => 'No se conoce el índice de yodo de una de las ceras.',
  'no-lye-heat-data': () =>
    'No hay datos sobre el calor de esta solución alcalina. Trátela como si hirviera: añada el álcali en porciones pequeñas y enfríe.',
  'lye-heat-of-stock': () =>
    'La solución alcalina se diluye a partir de una solución de reserva; el calor de la dilución no se calcula.',
  'lye-heat-out-of-range': () =>
    'La solución alcalina queda fuera de los datos sobre su calor. Trátela como si hirviera: añada el álcali en porciones pequeñas y enfríe.',
  'lye-density-out-of-range': () =>
    'La solución alcalina queda fuera de los datos de densidad; por eso un volumen no se puede convertir en peso.',
  'fat-density-not-known': () =>
    'No se conoce la densidad de una de las grasas; por eso el volumen del molde no se puede convertir en peso.',
  'losses-out-of-range': () => 'Las pérdidas fijadas para este tamaño no dejan nada que verter.',
  'dilution-not-weaker': () => 'La dilución pedida no es más débil que la pasta.',
};

/** The reason in words; a rule without its own words is named with its numbers, never passed over. */
export const breachText: typeof english = (rule, numbers) => {
  const reason = reasons[rule];
  if (reason) return reason(numbers);
  const listed = Object.entries(numbers).map(([name, value]) => `${name} ${plain(value)}`);
  return listed.length ? `${rule} (${listed.join(', ')})` : rule;
};
