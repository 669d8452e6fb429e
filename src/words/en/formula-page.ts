import { dateText } from '../dates.ts';
import { stepText, totalMass } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

export const formulaPage = {
  revision: (n: number) => `Revision ${n}`,
  notApproved: 'not approved',
  fingerprint: 'Fingerprint',
  approved: (by: string, on: string, until: string) =>
    `Approved by ${by} on ${dateText(on)}, to be reviewed by ${dateText(until)}`,
  concession: (reason: string, by: string, on: string) =>
    `Published under a concession: ${reason} Given by ${by} on ${dateText(on)}.`,
  sections: {
    weights: 'Weights',
    margin: 'Superfat margin',
    method: 'Method',
    cautions: 'Cautions',
    targets: 'Targets and release',
    profile: 'Acid profile',
    properties: 'Properties',
    provenance: 'Where the values come from',
    changes: 'Changes',
    files: 'More of this formula',
  },
  sizes: 'Batch sizes',
  batch: {
    groups: {
      lye: 'Lye',
      fats: 'Fats',
      trace: 'At trace',
      'after-cook': 'After the cook',
      dilution: 'At dilution',
    } as Readonly<Record<string, string>>,
    caption: (code: string, label: string) => `${code}, ${label}: what to weigh, in working order`,
    what: 'Weigh',
    howMuch: 'Weight',
    water: 'Water',
    waterBesideStock: 'Water, besides the solution',
    waterHeldBack: 'Water held back',
    total: (grams: number) => totalMass(grams),
    totalLabel: 'All together',
    bars: (n: number) => (n === 1 ? '1 bar' : `${n} bars`),
    superfatLabel: 'Superfat by these weights',
    superfat: (percent: number) => `${fixed(percent, 2)} %`,
    lowestLabel: 'Lowest, scale counted',
    lowest: (expanded: number) => `${fixed(expanded, 1)} %`,
    steps: (steps: readonly number[]) =>
      steps.length === 1
        ? `Rounded to steps of ${stepText(steps[0] ?? 0)}.`
        : `Rounded to steps of ${steps.map(stepText).join(' and ')}, as printed.`,
    digest: (digest: string) => `Weights ${digest}`,
    end: (label: string) => `End of ${label}`,
    refusedTitle: 'No weights at this size',
    refusedAdvice: 'Do not scale another size by hand. Ask the formulator.',
  },
  stock: (name: string, percent: number) => `${name}, solution of ${plain(percent, 1)}\u00a0%`,
  stockAmount: (mass: string, percent: number) =>
    `${mass} (weighed as a solution of ${plain(percent, 1)}\u00a0%, not as a solid)`,
  stockNote: (name: string) =>
    `${name} comes as a solution: weigh the solution as it stands, no solid. Its own water is counted, and only what is missing is added. The lye concentration counts the hydroxide dissolved in it.`,
  blendNote: (name: string, parts: readonly { readonly name: string; readonly share: number }[]) =>
    `${name} stands ready mixed: ${parts.map((part) => `${plain(part.share, 2)} % ${part.name}`).join(', ')}. Its parts are not weighed again.`,
  lot: (lot: string) => `lot ${lot}`,
  lotOf: (lot: string, name: string) => `${lot} of ${name}`,
  noLot: 'no lot released: reckoned on the trade range',
  methodAmounts: (label: string) =>
    `The amounts in the text are those of the size “${label}”. For another size take its own block above.`,
  targets: {
    names: {
      fats: 'Fats',
      lye: 'Lye',
      combine: 'Combine',
      cook: 'Cook',
      unmould: 'Unmould after',
      cure: 'Cure',
      dilution: 'Dilution',
    } as Readonly<Record<string, string>>,
    units: { h: 'h', d: 'd', min: 'min' },
    freeAlkali: 'Free alkali, at most',
    freeAlkaliUnit: '% as NaOH',
    ph: 'pH',
    moisture: 'Moisture, at most',
    targetColumn: 'Target',
    releaseColumn: 'Limit at the release test',
    none: 'The formula states none.',
  },
  readCautions: (counts: readonly (readonly [severity: string, count: number])[]) =>
    `Cautions: ${counts.map(([severity, count]) => `${count} ${severity.toLowerCase()}`).join(', ')}. Read them before you weigh.`,
  noAmount: 'no weight',
  noCautions:
    'No rule found anything to warn of beyond the safety page. The safety page still holds.',
  basis: 'Basis',
  acidForgotten: (percent: number) =>
    `If the acid is forgotten, the superfat is ${fixed(percent, 1)} %${percent < 0 ? ': the soap is caustic' : ''}.`,
  finalSuperfat: (written: number, final: number) =>
    `The cook is reckoned at ${plain(written, 1)} %; with what joins after it the superfat is ${fixed(final, 1)} %.`,
  provenance: {
    lead: 'The alkali is reckoned on these saponification values, in mg KOH per g.',
    inBlend: (name: string) => `in ${name}`,
    columns: { fat: 'Fat', share: 'Share', value: 'Used', range: 'Range', source: 'Source' },
    alkali: 'Alkali',
    assay: 'Assay used',
    lot: (lot: string, method: string) => `lot ${lot}, ${method}`,
    loweredBy: (source: string) => `value lowered to a measured mean in ${source}`,
  },
  working: 'Every step of the reckoning, with its numbers',
  json: 'This formula as JSON',
} as const;
