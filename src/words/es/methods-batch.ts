import type { batchMethods as english } from '../en/methods-batch.ts';
import type { SameShape } from '../same-shape.ts';

/** Models about a batch: its lye beside the heat, its size, what it gives, what is done after. */
export const batchMethods: SameShape<typeof english> = [
  {
    id: 'stock-lye',
    title: 'Solución de reserva',
    text: 'Donde la partida de álcali es una solución, la hoja imprime la solución de reserva y el agua adicional. El agua de la propia solución de reserva cuenta como agua de la fórmula.',
    symbols: [
      ['a', 'riqueza de la solución de reserva: hidróxido por masa de solución', '1'],
      ['m_pure', 'hidróxido necesario', 'g'],
      ['m_all', 'agua que pide la fórmula', 'g'],
    ],
    range:
      'Una solución de reserva más concentrada que la solución alcalina pedida. Una más diluida se rechaza.',
    ignores:
      'El calor de diluir la solución de reserva: no se da ninguna temperatura. Los cristales que ya están en el bidón; la advertencia nombra la temperatura a la que se forman.',
    source:
      'Estequiometría; temperaturas de los primeros cristales como las da la fuente de la tabla (de memoria).',
  },
  {
    id: 'lye-limits',
    title: 'Saturación y punto de ebullición de la solución alcalina',
    text: 'Líneas rectas entre los puntos de las tablas. El hidróxido del recipiente se compara con una solución alcalina saturada a la temperatura inicial, a la que salen cristales al enfriarse, y a la más alta. En una solución alcalina mixta decide el álcali menos soluble.',
    symbols: [
      ['y', 'saturación o punto de ebullición en x', '%, °C'],
      ['x', 'temperatura, o porcentaje de hidróxido', '°C, %'],
      ['x_0, y_0, x_1, y_1', 'los puntos de la tabla a ambos lados', 'como x e y'],
    ],
    range:
      'Dentro de las tablas. Nada se prolonga más allá de sus extremos; una solución alcalina mixta no tiene aquí punto de ebullición.',
    ignores: 'Las sales, el azúcar y los ácidos en la solución alcalina.',
    source:
      'Tablas de los datos de referencia; las cifras son de memoria, y los conjuntos se contradicen alrededor de 20 °C.',
  },
  {
    id: 'batch-size',
    title: 'Tamaño de un lote',
    text: 'Un tamaño se indica por sus grasas, por su masa de jabón, por pastillas y el peso vertido para una, o por el volumen del molde. Las tres últimas maneras dicen lo que debe llegar al molde, de modo que las pérdidas del taller se suman. El volumen se calcula por mezcla ideal: se supone que cada parte conserva su propio volumen.',
    symbols: [
      ['b', 'masa de jabón por grasas de la fórmula', 'g/g'],
      ['l', 'pérdidas: lo que queda en los recipientes, respecto de lo elaborado', '1'],
      ['N, m_bar', 'número de pastillas, y peso vertido de una', 'g'],
      ['V', 'volumen del molde', 'mL'],
      ['d', 'densidad de la masa de jabón', 'g/mL'],
      ['d_i', 'densidad de cada grasa y de la solución alcalina', 'g/mL'],
    ],
    range:
      'Pérdidas de hasta 50 %. Por volumen, solo donde se conocen todas las densidades; el resultado es una estimación.',
    ignores:
      'Por volumen: el aire que entra al batir, la contracción al mezclar y la temperatura, pues las densidades son a 20 °C. Se supone que los aditivos y los líquidos son tan densos como el resto.',
    source: 'Definición; densidades de los datos de referencia.',
  },
  {
    id: 'after-cook',
    title: 'Grasas y ácidos de después de la cocción',
    text: 'Lo que entra después de la cocción no recibe álcali. Se muestran el sobreengrasado de la cocción y el final. Un ácido que entra entonces libera ácido graso del jabón, que cuenta como no saponificado.',
    symbols: [
      ['E_late', 'equivalentes de las grasas que entran después de la cocción', 'mol'],
      ['n_late', 'protones de ácido que entran después de la cocción', 'mol'],
    ],
    range: 'Solo en el proceso en caliente.',
    ignores: 'El álcali que todavía está libre cuando entran; la hoja exige antes una prueba.',
    source: 'Estequiometría.',
  },
  {
    id: 'yields',
    title: 'Rendimiento a la liberación',
    text: 'El secado quita solo agua, hasta alcanzar la humedad de liberación de la fórmula o del taller. Todo lo demás pasa a ser una parte mayor de un total menor. La materia grasa total se muestra en fresco y a la liberación, junto a los grados que una norma publicada establece para el jabón de tocador; el grado nombra una clase de jabón, no su mérito. Las pastas y los líquidos no se secan.',
    symbols: [
      ['m_dry', 'todo menos el agua', 'g'],
      ['f', 'humedad de liberación, fracción en masa', '1'],
      ['k', 'pastillas enteras de lo vertido', '1'],
    ],
    range: 'Pastillas más húmedas que la humedad de liberación. Una más seca se queda como está.',
    ignores:
      'El agua que se evapora en la cocción, la carbonatación, el glicerol que toma agua del aire húmedo, los recortes.',
    source:
      'Balance de masa; materia grasa total como en ISO 685, grados de IS 2888:2004 (ambos de memoria).',
  },
  {
    id: 'days',
    title: 'Días de corte y de liberación',
    text: 'Los extremos inferiores de los objetivos de desmoldar y de curado, ambos contados desde la elaboración, que es el día 0. Una parte de un día cuenta entera, y ninguna liberación llega antes del corte.',
    symbols: [
      ['D', 'primer día', 'd'],
      ['t', 'extremo inferior del objetivo', 'h'],
    ],
    range: 'Fórmulas que indican el objetivo.',
    ignores: 'Cómo está de verdad el jabón. Deciden los ensayos para la liberación.',
    source: 'Procedimiento de este manual; los objetivos son del propio taller.',
  },
  {
    id: 'dilution',
    title: 'Dilución de una pasta',
    text: 'Una cocción evapora un agua que ningún cálculo conoce, mientras que el jabón se queda. Por eso el contenido de la pasta es el jabón del balance de masa dividido entre la pasta tal como se pesa, y la teoría está al lado. Lo que la fórmula añade en la dilución forma parte de la masa añadida.',
    symbols: [
      ['m_soap', 'jabón seco del balance de masa', 'g'],
      ['m_paste', 'pasta tal como se pesa', 'g'],
      ['c_0', 'contenido de jabón de la pasta', '1'],
      ['c_1', 'contenido de jabón deseado', '1'],
      ['m_add', 'agua por añadir', 'g'],
    ],
    range: 'Contenidos deseados por debajo del de la pasta.',
    ignores:
      'El jabón que queda en la caldera, y si el líquido sigue transparente con ese contenido. Eso se averigua con una prueba.',
    source: 'Balance de masa.',
  },
  {
    id: 'release',
    title: 'Límite de liberación: el mínimo admitido de sobreengrasado',
    text: 'El taller fija un mínimo admitido para un extremo de un intervalo de sobreengrasado, por clase y proceso. Con él se comparan el intervalo de la fórmula y los de todos sus tamaños, con la balanza contada; decide el más bajo. Por debajo de ese mínimo no se publica nada sin una concesión por escrito.',
    symbols: [
      ['s_low', 'extremo inferior que nombra el límite', '1'],
      ['s_floor', 'mínimo admitido por el taller', '1'],
    ],
    range: 'Como en el margen de sobreengrasado.',
    ignores:
      'Todo lo que halla un ensayo de liberación. Es un límite para publicar, no una liberación.',
    source: 'Procedimiento de este manual; concesión como en ISO 9000 (de memoria).',
  },
];
