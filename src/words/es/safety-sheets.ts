import type {
  safetyPoster as englishPoster,
  safetyRecord as englishRecord,
} from '../en/safety-sheets.ts';
import type { SameShape } from '../same-shape.ts';

/** What hangs on the wall. */
export const safetyPoster: SameShape<typeof englishPoster> = {
  title: 'Solución alcalina: cartel para la pared',
  rule: 'El álcali al agua. Nunca agua sobre el álcali.',
  wear: 'Gafas protectoras cerradas, guantes, mangas largas, delantal, calzado cerrado: desde la primera pesada hasta el último recipiente enjuagado.',
  metals: 'Ni aluminio, ni zinc, ni estaño.',
  alone: 'Nunca a solas en el edificio.',
  spill: 'Derrame: mantenga lejos a los demás, barra en seco, sin ácido, después mucha agua.',
  places: ['Lavaojos y grifo', 'Botiquín', 'Fichas de datos de seguridad'],
  fill: 'escríbalo a mano',
};

/** What every maker signs. */
export const safetyRecord: SameShape<typeof englishRecord> = {
  title: 'Registro de la instrucción de seguridad',
  lead: 'Una hoja por cada persona que elabora. Nadie trabaja con solución alcalina antes de que todas las líneas lleven iniciales.',
  person: ['Nombre', 'Empezó el', 'Instruye'],
  initials: 'Iniciales de ambos',
  done: [
    'Ha leído la página de seguridad y las fichas de datos de seguridad de ambos álcalis',
    'Ha encontrado el grifo, el lavaojos, el botiquín, el teléfono y la salida, y ha probado el agua',
    'Conoce los números del recuadro de emergencia y ha dicho qué hay que comunicar',
    'Se ha puesto gafas protectoras y guantes de su talla, y sabe cuándo cambiarlos',
    'Ha explicado por qué el álcali se echa al agua, y lo ha mostrado con una persona experimentada al lado',
    'Sabe qué recipientes no deben tocar la solución alcalina',
    'Sabe qué hacer con la solución alcalina en un ojo, en la piel, ingerida o inhalada; y que ahí no se neutraliza nada',
    'Ha recogido un derrame de agua como si fuera solución alcalina',
    'Sabe adónde van los residuos y qué pasa con un lote dudoso',
    'Ha leído las fórmulas de “Lo que aquí exige más cuidado” y sus advertencias',
  ],
  signatures: 'Firmas',
  columns: ['Ocasión', 'Fecha', 'Quien elabora', 'Quien instruye', 'Edición leída'],
  firstTime: 'Primera instrucción',
  yearly: 'Repaso anual',
  keep: 'Guárdelo tanto tiempo como pida la ley del lugar.',
};
