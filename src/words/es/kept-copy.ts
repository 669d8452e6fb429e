import { dateText } from '../dates.ts';
import type { keptCopy as english } from '../en/kept-copy.ts';
import type { SameShape } from '../same-shape.ts';

/** What a page says that comes from the copy of an edition on the device. */
export const keptCopy: SameShape<typeof english> = {
  label: 'Copia en este dispositivo',
  checking:
    'Esta página viene de la copia guardada en este dispositivo. Se está consultando si el sitio tiene otra edición.',
  current: (id, keptOn) =>
    `Guardada en este dispositivo el ${dateText(keptOn)}. El sitio tiene la misma edición, ${id}.`,
  unchecked: (id, asOf, keptOn) =>
    `Esta copia es la edición ${id} del ${dateText(asOf)}, guardada en este dispositivo el ${dateText(keptOn)}. No se ha comprobado con el sitio, que no responde: las pesadas pueden haber cambiado desde entonces.`,
  unknown:
    'Esta página viene de una copia guardada en este dispositivo. No se ha comprobado con el sitio: las pesadas pueden haber cambiado desde entonces.',
  other: (id, asOf, keptOn, siteId, siteAsOf) =>
    `Esta copia es la edición ${id} del ${dateText(asOf)}, guardada en este dispositivo el ${dateText(keptOn)}. El sitio tiene ahora la edición ${siteId} del ${dateText(siteAsOf)}: las pesadas pueden haber cambiado.`,
  rebuilt: (id, asOf, keptOn) =>
    `Esta copia es la edición ${id} del ${dateText(asOf)}, guardada en este dispositivo el ${dateText(keptOn)}. El sitio ha generado de nuevo esta edición: las páginas pueden haber cambiado.`,
  replaced:
    'Esta página es de una edición que este dispositivo ya no guarda. Cargue la página de nuevo antes de pesar.',
  take: 'Tomar la edición del sitio',
  taking:
    'Se está tomando la edición del sitio. Hasta que esté completa, esta copia queda como está.',
  notTaken:
    'No se pudo tomar completa la edición del sitio. La copia en este dispositivo queda como estaba: las pesadas pueden haber cambiado desde entonces.',
  notKeptTitle: 'No está en esta copia',
  notKept: [
    'Esta página no está en la copia del manual que guarda este dispositivo. Todavía no se ha leído aquí, o es de otra edición.',
    'Con red, tome la edición del sitio si el aviso de arriba la ofrece, y abra la página de nuevo. Mientras tanto, no pese nada según la hoja de otra edición.',
  ],
  contents: 'Al índice de esta copia',
};
