import type { evidencePage as english } from '../en/evidence-page.ts';
import type { SameShape } from '../same-shape.ts';

/** Words of the table of computed against published values. */
export const evidencePage: SameShape<typeof english> = {
  title: 'Comprobación',
  about: 'lo que dan los modelos, junto a lo que otros han publicado',
  lead: 'Lo que dan los modelos de este manual, junto a lo que otros han publicado. Las pruebas repasan estos mismos registros antes de generar nada: una fila que no coincide detiene la generación si su motivo no figura aquí, y un motivo que ya no hace falta también la detiene.',
  counts: (of) =>
    `${of.rows} filas: ${of.read} frente a ${of.sources} publicaciones que se leyeron, ${of.memory} frente a valores que solo se saben de memoria, ${of.practice} reglas del oficio sin fuente. ${of.known} no coinciden, cada una con su motivo.`,
  groups: {
    'molar-mass': 'Masas molares',
    'equivalent-1908':
      'Equivalentes de saponificación de glicéridos puros, con los pesos atómicos de 1908',
    'iodine-factor': 'Factores de yodo, a partir de primeros principios',
    titration: 'Una titulación impresa',
    'saponification-value': 'Índices de saponificación, calculados con la composición en uso',
    'iodine-value': 'Índices de yodo, calculados con la composición en uso',
    'acid-share': 'Reglas del oficio sobre los ácidos',
    glycerol: 'Glicerol',
    wax: 'Ésteres de cera',
    'lye-density': 'Densidad de la solución alcalina',
    'lye-heat': 'Calor de disolución',
  },
  columns: {
    subject: 'Qué',
    computed: 'Calculado',
    published: 'Publicado',
    tolerance: 'Tolerancia',
    deviation: 'Desviación',
    verdict: 'Coincide',
    source: 'Fuente',
  },
  agrees: 'sí',
  disagrees: 'no',
  atLeast: (value) => `como mínimo ${value}`,
  atMost: (value) => `como máximo ${value}`,
  between: (low, high) => `de ${low} a ${high}`,
  inside: 'dentro',
};
