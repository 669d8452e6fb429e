import { dateText } from '../dates.ts';
import type { sheetWords as english } from '../en/sheet.ts';
import {
  expectedMass,
  massAtMost,
  massUnit,
  massUnits,
  statedMass,
  temperature,
} from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** The bench sheet: what is read, ticked and written while one batch is made. */
export const sheetWords: SameShape<typeof english> = {
  title: (code, name, label) => `${code} ${name}, ${label}: hoja de trabajo`,
  kicker: 'Hoja de trabajo',
  front: 'Anverso: pesar',
  back: 'Reverso: elaborar y liberar',
  revision: (revision) => `Revisión ${revision}`,
  asOf: (date) => `con fecha ${dateText(date)}`,
  edition: (id) => `Edición ${id}`,
  digest: (text) => `Pesadas ${text}`,
  fingerprint: (text) => `Fórmula ${text}`,
  approved: (by, on, until) =>
    `Aprobada por ${by} el ${dateText(on)}, revisar a más tardar el ${dateText(until)}`,
  print: 'Imprima en A4 o Carta, por las dos caras de una hoja, a tamaño real.',
  backToFormula: 'A la fórmula',
  card: 'Tarjeta de trabajo',
  blanks: {
    batch: 'Número de lote',
    date: 'Elaborado el',
    maker: 'Pesa',
    checker: 'Comprueba',
    start: 'Empezado a las',
  },
  stop: {
    title: 'Primero, alto. Marque todas estas casillas o no pese.',
    current: 'Esta hoja es la vigente: código y código de pesadas buscados hoy en el manual.',
    lots: 'Los sacos y bidones que tengo delante llevan estas partidas:',
    lot: (lot, until) => `${lot}, reanalizar a más tardar el ${dateText(until)}`,
    noLot: '(cualquier partida dentro del intervalo publicado)',
    scales: (scales) => `La balanza está nivelada y comprobada hoy: ${scales}.`,
    scale: (name, step) => `${name}, escalones de ${step} ${massUnit()}`,
    checkWeight: 'Pesa de control / lectura',
    ready:
      'Llevo puestos las gafas protectoras, los guantes y el delantal, el grifo funciona y hay otra persona en el edificio.',
    cautions: 'Las advertencias de esta hoja están leídas.',
    otherwise:
      'Otra partida, otra revisión, una balanza dudosa: deténgase y pregunte a quien formula. Nunca adapte las cantidades a mano.',
  },
  cautions: 'Advertencias',
  moreCautions: 'Más advertencias',
  weigh: {
    title: 'Pese cada cosa en un vaso propio, en este orden',
    columns: {
      tick: 'Hecho',
      what: 'Material',
      howMuch: 'Pesar',
      lot: 'Partida usada',
      actual: 'La balanza indicó',
      by: 'Por',
      checked: 'Visto',
    },
    order: 'El álcali al agua, nunca agua sobre el álcali.',
    afterCook:
      'Alto. Mida el álcali libre del jabón cocido. Nada de lo que sigue entra antes de que haya pasado la prueba.',
    afterCookLimit: (limit) => `Hallado / máximo ${limit}`,
    afterCookNoLimit: 'Hallado / límite',
    paste: 'Pese primero la pasta. Cuenta lo que indica la balanza, no la suma de lo que entró.',
    get pasteBlank() {
      return `Pasta, ${massUnits()}`;
    },
    sums: (lye, fats, all) =>
      `En el recipiente de la solución alcalina ${lye} ${massUnit()}. Grasas ${fats} ${massUnit()}. Todo junto ${all} ${massUnit()}.`,
    superfat: (weighed, lowest) =>
      `Sobreengrasado con estos pesos ${fixed(weighed, 2)} %; sobreengrasado mínimo ${fixed(lowest, 1)} %.`,
    doubt: 'Si duda de si una línea se pesó: empiece de nuevo ese recipiente.',
  },
  heat: {
    title: 'Calor de la solución alcalina',
    peak: (peak, start) =>
      `Hasta ${temperature(peak)} desde un inicio a ${temperature(start)}, sin pérdida de calor.`,
    boils: (boiling) =>
      `Hierve a unos ${temperature(boiling)}: añada el álcali en porciones pequeñas y deje enfriar entre ellas.`,
    unknown: 'No hay número, y por eso rige la advertencia más fuerte: trátela como si hirviera.',
  },
  readings: {
    title: 'Temperaturas y tiempos',
    columns: { what: 'Qué', aim: 'Objetivo', found: 'Hallado', at: 'Hora' },
    more: { trace: 'Traza alcanzada', poured: 'Vertido' },
  },
  method: 'Método para este tamaño',
  record: {
    title: 'Lo que se hizo de otro modo',
    deviations: 'Desviaciones y lo que se decidió',
    rework: 'Jabón reincorporado: lote, masa, acordado por',
    /** Cut off, never rounded up: it is the most. */
    reworkAtMost: (percent, mass) =>
      `Jabón reincorporado (máximo ${plain(percent)} %, ${massAtMost(mass)}): lote, masa, acordado por`,
    portions: 'Masa de jabón dividida: porción, peso, qué se le unió',
  },
  yield: {
    title: 'Rendimiento y días',
    expected: (poured, total) =>
      `Se esperan en los moldes ${expectedMass(poured)}; nunca más de los ${expectedMass(total)} pesados.`,
    expectedVat: (poured, total) =>
      `Se esperan en la tina ${expectedMass(poured)}, menos lo que se evapore al hervir; nunca más de los ${expectedMass(total)} pesados.`,
    losses: (percent) =>
      `Están descontadas pérdidas de ${plain(percent, 1)} %. Si hay menos de lo esperado: escriba por qué.`,
    bars: (count, wetMass) => `${count} pastillas de ${statedMass(wetMass, 1)}`,
    released: (mass) => `${expectedMass(mass)} con la humedad de liberación.`,
    actual: 'Masa real',
    count: 'Pastillas buenas / perdidas',
    cut: (days) => `No cortar antes de elaboración + ${plain(days)} d`,
    release: (days) => `No liberar antes de elaboración + ${plain(days)} d`,
  },
  release: {
    title: 'Liberación',
    columns: {
      what: 'Ensayo',
      limit: 'Límite',
      method: 'Método',
      found: 'Hallado',
      by: 'Por',
    },
    freeAlkali: 'Álcali libre',
    freeAlkaliLimit: (percent) => `máximo ${plain(percent)} % como NaOH`,
    freeAlkaliMethod: 'ISO 456, dos muestras',
    ph: 'pH',
    phMethod: 'ISO 4316, 10 g en 1 L de agua*',
    moisture: 'Humedad',
    moistureLimit: (percent) => `máximo ${plain(percent)} %`,
    moistureMethod: 'ISO 672',
    none: 'La fórmula no fija ningún límite. No libere antes de que quien formula lo haya fijado.',
    note: '* La dilución es práctica común, sin fuente: ISO 4316 la deja a cada producto.',
    sample: 'Muestra guardada, dónde y hasta cuándo',
    decision: 'Decisión',
    decisions: ['Liberado', 'Retenido', 'Rechazado'],
    signature: 'Nombre, firma, fecha',
  },
  emergency: 'Emergencia',
  noEmergency: 'Este taller no tiene registrado ningún número de emergencia.',
  first: 'La ficha de datos de seguridad (FDS) del proveedor y las reglas locales van primero.',
};
