import { dateText } from '../dates.ts';
import type { lyeCautions as english } from '../en/cautions-lye.ts';
import { statedTemperature, temperature } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

const STRONG_LYE =
  'Ponga la jarra en agua con hielo, añada el álcali al agua en porciones pequeñas y espere a que cada una se disuelva.';

/** Cautions about the lye and its alkali. */
export const lyeCautions: SameShape<typeof english> = {
  'lye-heat-near-boiling': (n) => ({
    text: `Hecha de una sola vez, esta solución alcalina puede calentarse por sí sola hasta ${temperature(n.peak)}. Hierve a ${temperature(n.boiling)}.`,
    action: STRONG_LYE,
  }),
  'lye-hot': (n) => ({
    text: `Hecha de una sola vez, esta solución alcalina puede calentarse por sí sola hasta ${temperature(n.peak)}, más de lo que resisten muchos plásticos.`,
    action: `Use una jarra de acero. ${STRONG_LYE}`,
  }),
  'lye-heat-unknown': (n) => ({
    text: `No se sabe cuánto se calienta esta solución alcalina al ${fixed(n.asMade, 0)} %${n.potassium > 0 ? ': no hay datos para el hidróxido de potasio' : ''}. Dé por hecho que hierve.`,
    action: STRONG_LYE,
  }),
  'lye-stronger-than-written': (n) => ({
    text: `Una parte del agua se añade después. En la jarra, la solución alcalina tiene ${fixed(n.asMade, 1)} % de álcali, no ${fixed(n.written, 1)} %: está más caliente y es más cáustica.`,
    action:
      'Pese el agua de la jarra según su propia línea. Enfríe la jarra y mantenga el resto del agua lejos de ella.',
  }),
  'lye-near-saturation': (n) => ({
    text: `La solución alcalina contiene ${fixed(n.percent, 1)} % de hidróxido; a ${statedTemperature(n.temperature)} no se disuelve más de ${fixed(n.saturation, 1)} %.`,
    action:
      'Remueva hasta que esté transparente, no deje que se enfríe y busque granos antes de verter: cada grano es un punto cáustico en el jabón.',
  }),
  'potassium-lye': (n) => ({
    text: `El ${fixed(n.potassium, 0)} % del hidróxido es hidróxido de potasio. Absorbe agua del aire en pocos minutos y salpica al tocar el agua.`,
    action:
      'Lea la etiqueta dos veces: ninguno de los dos álcalis sustituye al otro a igual peso. Pese rápido, cierre el saco y mantenga la cara apartada de la jarra.',
  }),
  'stock-lye': (n) => ({
    text: `${n.name}, partida ${n.lot}, es una solución de reserva al ${fixed(n.assay, 1)} %: es cáustica tal como está, y con el frío forma cristales que dejan el resto más débil.`,
    action:
      'Póngase las gafas protectoras y los guantes antes de quitar el tapón. No pese de ella mientras haya cristales; caliéntela solo como lo permita su ficha de datos de seguridad.',
  }),
  'stock-crystallises': (n) => ({
    text: `${n.name}, partida ${n.lot}, al ${fixed(n.assay, 1)} %, empieza a cristalizar a unos ${temperature(n.crystals)} (${n.how}).`,
    action:
      'Manténgala por encima de esa temperatura, también durante el transporte. Si ha estado más fría, busque cristales y no pese nada de ella hasta que vuelva a estar uniforme.',
  }),
  'alkali-without-lot': (n) => ({
    text: `No hay ninguna partida liberada de ${n.name}. Se calcula con una riqueza de ${fixed(n.reckoned, 1)} %, el extremo fuerte del intervalo de ${fixed(n.low, 1)} a ${fixed(n.high, 1)} %.`,
    action:
      'Haga la titulación de la partida o registre su certificado. Hasta entonces espere más sobreengrasado que el de la fórmula, y nunca use un saco con una riqueza por encima de ese intervalo.',
  }),
  'alkali-lot-retest': (n) => ({
    text:
      n.days < 0
        ? `La partida ${n.lot} de ${n.name} debía reanalizarse a más tardar el ${dateText(n.retestBy)}.`
        : `La partida ${n.lot} de ${n.name} debe reanalizarse a más tardar el ${dateText(n.retestBy)}, dentro de ${plain(n.days)} ${n.days === 1 ? 'día' : 'días'}.`,
    action:
      n.days < 0
        ? 'No pese de ella. Haga su titulación o libere otra partida.'
        : 'Haga su titulación ahora o pida la próxima partida. Mantenga el saco cerrado.',
  }),
  'lye-and-metals': (n) => ({
    text: `Una solución alcalina al ${fixed(n.concentration, 0)} % corroe el aluminio, el zinc y el estaño, y desprende hidrógeno, que es inflamable.`,
    action: 'Solo acero inoxidable o polipropileno: jarra, olla, cuchara, colador y molde.',
  }),
};
