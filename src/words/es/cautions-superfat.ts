import { dateText } from '../dates.ts';
import type { superfatCautions as english } from '../en/cautions-superfat.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

const atSize = (batch: string) => (batch === '' ? '' : ` en el tamaño ${batch}`);

/** Cautions about what could be left of alkali or of fat. */
export const superfatCautions: SameShape<typeof english> = {
  'free-alkali-possible': (n) => ({
    text: `El sobreengrasado puede bajar hasta ${fixed(n.lowest, 2)} %${atSize(n.batch)}. Por debajo de cero, el jabón contiene álcali libre.`,
    action:
      'Maneje este jabón con guantes hasta que haya pasado el ensayo. Haga la titulación de cada lote y reténgalo mientras su álcali libre supere el límite.',
  }),
  'superfat-margin-thin': (n) => ({
    text: `El sobreengrasado mínimo es ${fixed(n.lowest, 2)} %${atSize(n.batch)}, menos del ${plain(n.limit)} % que perdonaría un descuido.`,
    action:
      'Haga que otra persona lea cada pesada de grasa y de álcali, y haga el ensayo antes de liberar.',
  }),
  'acid-forgotten': (n) => ({
    text: `Una parte del álcali está ahí para el ácido. Sin el ácido, el sobreengrasado sería ${fixed(n.superfat, 1)} %: un jabón cáustico.`,
    action:
      'Pese el ácido antes que el álcali y marque su casilla cuando lo haya añadido. ¿Duda de haberlo añadido? Detenga el lote.',
  }),
  'concession-in-force': (n) => ({
    text: `Se elabora por concesión por debajo del límite de liberación: sobreengrasado mínimo ${fixed(n.lowest, 2)} %, límite ${plain(n.floor)} %. Otorgada por ${n.by} el ${dateText(n.on)}.`,
    action: 'Lea el motivo en la página de la fórmula y cumpla todas sus condiciones.',
  }),
  'after-cook-fats': (n) => ({
    text: `Se añade después de la cocción: ${n.materials} (${plain(n.percent, 1)} % de las grasas). Para ello no se calcula álcali, y ocultaría el álcali libre.`,
    action:
      'Haga primero el ensayo de álcali libre del jabón cocido. Solo si lo pasa puede añadirse esta grasa.',
  }),
  'wax-in-cold-process': (n) => ({
    text: `Cera en proceso en frío: ${n.materials} (${plain(n.share, 1)} % de las grasas). El álcali se calcula también para ella, pero puede que apenas reaccione.`,
    action:
      'Fúndala por completo y mantenga calientes las grasas mientras trabaja. Haga el ensayo de álcali libre antes de liberar.',
  }),
  'superfat-high': (n) => ({
    text: `El ${plain(n.superfat, 1)} % de la grasa queda sin saponificar, más de ${plain(n.limit)} %. El jabón puede quedar blando y enranciarse pronto.`,
    action: 'Cúrelo más tiempo, guárdelo en lugar fresco y oscuro, y venda primero el más antiguo.',
  }),
};
