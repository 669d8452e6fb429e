import type { contradictionsPage as english } from '../en/contradictions-page.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** The page of sources that do not agree. */
export const contradictionsPage: SameShape<typeof english> = {
  title: 'Contradicciones',
  lead: 'Dónde no coinciden las fuentes: intervalos que no se tocan, o un valor único fuera del intervalo usado. No se promedia nada. Se usa un registro según el orden de elección, y los demás quedan aquí y en la página de la grasa.',
  counted: (groups, fats) =>
    `${groups} desacuerdos sobre ${fats} grasas, hallados al comparar cada registro con todos los demás de la misma clase.`,
  orderLead: 'El orden de elección, según la clase de la fuente:',
  orderRest:
    'Dentro de una clase, lo leído va antes que lo que se sabe de memoria. Un intervalo necesita sus dos extremos, y lo que abarcaron unas pocas muestras solo cuenta donde no hay otro.',
  kinds: {
    standard: 'norma',
    pharmacopoeia: 'farmacopea',
    regulation: 'reglamento',
    handbook: 'manual',
    paper: 'artículo',
    supplier: 'proveedor',
    practice: 'práctica',
  },
  nothingFound: 'Aquí no se contradicen dos fuentes.',
  notCompared:
    'No se comparan los ácidos que una fuente no enumera, ni las densidades a temperaturas distintas.',
  sections: {
    'saponification-value': 'Índices de saponificación',
    'iodine-value': 'Índices de yodo',
    density: 'Densidades relativas',
    composition: 'Ácidos grasos, por ciento del total',
    tables: 'Tablas de los álcalis',
  },
  columns: {
    fat: 'Grasa',
    value: 'Valor',
    source: 'Fuente',
    what: 'Qué',
    apart: 'Distancia al usado',
    why: 'Usado o no, y por qué',
    table: 'Tabla',
    used: 'La lee un modelo',
    other: 'Otra serie',
    widest: 'Mayor diferencia',
    reason: 'Por qué esta',
  },
  used: 'usado',
  noneUsed: 'ningún registro puede usarse',
  lowers: 'reduce el valor usado',
  why: {
    kind: (used, other) => `por la clase de la fuente: ${used} va antes que ${other}`,
    memory: 'lo leído va antes que lo recordado',
    open: 'falta un extremo del intervalo',
    single: 'un valor sin intervalo',
    samples: (count) =>
      count === 1 ? 'una muestra' : `lo que ${count} muestras abarcaron o dieron en promedio`,
    file: 'del mismo rango, y más abajo en la lista',
  },
  apart: (distance) => (distance === 0 ? 'lo toca' : plain(distance, 3)),
  tableNames: {
    'heat-of-solution': 'Calor de disolución',
    'heat-capacity': 'Capacidad calorífica',
    density: 'Densidad',
    solubility: 'Solubilidad',
    'boiling-point': 'Punto de ebullición',
    crystallisation: 'Primeros cristales',
  },
  solutes: {
    'sodium-hydroxide': 'hidróxido de sodio',
    'potassium-hydroxide': 'hidróxido de potasio',
    'potassium-carbonate': 'carbonato de potasio',
  },
  tableReasons: {
    'heat-of-solution':
      'Solo la serie más antigua tiene puntos a la concentración de una solución alcalina de trabajo. Se usa, y se le suma el límite más alto de las series más nuevas como lectura más caliente.',
    'heat-capacity':
      'Donde varias series cubren una concentración, la capacidad calorífica más baja da la solución más caliente y se usa para el máximo; la más alta da la menos caliente.',
    density:
      'La primera serie, para los dos álcalis: por encima de 30 % de hidróxido de sodio queda más cerca de lo que indican los proveedores que el ajuste.',
    solubility:
      'La primera serie, para los dos álcalis: cerca de 20 °C da menos hidróxido de sodio en una solución saturada, que es la lectura más segura.',
    'boiling-point': 'La primera serie.',
    crystallisation: 'La primera serie.',
  },
  noneRead:
    'Ningún modelo lee ninguna de las dos: ninguna serie tiene puntos a la concentración de una solución alcalina de trabajo, así que no se da ninguna temperatura.',
  atInfiniteDilution: 'a dilución infinita',
  at: (x, unit) => `a ${plain(x, 2)} ${unit}`,
  against: (used, other, unit) => `${plain(used, 3)} frente a ${plain(other, 3)} ${unit}`,
  difference: (percent) => `${fixed(percent, 1)} %`,
  extrapolated: 'más allá del ajuste de su fuente',
  atTemperature: (celsius) => `${plain(celsius, 1)} °C`,
  units: {
    degC: '°C',
    '% (m/m)': '%',
    'mol/mol': 'mol de agua por mol',
    'kJ/mol': 'kJ/mol',
    'J/(g K)': 'J/(g K)',
    'g/mL': 'g/mL',
  },
  onFatPage: 'Dónde se contradicen las fuentes',
  toPage: 'Todas las contradicciones',
};
