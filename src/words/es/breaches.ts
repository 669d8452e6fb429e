import type { breachText as english } from '../en/breaches.ts';
import { plain } from '../numbers.ts';
import { numberOf as of, weightBreaches } from './weight-breaches.ts';

type Numbers = Parameters<typeof english>[1];

/** Why there is no number, by the rule that was left. */
const reasons: Readonly<Record<string, (numbers: Numbers) => string>> = {
  ...weightBreaches,
  'scale-not-known': () => 'Los datos del taller no indican ninguna balanza para este tamaño.',
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
  'dilution-not-weaker': () => 'La dilución pedida no es más débil que la pasta.',
};

/** The reason in words; a rule without its own words is named with its numbers, never passed over. */
export const breachText: typeof english = (rule, numbers) => {
  const reason = reasons[rule];
  if (reason) return reason(numbers);
  const listed = Object.entries(numbers).map(([name, value]) => `${name} ${plain(value)}`);
  return listed.length ? `${rule} (${listed.join(', ')})` : rule;
};
