import { dateText } from '../dates.ts';
import type { frame as english } from '../en/frame.ts';
import { statedMass, volume } from '../measures.ts';
import type { SameShape } from '../same-shape.ts';

/** What stands around every page, and the small words that many pages share. */
export const frame: SameShape<typeof english> = {
  skip: 'Ir al contenido',
  menu: 'Manual',
  contents: 'Índice',
  find: 'Buscar',
  lyeTables: 'Tablas de álcali',
  fats: 'Grasas',
  safety: 'Seguridad',
  methods: 'Métodos',
  asOf: (date) => `Al ${dateText(date)}`,
  edition: (id) => `Edición ${id}`,
  proof: 'Edición de prueba, no para el uso: contiene fórmulas sin aprobar.',
  invented: 'Demostración: un taller inventado, no un formulario con el que trabajar.',
  foot: 'No sustituye la ficha de datos de seguridad (FDS) del proveedor, las normas locales ni el consejo de un profesional habilitado. Eso va primero.',
  percent: '%',
  massIn: { metric: 'en gramos', us: 'en libras y onzas' },
  kinds: { bar: 'Pastilla', paste: 'Pasta', liquid: 'Líquido' },
  processes: { cold: 'proceso en frío', hot: 'proceso en caliente' },
  stages: {
    lye: 'en la solución alcalina',
    fats: 'en las grasas',
    trace: 'en la traza',
    'after-cook': 'después de la cocción',
    dilution: 'en la dilución',
  },
  allergens: {
    'tree nuts': 'frutos de cáscara',
    peanut: 'cacahuete (maní)',
    soy: 'soya (soja)',
    sesame: 'sésamo',
    milk: 'leche',
    wheat: 'trigo',
  },
  severities: { danger: 'Peligro', warning: 'Atención', care: 'Cuidado', note: 'Nota' },
  batchSize: {
    fats: (grams) => `${statedMass(grams)} de grasas`,
    batter: (grams) => `${statedMass(grams)} de masa de jabón`,
    bars: (count, grams) => `${count} pastillas de ${statedMass(grams)}, peso al verter`,
    mould: (millilitres) => `molde de ${volume(millilitres)}`,
  },
  reckoned: 'calculado aquí, véanse los métodos',
  how: {
    measured: 'medido',
    standard: 'norma',
    handbook: 'manual',
    supplier: 'cifra del proveedor',
    'common practice': 'práctica común, sin fuente',
    'from memory': 'de memoria, no comprobado con el impreso',
  },
};
