import type { printPage as english } from '../en/print-page.ts';
import type { SameShape } from '../same-shape.ts';

/** The whole handbook as one document to print. */
export const printPage: SameShape<typeof english> = {
  title: 'El manual completo, para imprimir',
  about: 'el manual completo como un solo documento, con portada e índice',
  kicker: 'Manual de formulario',
  formulas: (count) => (count === 1 ? '1 fórmula' : `${count} fórmulas`),
  whatTitle: 'Qué es',
  what: 'Todas las fórmulas de esta edición en cada tamaño de lote, calculadas, redondeadas a las balanzas del taller y comprobadas. Pese lo que dice. En el banco de trabajo nadie calcula álcali.',
  notTitle: 'Qué no es',
  not: [
    'No sustituye a la ficha de datos de seguridad del proveedor, ni a las normas locales, ni al consejo de un profesional autorizado. Eso va primero.',
    'El papel no se mantiene al día. Antes de pesar, compare la edición al pie de la página con el manual del taller; el papel de una edición anterior va a la basura.',
    'No es una hoja de trabajo: no tiene espacio para anotar lo que se pesó. Para eso, imprima la hoja de trabajo del lote.',
  ],
  leftOutTitle: 'Qué no contiene',
  leftOut:
    'El cálculo de cada fórmula, las hojas de trabajo, las fichas de los materiales que ninguna fórmula usa, las contradicciones entre fuentes y las listas del buscador. Están en el propio manual.',
  checkLink: '¿Está vigente una hoja?',
  previewNote: 'Los capítulos se incorporan cuando se genera el manual.',
  contents: 'Índice',
  noNumbers:
    'Impreso desde un navegador, este índice no lleva números de página: los capítulos siguen este orden y la cabecera de cada página nombra su capítulo. Donde se genera el manual, “npm run print” produce un archivo PDF con los números.',
  proofMark: 'Prueba, no para usar',
  of: 'de',
  parts: {
    safety: 'Seguridad y advertencias',
    lye: 'Tablas de álcali',
    fats: 'Grasas en uso',
    materials: 'Otros materiales en uso, y partidas',
    methods: 'Métodos, fuentes y comprobación',
    changes: 'Cambios',
  },
};
