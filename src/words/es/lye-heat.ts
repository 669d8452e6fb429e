import type { lyeHeatWords as english } from '../en/lye-heat.ts';
import { temperature, warming } from '../measures.ts';
import { fixed } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** The heat of the lye on a formula's page. */
export const lyeHeatWords: SameShape<typeof english> = {
  title: 'Calor de la solución alcalina',
  method: 'Cómo se calcula el calor de la solución alcalina',
  rows: {
    start: 'Agua y álcali al inicio',
    strength: 'Hidróxido en el recipiente, puro, respecto a hidróxido y agua',
    peak: 'Máximo, según la serie de datos más caliente',
    coolest: 'Lo mismo, según la menos caliente',
    allWater: 'Máximo si no se reservara agua',
    extra: 'Reservar agua calienta más el recipiente en',
    boiling: 'Hierve a',
    saturationAtStart: 'Una solución saturada a la temperatura inicial contiene',
    saturationAtPeak: 'Una solución saturada a la temperatura máxima contiene',
  },
  celsius: (value) => temperature(value),
  kelvin: (value) => warming(value),
  percent: (value) => `${fixed(value, 1)} %`,
  noNumber: 'Sin número',
  tableEnds: (celsius) => `no se sabe: la tabla termina a ${temperature(celsius)}`,
  noLoss:
    'Sin pérdida de calor hacia la jarra y el aire. Un recipiente real queda algo menos caliente; aquí nada dice cuánto menos, así que cuente con esta cifra.',
  boils:
    'Según este cálculo, la solución alcalina llega a su punto de ebullición. Puede salpicar y desbordarse al hervir: añada el álcali en porciones pequeñas y enfríe entre una y otra.',
  crystals:
    'La solución alcalina contiene más de lo que se disuelve a la temperatura inicial. Lo que se disuelve en caliente sale como cristales al enfriarse: úsela antes de que se enfríe y mire el fondo de la jarra antes de verter.',
  strongest:
    'Que no haya número significa la advertencia más fuerte, no una solución suave. Trátela como si hirviera: el álcali al agua en porciones pequeñas, agua fría, enfriamiento alrededor de la jarra, un recipiente que resista el calor y lleno como máximo hasta la mitad, pantalla facial, nadie inclinado sobre ella, y un termómetro antes de hacer cualquier otra cosa con ella.',
  ofStock:
    'La solución de reserva también se calienta al mezclarla con agua. Vierta la solución de reserva en el agua despacio, mida, y considérela caliente hasta que el termómetro diga lo contrario.',
  limitOnly: (material, kilojoules) =>
    `${material}: a dilución infinita, un mol libera ${kilojoules.map((each) => fixed(each, 1)).join(' o ')} kJ, según la fuente. A la concentración de una solución alcalina de trabajo no se encontró nada, y ese límite no da ninguna temperatura.`,
  newerAdds: (kilojoules) =>
    `A la concentración de una solución alcalina de trabajo, solo la serie más antigua tiene cifras. Una serie más nueva, conocida solo a dilución infinita, queda ${fixed(kilojoules, 2)} kJ/mol más arriba; la lectura más caliente suma eso a todas las concentraciones.`,
  fromMemory: (tables) =>
    `A esta concentración solo hay cifras de memoria detrás de: ${tables.join(', ')}.`,
  partlyFromMemory: (tables) => `En parte de memoria a esta concentración: ${tables.join(', ')}.`,
  tables: {
    'heat-of-solution': 'calor de disolución',
    'heat-capacity': 'capacidad calorífica',
    solubility: 'solubilidad',
    'boiling-point': 'punto de ebullición',
  },
  sourcesTitle: 'De dónde vienen las tablas',
};
