import type { titrationLines as english } from '../en/titration-lines.ts';
import { fixed, plain, withDecimalSign } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** What the titration command prints. */
export const titrationLines: SameShape<typeof english> = {
  value: (value) => `Índice de saponificación ${fixed(value, 1)} mg KOH/g`,
  valueWithin: (value, uncertainty) =>
    `Índice de saponificación ${fixed(value, 1)} ± ${fixed(uncertainty, 1)} mg KOH/g, k = 2`,
  equation: (normality, blank, sample, mass) =>
    `  ${withDecimalSign('56.1')} x ${plain(normality, 4)} x (${plain(blank, 3)} - ${plain(sample, 3)}) / ${plain(mass, 4)}, con el factor como lo redondea la norma (ISO 3657)`,
  part: {
    volume: (half) => `  ambos volúmenes ± ${fixed(half, 2)}`,
    mass: (half) => `  masa            ± ${fixed(half, 2)}`,
    normality: (half) => `  normalidad      ± ${fixed(half, 2)}`,
  },
  lotsLine: 'Para lots.yaml, bajo fats; otra persona la libera:',
  fillIn:
    'Donde hay mayúsculas, ponga el id de la grasa, el número de la partida y la fecha de reanálisis.',
  noUncertainty:
    'No hay línea para lots.yaml: un valor sin su incertidumbre no dice nada del margen. Indique --volume-uncertainty, --mass-uncertainty y --normality-uncertainty, semianchuras con k = 2; 0 solo donde sea despreciable.',
  number: (option, given) =>
    `--${option}: “${given}” no es un número. Escríbalo como 18.95, con punto y sin unidad.`,
  missing: (options) =>
    `${options.length === 1 ? 'Falta' : 'Faltan'} ${options.map((option) => `--${option}`).join(', ')}.`,
  unusable:
    'Estas lecturas no dan un índice de saponificación: la masa y la normalidad deben ser mayores que cero, la muestra no menor que cero, y el blanco mayor que la muestra.',
  noUncertaintyBelowZero: 'Una incertidumbre no puede ser menor que cero.',
  outside: (value, uncertainty) =>
    `${fixed(value, 1)} ± ${fixed(uncertainty, 1)} mg KOH/g está fuera de lo que puede tener una partida (de 60 a 400, ± 10 como máximo). Compruebe las lecturas y sus unidades; no hay línea para lots.yaml.`,
};
