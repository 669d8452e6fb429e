import type { materialMethods as english } from '../en/methods-materials.ts';
import { withDecimalSign } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** Models about what goes in: which value is used, free acids, waxes, lots, blends. */
export const materialMethods: SameShape<typeof english> = [
  {
    id: 'choice',
    title: 'Qué valor se usa',
    text: 'Las fuentes se mantienen separadas. Están en un orden por clase: norma, farmacopea, reglamento, manual, artículo, proveedor, práctica; dentro de una clase, lo leído va antes que lo que se sabe de memoria. Se usa el primer intervalo con ambos extremos, y lo que abarcaron unas pocas muestras cuenta solo donde no hay otro. El valor es el menor entre el punto medio y la media documentada más baja de muestras medidas, pero nunca por debajo del intervalo: la lectura que deja menos álcali libre.',
    symbols: [
      ['S_low, S_high', 'extremos del intervalo usado', 'mg KOH/g'],
      ['S_mean', 'media documentada más baja de muestras medidas, donde la hay', 'mg KOH/g'],
    ],
    range: 'Grasas de las que al menos una fuente da un intervalo con ambos extremos.',
    ignores:
      'Todas las demás fuentes. Se muestran en la página de la grasa y, donde no coinciden, en la página de contradicciones.',
    source: 'Procedimiento de este manual.',
  },
  {
    id: 'lots',
    title: 'Partidas medidas',
    text: 'El valor propio de una partida liberada ocupa el lugar del intervalo publicado, con su intervalo declarado a un factor de cobertura de 2. Su acidez libre no añade álcali, porque un índice de saponificación ya cuenta los ácidos libres. La riqueza de una partida de álcali es solo hidróxido. Un certificado de álcali total cuenta el carbonato como hidróxido y se corrige con la ecuación antes de anotarlo en la partida.',
    symbols: [
      ['a', 'riqueza solo como hidróxido, fracción en masa', '1'],
      ['t', 'álcali total del certificado, como hidróxido', '1'],
      ['w', 'carbonato, fracción en masa', '1'],
    ],
    range:
      'Partidas liberadas que no han pasado su fecha de reanálisis. Una muy alejada del intervalo publicado se rechaza como error.',
    ignores: 'Lo que la partida toma del aire después de medirse.',
    source: 'Estequiometría.',
  },
  {
    id: 'titration',
    title: 'Índice de saponificación por titulación',
    text: 'Una muestra pesada de la grasa se hierve con un exceso de álcali, y el resto se titula por retroceso con ácido. Un blanco sin grasa dice cuánto ácido consume el álcali solo.',
    symbols: [
      ['V_0, V_1', 'ácido para el blanco y para la muestra', 'mL'],
      ['c', 'concentración del ácido', 'mol/L'],
      ['m', 'masa de la grasa', 'g'],
      ['u', 'incertidumbre típica de cada lectura, igual para ambos volúmenes', 'la propia'],
    ],
    range: 'Un blanco mayor que la muestra, y lecturas mayores que cero.',
    ignores:
      'El carbonato del álcali en lo que el blanco no lo compensa, y una grasa que no hirvió lo suficiente.',
    // read when shown: the shop's locale decides the decimal sign
    get source() {
      return `ISO 3657 (fórmula y factor ${withDecimalSign('56.1')} de memoria); un ejemplo impreso de 1908 está entre las comprobaciones.`;
    },
  },
  {
    id: 'free-acids',
    title: 'Ácidos grasos libres como materia prima',
    text: 'Un ácido comprado como tal se calcula por su índice de acidez. Reacciona antes que cualquier glicérido, da jabón y agua, y no da glicerol. Su índice de yodo toma los factores de los ácidos libres.',
    symbols: [
      ['n_acids', 'equivalentes de los ácidos libres', 'mol'],
      ['n_esters', 'equivalentes de los glicéridos que se saponificaron', 'mol'],
      ['n_glycerol', 'glicerol liberado', 'mol'],
    ],
    range: 'Ácidos con índice de acidez y su intervalo en los datos de referencia.',
    ignores:
      'Los glicéridos que quedan en los ácidos comerciales. El ácido libre dentro de una grasa natural no se separa: su glicerol se da de más en esa parte.',
    source: 'Estequiometría; grados comerciales como los declaran los proveedores (de memoria).',
  },
  {
    id: 'waxes',
    title: 'Ceras',
    text: 'Los ésteres de una cera dan jabón y alcoholes grasos, y no dan glicerol. Cuentan con todo su índice de saponificación, de modo que no sobra álcali si reaccionan; pero en el proceso en frío puede que apenas reaccionen. Por eso cada extremo inferior del sobreengrasado cuenta solo lo que el ácido libre de una cera consume con seguridad.',
    symbols: [
      ['e_high', 'equivalentes por gramo para el álcali y para los extremos superiores', 'mol/g'],
      [
        'e_sure',
        'equivalentes por gramo para los extremos inferiores en el proceso en frío',
        'mol/g',
      ],
      ['A', 'índice de acidez', 'mg KOH/g'],
    ],
    range: 'Ceras con índice de saponificación e índice de acidez; índice de yodo tabulado.',
    ignores:
      'Hasta qué punto reaccionan de verdad los ésteres, que depende del tiempo y del calor.',
    source:
      'Estequiometría; que los ésteres de las ceras reaccionan lentamente es práctica común, sin fuente.',
  },
  {
    id: 'blends',
    title: 'Mezclas preparadas',
    text: 'Una mezcla de grasas cuenta como sus partes y se pesa como una sola. Su margen de sobreengrasado cuenta como una sola grasa la que está en la mezcla y también fuera de ella, porque tiene un solo índice de saponificación.',
    symbols: [
      ['x_j', 'proporción de la grasa j en la mezcla', '1'],
      ['m_b', 'masa de la mezcla', 'g'],
    ],
    range: 'Mezclas cuyas proporciones suman 100 %.',
    ignores: 'Una mezcla que se ha separado o que se mezcló mal.',
    source: 'Definición.',
  },
];
