import { dateText } from '../dates.ts';
import type { formulaPage as english } from '../en/formula-page.ts';
import { stepText, totalMass } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

export const formulaPage: SameShape<typeof english> = {
  revision: (n) => `Revisión ${n}`,
  notApproved: 'sin aprobar',
  fingerprint: 'Huella',
  approved: (by, on, until) =>
    `Aprobada por ${by} el ${dateText(on)}, revisar a más tardar el ${dateText(until)}`,
  concession: (reason, by, on) =>
    `Publicada con una concesión: ${reason} Otorgada por ${by} el ${dateText(on)}.`,
  sections: {
    weights: 'Pesadas',
    margin: 'Margen de sobreengrasado',
    method: 'Método',
    cautions: 'Advertencias',
    targets: 'Objetivos y liberación',
    profile: 'Perfil de ácidos',
    properties: 'Propiedades',
    provenance: 'De dónde vienen los valores',
    changes: 'Cambios',
    files: 'Más de esta fórmula',
  },
  sizes: 'Tamaños de lote',
  batch: {
    groups: {
      lye: 'Solución alcalina',
      fats: 'Grasas',
      trace: 'En la traza',
      'after-cook': 'Después de la cocción',
      dilution: 'En la dilución',
    },
    caption: (code, label) => `${code}, ${label}: qué pesar, en orden de trabajo`,
    what: 'Pesar',
    howMuch: 'Peso',
    water: 'Agua',
    waterBesideStock: 'Agua, además de la solución de reserva',
    waterHeldBack: 'Agua reservada',
    total: (grams) => totalMass(grams),
    totalLabel: 'Todo junto',
    bars: (n) => (n === 1 ? '1 pastilla' : `${n} pastillas`),
    superfatLabel: 'Sobreengrasado con estos pesos',
    superfat: (percent) => `${fixed(percent, 2)} %`,
    lowestLabel: 'Mínimo, contando la balanza',
    lowest: (expanded) => `${fixed(expanded, 1)} %`,
    steps: (steps) =>
      steps.length === 1
        ? `Redondeado a escalones de ${stepText(steps[0] ?? 0)}.`
        : `Redondeado a escalones de ${steps.map(stepText).join(' y ')}, como está impreso.`,
    digest: (digest) => `Pesadas ${digest}`,
    end: (label) => `Fin de ${label}`,
    refusedTitle: 'No hay pesadas para este tamaño',
    refusedAdvice: 'No adapte otro tamaño a mano. Pregunte a quien formula.',
  },
  stock: (name, percent) => `${name}, solución al ${plain(percent, 1)}\u00a0%`,
  stockAmount: (mass, percent) =>
    `${mass} (se pesa como solución al ${plain(percent, 1)}\u00a0%, no como sólido)`,
  stockNote: (name) =>
    `${name} viene como solución: pese la solución tal como está, nada de sólido. Su propia agua se tiene en cuenta, y solo se añade la que falta. La concentración de la solución alcalina cuenta el hidróxido disuelto en ella.`,
  blendNote: (name, parts) =>
    `${name} está ya mezclado: ${parts.map((part) => `${plain(part.share, 2)} % ${part.name}`).join(', ')}. Sus partes no se pesan otra vez.`,
  lot: (lot) => `partida ${lot}`,
  lotOf: (lot, name) => `${lot} de ${name}`,
  noLot: 'ninguna partida liberada: calculado con el intervalo comercial',
  methodAmounts: (label) =>
    `Las cantidades del texto son las del tamaño “${label}”. Para otro tamaño, use su propio bloque más arriba.`,
  targets: {
    names: {
      fats: 'Grasas',
      lye: 'Solución alcalina',
      combine: 'Mezcla',
      cook: 'Cocción',
      unmould: 'Desmoldar después de',
      cure: 'Curado',
      dilution: 'Dilución',
    },
    units: { h: 'h', d: 'd', min: 'min' },
    freeAlkali: 'Álcali libre, como máximo',
    freeAlkaliUnit: '% como NaOH',
    ph: 'pH',
    moisture: 'Humedad, como máximo',
    targetColumn: 'Objetivo',
    releaseColumn: 'Límite en el ensayo de liberación',
    none: 'La fórmula no indica ninguno.',
  },
  readCautions: (counts) =>
    `Advertencias: ${counts.map(([severity, count]) => `${count} de ${severity.toLowerCase()}`).join(', ')}. Léalas antes de pesar.`,
  noAmount: 'sin peso',
  noCautions:
    'Ninguna regla encontró nada de lo que advertir más allá de la página de seguridad. La página de seguridad sigue siendo válida.',
  basis: 'Base',
  acidForgotten: (percent) =>
    `Si se olvida el ácido, el sobreengrasado es ${fixed(percent, 1)} %${percent < 0 ? ': el jabón es cáustico' : ''}.`,
  finalSuperfat: (written, final) =>
    `La cocción se calcula con ${plain(written, 1)} %; con lo que se añade después de ella, el sobreengrasado es ${fixed(final, 1)} %.`,
  provenance: {
    lead: 'El álcali se calcula con estos índices de saponificación, en mg KOH por g.',
    inBlend: (name) => `en ${name}`,
    columns: {
      fat: 'Grasa',
      share: 'Proporción',
      value: 'Usado',
      range: 'Intervalo',
      source: 'Fuente',
    },
    alkali: 'Álcali',
    assay: 'Riqueza usada',
    lot: (lot, method) => `partida ${lot}, ${method}`,
    loweredBy: (source) => `valor reducido a una media medida en ${source}`,
  },
  working: 'Cada paso del cálculo, con sus números',
  json: 'Esta fórmula en JSON',
};
