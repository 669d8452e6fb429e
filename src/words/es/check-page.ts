import { dateText } from '../dates.ts';
import type { checkPage as english } from '../en/check-page.ts';
import type { SameShape } from '../same-shape.ts';

/** Words of the page on which a printed sheet is checked against the edition. */
export const checkPage: SameShape<typeof english> = {
  title: 'Verificar una hoja',
  about: 'si una hoja impresa es la vigente; todos los códigos vigentes',
  lead: 'Escriba lo que figura en la parte superior de una hoja o tarjeta impresa. No importan las mayúsculas, los guiones ni los espacios; un símbolo equivocado se detecta.',
  code: 'Código',
  codeHint: (code) => `como ${code}`,
  digest: 'Código de pesadas',
  digestHint: 'trece símbolos, como en la hoja después de “Pesadas”',
  button: 'Verificar',
  needsScripts: 'Sin scripts, busque el código de pesadas en la lista de abajo.',
  broken: 'No se pudo cargar la lista de hojas. Busque el código de pesadas en la lista de abajo.',
  missing: 'Escriba los dos: el código y el código de pesadas.',
  current: (code, revision) =>
    `Vigente. Esta es la hoja de ${code}, revisión ${revision}, en esta edición.`,
  superseded: (code, revision, by, on) =>
    `Sustituida. ${code}, revisión ${revision}, fue reemplazada por la revisión ${by} el ${dateText(on)}. No pese con ella; imprima la hoja nueva.`,
  reweighed: (code, revision, on) =>
    `Sustituida. ${code}, revisión ${revision}, se pesa de otro modo desde el ${dateText(on)}: han cambiado las partidas o los ajustes. No pese con ella; imprima la hoja nueva.`,
  left: (code, revision, on) =>
    `Ya no está en la edición desde el ${dateText(on)}: ${code}, revisión ${revision}. No pese con ella; pregunte a quien formula.`,
  withdrawn: (code, on) =>
    `Retirada el ${dateText(on)}: ${code} no debe elaborarse. Pregunte a quien formula.`,
  unknown:
    'Desconocida. Esta edición no conoce ninguna hoja así. No pese con ella; pregunte a quien formula.',
  mistypedDigest:
    'El código de pesadas tiene un símbolo equivocado, de menos o de más. Vuelva a leerlo de la hoja.',
  mistypedCode: 'El código de pesadas es el de otra fórmula. Vuelva a leer el código de la hoja.',
  proof:
    'Esta es una edición de prueba: lo que contiene sin aprobar no está vigente en ninguna parte.',
  listTitle: 'Todos los códigos de pesadas vigentes',
  listLead: (edition, asOf) =>
    `Edición ${edition} al ${dateText(asOf)}. Una hoja cuyo código de pesadas no figura aquí no está vigente.`,
  columns: {
    code: 'Código',
    formula: 'Fórmula',
    revision: 'Revisión',
    size: 'Tamaño',
    digest: 'Código de pesadas',
  },
  nothing: 'Ninguna fórmula de esta edición está aprobada.',
  withdrawnTitle: 'Retiradas',
  withdrawnOn: (on) => `retirada el ${dateText(on)}`,
  whatItProves:
    'Un código de pesadas muestra que una hoja es la que se publicó. Detecta cambios, no falsificaciones.',
};
