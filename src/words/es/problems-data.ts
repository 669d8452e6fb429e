import type { DATA_PROBLEMS as english } from '../en/problems-data.ts';
import type { SameShape } from '../same-shape.ts';

/** Every problem that reading and checking `data/` can find, by its permanent id. */
export const DATA_PROBLEMS: SameShape<typeof english> = {
  'data/missing-folder': { title: 'Falta una carpeta de datos' },
  'data/missing-file': { title: 'Falta un archivo de datos' },
  'data/unknown-file': { title: 'Un archivo que no forma parte de los datos' },
  'data/unreadable': { title: 'El archivo no se puede leer' },
  'data/too-large': { title: 'El archivo es mayor de lo que puede ser un archivo de datos' },
  'data/not-utf8': { title: 'El archivo no es texto UTF-8' },
  'data/hidden-character': { title: 'Un carácter que no se ve' },
  'data/empty-file': { title: 'El archivo está vacío' },
  'data/yaml': { title: 'El archivo no es YAML válido' },
  'data/tab': { title: 'Un tabulador donde corresponden espacios' },
  'data/duplicate-key': { title: 'Una clave que aparece dos veces' },
  'data/anchor': {
    title: 'Las anclas, los alias y las claves de fusión no se usan en los archivos de datos',
  },
  'data/unknown-key': { title: 'Una clave que este archivo no tiene' },
  'data/missing-key': { title: 'Falta una clave necesaria' },
  'data/wrong-type': { title: 'Un valor de tipo equivocado' },
  'data/unknown-word': { title: 'Una palabra que no es una de las opciones' },
  'data/out-of-range': { title: 'Un número fuera del intervalo que puede tener' },
  'data/text-form': { title: 'Un texto que no tiene su forma' },
  'data/measure-form': { title: 'Una medida que no es un número con su unidad' },
  'data/locale': { title: 'Una configuración regional desconocida' },
  'data/untranslated-name': {
    title: 'Un material del paquete sin nombre en el idioma del taller',
  },
  'data/date': { title: 'Una fecha que no está en el calendario' },
  'data/value-or-range': { title: 'Un registro sin valor ni intervalo, o con ambos' },
  'data/range-order': {
    title: 'Un intervalo cuyo extremo inferior está por encima del superior',
  },
  'data/unknown-source': { title: 'Una fuente que no tiene registro' },
  'data/unknown-acid': { title: 'Un ácido graso que no está en la lista' },
  'data/unknown-fat': { title: 'Una grasa que no tiene archivo' },
  'data/unknown-alkali': { title: 'Un álcali que no tiene archivo' },
  'data/scale-units': { title: 'Una balanza en unidades con las que no se pesa en el taller' },
  'data/unknown-scale': { title: 'Una balanza que el taller no tiene' },
  'data/molecular-formula': { title: 'Una fórmula molecular que no se puede calcular' },
  'data/acid-form': { title: 'Un ácido cuyo nombre y fórmula no coinciden' },
  'data/order-of-choice': { title: 'Registros que no siguen el orden de elección' },
  'data/composition-sum': { title: 'Una composición que no suma 100 %' },
  'data/computed-saponification-value': {
    title: 'Una composición que no encaja con el índice de saponificación',
  },
  'data/computed-iodine-value': {
    title: 'Una composición que no encaja con el índice de yodo',
  },
  'data/evidence-disagrees': { title: 'Un valor calculado que no coincide con el publicado' },
  'data/evidence-without-number': {
    title: 'Un valor publicado con el que no se puede contrastar ningún modelo',
  },
  'data/stale-exception': { title: 'Una excepción que ya no hace falta' },
  'data/no-trade-range': { title: 'Un álcali sin intervalo de riqueza' },
  'data/fat-of-liquid': { title: 'Un líquido cuya grasa no se conoce' },
  'data/table-order': { title: 'Puntos de una tabla que no son crecientes' },
  'data/batch-size': { title: 'Un tamaño de lote que no se indica de una sola manera' },
  'data/repeated-entry': { title: 'Lo mismo, dos veces en la lista' },
  'data/fixed-day': { title: 'Un día fijo para un taller que no es inventado' },
  'data/two-released-lots': { title: 'Dos partidas liberadas de un mismo material' },
  'data/lot-dates': {
    title: 'Una partida abierta después de su fecha de reanálisis',
  },
  'data/lot-outside-range': {
    title: 'Una partida medida muy lejos del intervalo publicado',
  },
  'data/lot-acid-value': { title: 'Una partida con más ácido libre del que puede tener' },
  'data/lot-past-retest': {
    title: 'Una partida liberada cuya fecha de reanálisis ya pasó',
  },
  'data/blend-id': { title: 'Una mezcla con el id de otro material' },
  'data/blend-part': { title: 'Una mezcla con una grasa con la que no se puede calcular' },
  'data/blend-sum': { title: 'Una mezcla cuyas proporciones no suman 100 %' },
  'data/lot-sum': { title: 'Una partida cuyas partes suman más de 100 %' },
};
