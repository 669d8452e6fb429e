import type { dilutionWords as englishDilution, yieldWords as englishYield } from '../en/yields.ts';
import { expectedMass, fineMass, statedMass, tableBasis } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** Yields, the days of cutting and release, and the dilution of a paste. */
export const yieldWords: SameShape<typeof englishYield> = {
  method: 'Cómo se calcula el rendimiento',
  title: 'Rendimiento y días',
  get perBasis() {
    return `De ${statedMass(tableBasis())} de grasas`;
  },
  columns: {
    measure: 'Medida',
    fresh: 'En fresco',
    released: 'A la liberación',
    size: 'Tamaño',
    batter: 'Todo junto',
    poured: 'Vertido',
    bars: 'Pastillas',
    loss: 'Agua perdida',
    grade: 'Grado',
    least: 'Al menos',
  },
  measures: {
    mass: 'Masa',
    water: 'Agua',
    soap: 'Jabón, seco',
    glycerol: 'Glicerol de las grasas',
    unsaponified: 'Grasa sin saponificar',
    totalFattyMatter: 'Materia grasa total (MGT)',
  },
  grams: expectedMass,
  gramsAndShare: (mass, percent) => `${expectedMass(mass)}, ${fixed(percent, 1)} %`,
  percent: (value) => `${fixed(value, 1)} %`,
  lead: 'Calculado a partir de los pesos, sin evaporación de agua al hervir y con todo el álcali consumido. Si la balanza dice otra cosa, tiene razón la balanza.',
  bySize: 'Por tamaño, con las pérdidas del taller descontadas',
  bars: (count, wetMass) => `${count} de ${statedMass(wetMass, 1)}`,
  barAtRelease: (wetMass, released) =>
    `Una pastilla vertida con ${statedMass(wetMass, 1)} pesa ${fineMass(released)} con la humedad de liberación.`,
  wholeBars: 'Cuentan solo las pastillas enteras. Los recortes no están descontados.',
  gradesTitle: 'Materia grasa total junto a los grados de una norma',
  gradesLead: (source, how) =>
    `${source} (${how}) clasifica el jabón de tocador en grados según la materia grasa total, entre otros límites que aquí no se consideran. Un grado nombra una clase de jabón, no su mérito: una pastilla con más agua, glicerol o sal tiene menos materia grasa.`,
  atLeast: (percent) => `${plain(percent, 1)} %`,
  reached: 'alcanzado',
  notReached: 'no alcanzado',
  schedule: (cut, release) =>
    `Elaborado el día 0${cut === null ? '' : `, cortar desde el día ${cut}`}${
      release === null ? '' : `, ensayos para la liberación desde el día ${release}`
    }.`,
  scheduleRule:
    'Los días se cuentan desde la elaboración, cada parte de un día como un día entero, según los extremos inferiores de los objetivos. Deciden los ensayos previos a la liberación, no el calendario.',
  scheduleExample: (made, cut, release) =>
    `Elaborado el ${made}${cut === null ? '' : `: cortar desde el ${cut}`}${
      release === null
        ? ''
        : `${cut === null ? ':' : ','} ensayos para la liberación desde el ${release}`
    }.`,
};

export const dilutionWords: SameShape<typeof englishDilution> = {
  method: 'Cómo se calcula la dilución',
  title: 'Dilución de la pasta',
  lead: 'Según la pasta tal como se pesa: la cocción evapora un agua que ningún cálculo conoce, mientras que el jabón se queda. La primera columna de cifras es la teoría, como si no se hubiera evaporado nada; las otras son la misma pasta, más ligera en la balanza.',
  soapIn: (percent) => `jabón ${fixed(percent, 1)} %`,
  asWeighed: (part) => (part === 1 ? 'Teoría' : `${fixed(part * 100, 0)} % de la teoría`),
  get caption() {
    return `Agua para ${statedMass(tableBasis())} de pasta, según lo que pesa la pasta frente a la teoría`;
  },
  target: 'Contenido de jabón deseado',
  percent: (value) => `${fixed(value, 0)} %`,
  none: 'no más diluido',
  joins: (mass) =>
    `Lo que la fórmula añade en la dilución forma parte de la masa de esa agua: ${fineMass(mass)} para ${statedMass(tableBasis())} de pasta según la teoría. Réstelo antes de pesar el agua.`,
  bySize: 'Masa terminada por tamaño',
  bySizeCaption: 'Masa terminada por contenido de jabón',
  bySizeLead:
    'Pese lo que pese la pasta, el jabón que contiene es el mismo. Lleve el conjunto a la masa de abajo: el agua por añadir es esa masa menos la pasta tal como se pesa, menos lo demás que entra en la dilución. Las pérdidas del taller ya están descontadas; si se quedó más pegado a la caldera, hay menos jabón.',
  columns: { size: 'Tamaño', soap: 'Jabón que contiene', theory: 'Pasta según la teoría' },
  finished: (percent) => `${fixed(percent, 0)} %`,
  grams: expectedMass,
  clear:
    'Cuánto se puede diluir un líquido sin que deje de ser transparente se averigua con una prueba en un vaso pequeño, no con esta tabla.',
};
