import type { workCautions as english } from '../en/cautions-work.ts';
import { largeMass, statedVolume, temperature, volume } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** Cautions about the bench: sizes, vessels, and how the batter behaves. */
export const workCautions: SameShape<typeof english> = {
  'batch-too-small': (n) => ({
    text: `No hay pesadas para el tamaño ${n.batch}: es demasiado pequeño para su balanza.`,
    action:
      'Haga un tamaño mayor o use una balanza más fina. Nunca divida a mano las pesadas de otro tamaño.',
  }),
  'batch-above-vessel': (n) => ({
    text: `El tamaño ${n.batch} son unos ${volume(n.litres * 1000)} de masa de jabón: ${fixed(n.fill, 0)} % de su recipiente de ${statedVolume(n.vessel * 1000)}, y el máximo es ${plain(n.limit)} %.`,
    action:
      'Use un recipiente mayor o un tamaño menor. El jabón caliente y cáustico que se desborda quema.',
  }),
  'batch-above-heat-limit': (n) => ({
    text: `El tamaño ${n.batch} vierte ${largeMass(n.fats * 1000)} de grasas de una vez; el límite del taller por su calor es ${largeMass(n.limit * 1000)}.`,
    action:
      'Use un tamaño menor o varios moldes separados entre sí. Un bloque que no puede perder su calor se agrieta, hierve y se desborda.',
  }),
  'rework-above-cap': (n) => ({
    text: `Jabón reincorporado: ${plain(n.percent)} % de la masa de jabón. El tope del taller es ${plain(n.cap)} %.`,
    action:
      'No lo elabore con tanto. Quien formula debe reducirlo. El jabón reincorporado no cuenta en ninguna pesada ni en ningún sobreengrasado de este manual: solo puede añadirse jabón que haya pasado su ensayo de liberación.',
  }),
  'hot-process-boil-over': (n) => ({
    text: 'El jabón puede subir en segundos durante la cocción y desbordarse, caliente y cáustico.',
    action: `Llene una olla de acero, nunca de aluminio, hasta ${plain(n.fill)} % como máximo. No se aparte de ella; si sube, quite la tapa, retírela del calor y remueva hasta que baje.`,
  }),
  'alcohol-near-heat': (n) => ({
    text: `${n.materials}: el vapor se inflama, y este jabón está caliente.`,
    action:
      'Ninguna llama ni placa al rojo en la sala. Retire la olla del calor, deje que se enfríe por debajo de lo que indique la ficha de datos de seguridad, ventile la sala y solo entonces añádalo.',
  }),
  'heats-batter': (n) => ({
    text: `${n.materials} (azúcares: ${fixed(n.sugar, 1)} % de las grasas) calienta la masa de jabón. Puede agrietarse, salirse del molde o, dentro de la solución alcalina, quemarse.`,
    action:
      'Trabaje a baja temperatura, deje los moldes destapados y separados, y vigile durante las primeras horas.',
  }),
  'salt-sets-fast': (n) => ({
    text: `${n.materials} (${plain(n.percent, 1)} % de las grasas): la pastilla endurece en pocas horas y después se desmorona al cortarla.`,
    action:
      'Use moldes individuales o corte mientras aún esté tibia. En ese momento es cáustica: use guantes.',
  }),
  'free-acid-seizes': (n) => ({
    text: `${n.materials} (${plain(n.share, 1)} % de las grasas): el ácido libre reacciona al contacto, y la masa de jabón puede espesarse como una pasta de golpe.`,
    action:
      'Fúndalo por completo en las demás grasas, mantenga la olla caliente y vierta la solución alcalina despacio.',
  }),
  'fast-trace': (n) => ({
    text: `${n.materials} (${plain(n.share, 1)} % de las grasas): la masa de jabón espesa pronto.`,
    action:
      'Prepare los moldes y los aditivos antes de juntar la solución alcalina con las grasas. Bata en pulsos cortos.',
  }),
  'fragrance-speeds-trace': (n) => ({
    text: `Se sabe que ${n.materials} (${plain(n.percent, 1)} % de las grasas) acelera la masa de jabón: puede espesar en segundos.`,
    action:
      'Trabaje a baja temperatura, tenga listos los moldes, retire la batidora, incorpore la fragancia a mano al final y vierta de inmediato.',
  }),
  'slow-trace': (n) => ({
    text: `El ${fixed(n.unsaturated, 0)} % de los ácidos grasos son insaturados: la traza tarda y la pastilla queda blanda mucho tiempo.`,
    action: 'Tenga paciencia con la batidora y desmolde solo cuando el borde esté firme.',
  }),
  'fragrance-maximum-unknown': (n) => ({
    text: `${n.materials} (${plain(n.percent, 1)} % de las grasas): los datos no contienen el máximo del proveedor, así que aquí nada comprueba la dosis.`,
    action:
      'Consiga el máximo del proveedor para jabón, la hoja de alérgenos y el punto de inflamación, y compare antes de elaborarlo.',
  }),
  'fragrance-above-maximum': (n) => ({
    text: `${n.materials}: ${fixed(n.percent, 2)} % del jabón liberado. El máximo del proveedor es ${plain(n.maximum, 2)} %.`,
    action: 'No lo elabore. Quien formula debe reducir la dosis.',
  }),
  'fragrance-near-flash-point': (n) => ({
    text: `${n.materials} tiene su punto de inflamación a ${temperature(n.flashPoint)}, y este jabón se trabaja a hasta ${temperature(n.hottest)}.`,
    action:
      'Ninguna llama ni placa al rojo en la sala. Deje que el jabón se enfríe antes de añadir la fragancia.',
  }),
};
