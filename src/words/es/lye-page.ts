import { dateText } from '../dates.ts';
import type { lyePage as english } from '../en/lye-page.ts';
import type { SameShape } from '../same-shape.ts';

export const lyePage: SameShape<typeof english> = {
  title: (label) => `Tabla de álcali: ${label}`,
  lead: 'Pese todo lo de una línea, hasta su última columna, cada cosa en un vaso propio. El código está en los dos extremos de la línea: deben ser el mismo.',
  order: 'El álcali al agua, nunca agua sobre el álcali.',
  columns: {
    code: 'Código',
    name: 'Fórmula',
    also: 'También va en la solución alcalina',
    water: 'Agua',
    revision: 'Rev.',
  },
  danger: 'Peligro: lea antes sus advertencias',
  heldBack: 'Agua reservada',
  none: '—',
  refused: 'No hay pesadas para este tamaño:',
  csv: 'Esta tabla en CSV',
  groups: { bar: 'Pastillas', paste: 'Pastas', liquid: 'Líquidos' },
  lots: {
    title: 'Para qué se calculó esta tabla',
    lead: 'Compárela con los sacos y bidones. Con cualquier otra partida las pesadas no valen.',
    lot: (lot, until) => `partida ${lot}, reanalizar a más tardar el ${dateText(until)}`,
    without: (names) => `Sin partida, calculado con el intervalo publicado: ${names}.`,
    until: (date) =>
      date === null ? 'hasta que se libere una partida' : `no después del ${dateText(date)}`,
    validity: (asOf, until) =>
      `Al ${dateText(asOf)}. Retírela después del ${dateText(until)}, o en cuanto cambie una partida, una fórmula o la edición.`,
    noUntil: (asOf) =>
      `Al ${dateText(asOf)}. Retírela en cuanto se libere una partida o cambie una fórmula o la edición.`,
  },
  fats: {
    title: 'Álcali para 100\u00a0g de una sola grasa',
    link: 'Álcali para 100\u00a0g de cada grasa',
    lead: 'Lo que saponifica por completo 100 g de la grasa sola: sin sobreengrasado, sin nada de sobra. Sirve para comprobar otras cifras; no es una fórmula para elaborar.',
    rounding:
      'Redondeado hacia abajo. El intervalo dice cuánto puede diferir una grasa sin partida.',
    waxes:
      'Las ceras (cera de abejas, jojoba) pueden reaccionar solo en parte; en proceso en frío, apenas.',
    columns: {
      fat: 'Grasa',
      value: 'Índice de saponificación',
      range: 'Intervalo',
      lot: 'Partida',
    },
    unit: 'mg KOH por g',
    alkali: (assay) => `tal como se pesa, riqueza ${assay} %`,
    solution: (assay) => `solución al ${assay} %, tal como se pesa`,
    noLot: '—',
  },
};
