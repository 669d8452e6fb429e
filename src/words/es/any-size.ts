import type * as english from '../en/any-size.ts';
import { statedMass, statedVolume } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

const percent = (value = 0, decimals = 1) => `${plain(value, decimals)} %`;

/** What a page says before anything is typed. */
export const anySizePage: SameShape<typeof english.anySizePage> = {
  title: 'Otro tamaño',
  pageTitle: (code, name) => `${code} ${name}: otro tamaño`,
  link: '¿Otro tamaño, o una pesada equivocada?',
  needsScripts:
    'Otro tamaño necesita scripts, que aquí están desactivados. Los tamaños de la lista valen sin ellos. Nunca calcule uno a mano a partir de otro.',
  notApproved:
    'No se calcula ningún otro tamaño: esta fórmula no está aprobada. Los tamaños de la lista están para leer, no para elaborar.',
  noWeights:
    'No se calcula ningún otro tamaño: esta fórmula no tiene pesadas en ningún tamaño de la lista.',
  lead: 'Escriba uno de estos. Las pesadas se calculan aquí, con las mismas reglas que las de la lista.',
  range: (smallest, largest) =>
    `De ${smallest} a ${largest} de grasas, el menor y el mayor tamaño de la lista (práctica común, sin fuente).`,
  fields: {
    fats: (unit) => `Grasas, ${unit}`,
    batter: (unit) => `Masa de jabón para verter, ${unit}`,
    bars: (wetMass, like) => `Pastillas de ${wetMass} en fresco, como en ${like}`,
  },
  clear: 'Borrar',
  toSheet: 'Imprimir este tamaño como hoja, o corregir una pesada',
  benchSheet: (label) => `Hoja de trabajo: ${label}`,
  sheet: {
    mark: 'Tamaño que no está en la lista',
    markNote:
      'Calculado en el navegador. La edición no tiene código de pesadas para él, y la página que comprueba hojas no lo conoce.',
    printHint: 'Imprima en A4 o Carta.',
    printListed:
      'Este tamaño está en la lista. Imprima su propia hoja de trabajo, que lleva un código de pesadas.',
    nothing: 'No se ha calculado ningún tamaño. No hay nada que imprimir.',
    current:
      'El código, la revisión, la huella y la edición se han buscado hoy en el manual y son los vigentes.',
    agreed: 'Quien formula está de acuerdo con este tamaño. Nombre:',
    rework: 'Sin jabón reincorporado en un tamaño que no está en la lista.',
    amount: '(véanse las pesadas)',
    cautionsNote:
      'Advertencias que no dependen del tamaño. El recipiente, el límite de calor, la balanza y el sobreengrasado mínimo de este tamaño se comprobaron al calcularlo.',
  },
  correction: {
    title: '¿Una pesada equivocada?',
    lead: 'Solo antes de que la solución alcalina toque las grasas. Escriba lo que indicó la balanza en cada línea que no está como está escrita. Deje vacías las demás.',
    combined: 'La solución alcalina y las grasas ya se han juntado',
    dissolved: 'Hay álcali en el agua, todo o una parte',
  },
};

/** What is said of a size while the page is read. */
export const anySizeWords: SameShape<typeof english.anySizeWords> = {
  broken:
    'No se puede calcular otro tamaño: falta su archivo de datos o está dañado. Los tamaños de la lista valen. Nunca calcule uno a mano a partir de otro.',
  typed: {
    empty: 'Escriba primero un tamaño.',
    'other-sign': (sign) => `Escriba los decimales tras «${sign}», y nada entre los millares.`,
    'not-a-number': 'Eso no es un número. Use solo cifras.',
    'not-whole': 'Las pastillas se cuentan: escriba un número entero.',
    ounces: 'Después de las libras, las onzas son menos de 16.',
    zero: 'Con eso no hay nada que elaborar. Escriba un número mayor que cero.',
    'too-long': 'Es demasiado para cualquier tamaño de este taller.',
  },
  size: {
    fats: (mass) => `${mass} de grasas`,
    batter: (mass) => `${mass} de masa de jabón`,
    bars: (count, wetMass) =>
      count === 1 ? `1 pastilla de ${wetMass}` : `${count} pastillas de ${wetMass}`,
  },
  found: (size, like) => `Pesadas para ${size}. Balanzas, recipiente y pérdidas como para ${like}.`,
  listed: (label) =>
    `Este es el tamaño ${label} de la lista. Para elaborarlo, use su propia hoja de trabajo.`,
  caption: (code, size) => `${code}, ${size}: qué pesar, en orden de trabajo`,
  lot: (lot) => `partida ${lot}`,
  total: (mass) => `Todo junto ${mass}.`,
  poured: (mass, losses) => `Se espera verter ${mass}, tras pérdidas del ${percent(100 * losses)}.`,
  superfat: (weighed, lowest) =>
    `Sobreengrasado con estos pesos ${fixed(weighed, 2)} %; sobreengrasado mínimo ${fixed(lowest, 1)} %, contada la balanza.`,
  thin: (lowest, limit) =>
    `Advertencia. El sobreengrasado mínimo de este tamaño es ${fixed(lowest, 2)} %, menos del ${plain(limit)} %. Que otra persona lea cada pesada de grasa y de álcali, y haga usted el ensayo antes de liberar.`,
  refusedTitle: 'Sin pesadas en este tamaño',
  advice: 'Nunca lo calcule a mano a partir de otro tamaño. Pregunte a quien formula.',
  refusals: {
    'size-below-listed': (n) =>
      `Lleva ${statedMass(n.fats ?? 0, 1)} de grasas. El menor tamaño de la lista de esta fórmula lleva ${statedMass(n.smallest ?? 0, 1)}.`,
    'size-above-listed': (n) =>
      `Lleva ${statedMass(n.fats ?? 0, 1)} de grasas. El mayor tamaño de la lista de esta fórmula lleva ${statedMass(n.largest ?? 0, 1)}.`,
    'above-heat-limit': (n) =>
      `Lleva ${statedMass(n.fats ?? 0, 1)} de grasas. De una vez se pueden verter ${statedMass(n.limit ?? 0, 1)}, pues más no puede soltar su calor.`,
    'above-vessel': (n) =>
      `Llena su recipiente de ${statedVolume(n.vessel ?? 0)} hasta el ${percent(n.fill)}. Se permite como máximo el ${percent(n.limit)}.`,
    'lowest-superfat-below-limit': (n) =>
      `El sobreengrasado podría bajar a ${fixed(n.lowest ?? 0, 2)} %, contada la balanza. Se pide al menos ${fixed(n.floor ?? 0, 2)} %.`,
  },
};

/** What is said on the sheet of a size, and to put right what was weighed wrong. */
export const sizeSheetWords: SameShape<typeof english.sizeSheetWords> = {
  corrected: (size) => `${size}, corregido`,
  scale: (step) => `escalones de ${step}`,
  sheetScales: (scales) => `La balanza está nivelada y comprobada hoy: ${scales}.`,
  refusals: {
    'lye-has-met-fats': () =>
      'La solución alcalina y las grasas se han juntado. No se puede calcular nada para lo que hay ahora en la olla.',
    'correction-too-large': (n) =>
      `Para corregirlo, el lote crecería más del ${percent(n.most)} (práctica común, sin fuente). Eso no es un desliz: puede que sea otro vaso u otra línea.`,
    'correction-not-found': () => 'Ninguna pesada en estas balanzas lo corrige.',
    'grown-above-listed': (n) =>
      `Para corregirlo, el lote llevaría ${statedMass(n.fats ?? 0, 1)} de grasas, más que su tamaño de la lista de ${statedMass(n.largest ?? 0, 1)}, y el taller no indica ningún recipiente con que compararlo.`,
    'made-lye-lacks-water': (n) =>
      `La solución alcalina está hecha y le falta el ${percent(n.missing)} de uno de sus líquidos. Más del ${percent(n.most)} es demasiado: está más caliente y más concentrada que nada de lo calculado.`,
    'made-lye-lacks-alkali': (n) =>
      `Según esta lectura, a la solución alcalina ya hecha le falta el ${percent(n.missing)} de un álcali. Más del ${percent(n.most)} no es un desliz (práctica común, sin fuente) y, si se leyó mal la balanza, añadirlo daría un lote cáustico.`,
    'made-lye-lacks-acid': () =>
      'La solución alcalina está hecha y un ácido que va en ella quedaría corto. El ácido no se echa sobre el álcali, y sin él el jabón es más cáustico.',
    'made-lye-near-saturation': (n) =>
      `Hasta que se añada el agua que falta, la solución tendría un ${percent(n.strength)} de hidróxido, demasiado cerca del punto en que forma cristales, o no se sabe dónde está ese punto.`,
  },
  shown: (name, unit) => `${name}: la balanza indicó, ${unit}`,
  mixed: 'Junto con otros',
  mixedOf: (name) => `${name}: junto con otros, no se puede retirar`,
  columns: {
    what: 'Material',
    target: 'Debe llegar a',
    todo: 'Qué hacer',
    tick: 'Hecho',
    by: 'Quién',
    checked: 'Visto',
  },
  offStep: (name, step) => `${name}: esta balanza marca escalones de ${step}. Léala otra vez.`,
  faulty: (name, sentence) => `${name}: ${sentence}`,
  stopTitle: 'Pare. No junte nada.',
  metTitle: 'Pare. No hay pesadas.',
  stopAdvice:
    'Mantenga separadas la solución alcalina y las grasas, escriba en ambas qué son y avise a quien formula. No se quite las gafas protectoras ni los guantes.',
  metAdvice:
    'Apague el calor. Déjelo donde está, escriba en el recipiente qué es y avise a quien formula. No se quite las gafas protectoras ni los guantes.',
  right: 'Todo está como está escrito. No hay nada que corregir.',
  sameSize: 'El tamaño queda igual. Haga esto, línea por línea, y que alguien vea cada línea.',
  grown: (mass, more) =>
    `Lo que sobra no se puede retirar; por eso el lote crece un ${percent(more, 2)}, hasta ${mass} en total. Cambian todas las líneas. Haga esto, línea por línea, y que alguien vea cada línea.`,
  keep: 'queda igual',
  add: (mass) => `Añada ${mass}.`,
  addBeforeAlkali: (mass) =>
    `Añada ${mass}, solo mientras no haya álcali dentro. Si ya lo hay, márquelo arriba y lea otra vez.`,
  takeBackBeforeAlkali: (mass) =>
    `Retire ${mass}, solo mientras no haya álcali dentro. Si ya lo hay, márquelo arriba y lea otra vez.`,
  takeBack: (mass) => `Retire ${mass}.`,
  takeBackAlkali: (mass) =>
    `Retire ${mass}, con guantes y gafas protectoras puestos y un utensilio limpio y seco. No vuelve a su bidón.`,
  addAlkaliToLye: (mass) =>
    `Añada ${mass} a la solución alcalina: déjela enfriar antes; después, en porciones pequeñas y removiendo.`,
  addLater: (mass) =>
    `Pese ${mass} en un vaso aparte. Nunca sobre la solución alcalina: se añade a la masa de jabón cuando la solución alcalina y las grasas ya están mezcladas.`,
  notYet: (mass, instead) =>
    `Si aún no está pesado: pese ${mass}. Si está pesado como está escrito: ${instead}`,
};
