import { dateText } from '../dates.ts';
import type { cardWords as english } from '../en/card.ts';
import type { SameShape } from '../same-shape.ts';

/** Words of the bench card. Short: it is read at arm's length. */
export const cardWords: SameShape<typeof english> = {
  title: (code, name, label) => `${code} ${name}, ${label}: tarjeta de trabajo`,
  revision: (revision) => `Revisión ${revision}`,
  fingerprint: (text) => `Fórmula ${text}`,
  digest: (text) => `pesadas ${text}`,
  asOf: (date) => `al ${dateText(date)}`,
  lots: (lots) => `Solo con las partidas ${lots}.`,
  noLots: 'Sin partidas: calculado con los intervalos comerciales.',
  order: 'El álcali al agua, nunca agua sobre el álcali.',
  more: (count) =>
    count === 1
      ? 'Una advertencia más: lea la página de la fórmula.'
      : `${count} advertencias más: lea la página de la fórmula.`,
  noCautions: 'La página de seguridad vale para todos los lotes.',
  side: (number, of) => `${number} de ${of}`,
  goesOn: (count) =>
    count === 1 ? 'Dé la vuelta: falta una pesada.' : `Dé la vuelta: faltan ${count} pesadas.`,
  continued: (group) => `${group}, continuación`,
  scanned: 'Página de la fórmula',
  concession: (by) => `Por concesión de ${by}: el motivo está en la página de la fórmula.`,
  invented: 'Demostración: un taller inventado.',
  links: {
    sheet: 'Hoja de trabajo',
    picture: 'Tarjeta de trabajo',
    svg: 'SVG',
    png: 'PNG',
  },
};
