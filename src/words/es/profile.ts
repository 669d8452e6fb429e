import type {
  propertyNames as englishNames,
  profileWords as englishProfile,
  propertyUnits as englishUnits,
} from '../en/profile.ts';
import type { SameShape } from '../same-shape.ts';

export const profileWords: SameShape<typeof englishProfile> = {
  lead: 'Porcentaje en masa de todos los ácidos grasos, con las grasas de después de la cocción.',
  notGiven: 'No se da perfil.',
  classes: {
    saturated: 'Saturados',
    monounsaturated: 'Monoinsaturados',
    polyunsaturated: 'Poliinsaturados',
    hydroxy: 'Hidroxilados',
  },
  columns: { acid: 'Ácido', share: 'Proporción' },
  sum: (name) => `${name}, en conjunto`,
};

/** Names of the measures in the properties table, each with the id of its method. */
export const propertyNames: SameShape<typeof englishNames> = {
  superfat: 'Sobreengrasado, según la fórmula',
  saponificationValue: 'Índice de saponificación de las grasas',
  iodineValue: 'Índice de yodo de las grasas',
  oxidisability: 'Oxidabilidad, COX',
  bisAllylic: 'Posiciones bisalílicas, BAPE',
  chainLength: 'Longitud media de cadena de los ácidos',
  lyeConcentration: 'Concentración de la solución alcalina',
  lyeAsMade: 'Concentración de la solución alcalina en el recipiente',
  lyePeak: 'Temperatura de la solución alcalina sin pérdida de calor',
  totalFattyMatterFresh: 'Materia grasa total (MGT), en fresco',
  totalFattyMatterReleased: 'Materia grasa total (MGT), a la liberación',
  glycerolFresh: 'Glicerol, en fresco',
  glycerolReleased: 'Glicerol, a la liberación',
  moistureFresh: 'Agua, en fresco',
  moistureReleased: 'Agua, a la liberación',
  columns: { measure: 'Medida', value: 'Valor', unit: 'Unidad', method: 'Método' },
  method: 'método',
  noNumber: 'Sin número',
};

export const propertyUnits: SameShape<typeof englishUnits> = {
  percent: '%',
  mgKohPerGram: 'mg KOH/g',
  iodine: 'g I₂/100 g',
  carbons: 'carbonos',
  none: 'sin unidad',
};
