import type { safetySections as english } from '../en/safety-sections.ts';
import type { SameShape } from '../same-shape.ts';

/** The safety page between first aid and the rules of the shop, in order of reading. Common practice throughout. */
export const safetySections: SameShape<typeof english> = [
  {
    id: 'what',
    title: 'Qué es la solución alcalina',
    items: [
      'El hidróxido de sodio (sosa o soda cáustica) y el hidróxido de potasio (potasa cáustica) convierten la grasa en jabón. La piel y los ojos están hechos de cosas que estos disuelven igual de bien.',
      'Disueltos en agua son la solución alcalina: transparente, sin olor y caliente. Parece agua. Por eso se etiqueta y nunca se pierde de vista. En el oficio se llama también lejía cáustica; nunca es lejía doméstica (cloro, lavandina).',
      'La solución alcalina y las grasas mezcladas son la masa de jabón; también es cáustica. El jabón fresco puede contener todavía álcali libre, que es álcali que no ha encontrado grasa. Trátelo como cáustico hasta que se haya medido.',
    ],
  },
  {
    id: 'before',
    title: 'Antes de empezar',
    items: [
      'Lea las fichas de datos de seguridad de los proveedores, la del álcali y las de todos los demás materiales que vaya a usar. Sepa dónde están.',
      'Agua corriente a pocos pasos, para los ojos, la piel y el suelo, y un lavaojos donde la ficha de datos de seguridad lo pida. Pruébelos antes de abrir el álcali.',
      'Sepa dónde están el teléfono, el botiquín y la salida.',
      'Despeje la mesa y el suelo. Sin comida, sin bebida, sin mangas sueltas ni bufanda, con el pelo recogido.',
      'Lea entera la página de la fórmula, primero sus advertencias. Compárela con su hoja: código, revisión, tamaño de lote y partidas (los números de los sacos y envases). Si una difiere, no empiece; pregunte a quien formula, que escribió la fórmula y responde por ella.',
    ],
  },
  {
    id: 'alone',
    title: 'Quién no debe hacerlo a solas',
    items: [
      'Nadie trabaja con solución alcalina a solas en el edificio. Una persona al alcance de la voz sabe qué hace usted y dónde está el agua.',
      'Quien empieza a elaborar trabaja junto a una persona experimentada hasta que ambas hayan firmado el registro.',
      'Menores de dieciocho años: solo donde la ley lo permita, y nunca sin una persona experimentada al lado.',
      'Con cansancio, enfermedad, prisa, mareo por un medicamento, o con un brazo o una mano que no funcionan como siempre: hoy no.',
      'Embarazo, asma, un solo ojo sano: consulte primero a un médico; después acuerden qué hace usted y qué hacen otros.',
      'Niños, animales y visitas quedan fuera de la sala.',
    ],
  },
  {
    id: 'equipment',
    title: 'Qué ponerse',
    items: [
      'Gafas protectoras que cierren todo alrededor, o una pantalla facial sobre ellas. Los anteojos comunes no bastan. Sin lentes de contacto.',
      'Los guantes que la ficha de datos de seguridad indica para el álcali, lo bastante largos para cubrir la muñeca. Busque agujeros; cámbielos cuando les entre una salpicadura.',
      'Mangas largas por encima de los guantes, pantalón largo por encima de calzado cerrado, un delantal que no se empape.',
      'Lleve todo puesto hasta que los utensilios estén limpios. Después lave los guantes antes de quitárselos.',
    ],
  },
  {
    id: 'vessels',
    title: 'Recipientes y sala',
    items: [
      'Acero inoxidable, o polipropileno o polietileno marcados como resistentes al calor. Vidrio resistente al calor, solo donde las reglas del taller lo permitan: la solución alcalina lo ataca, y un día se raja.',
      'Nunca aluminio, zinc ni estaño, ni recipientes recubiertos o soldados con ellos. La solución alcalina los ataca y desprende hidrógeno, que arde.',
      'Para la solución alcalina, un recipiente hondo, lleno como máximo hasta la mitad, dentro de un fregadero o de una cubeta donde quepa toda.',
      'Abra la ventana o encienda el extractor. El polvo de álcali y la niebla sobre la solución alcalina caliente dañan los pulmones. Si le hace toser, apártese y deje que se despeje.',
    ],
  },
  {
    id: 'mixing',
    title: 'El álcali al agua',
    lead: 'Añada siempre el álcali al agua, en porciones y removiendo. Nunca vierta agua sobre el álcali.',
    items: [
      'Por qué: al disolverse libera mucho calor. Cuando poco álcali llega a mucha agua, el agua absorbe el calor. Cuando poca agua llega a mucho álcali, hierve de golpe y lanza gotas cáusticas.',
      'Primero el agua fría, pesada, en el recipiente. Después el álcali, una porción cada vez.',
      'Espere a que cada porción se disuelva. Lo que queda sin disolver en el fondo se disuelve todo de golpe cuando se remueve.',
      'Mantenga la cara a un lado. Nunca se incline sobre el recipiente.',
      'Ponga al recipiente la etiqueta “SOLUCIÓN ALCALINA, corrosiva” y cúbralo sin cerrarlo. Nunca un recipiente para beber, nunca una botella cerrada.',
      'Vierta la solución alcalina en las grasas, despacio, por la pared. No desde lo alto, ni las grasas sobre la solución alcalina.',
    ],
  },
  {
    id: 'heat',
    title: 'Calor',
    items: [
      'La solución alcalina se calienta sola. La página de la fórmula dice cuánto como máximo; donde dice que no hay número, cuente con que hierve.',
      'Donde una fórmula reserva agua para añadirla más tarde, la solución alcalina del recipiente es más concentrada y más caliente de lo que dice el porcentaje de su fórmula.',
      'Deje enfriar la solución alcalina donde está. Llévela solo cubierta, con las dos manos y el camino libre.',
      'La leche, la miel, el azúcar y el alcohol calientan la masa de jabón por sí mismos. Déjele espacio y mírela cada pocos minutos.',
      'Proceso en caliente, donde el jabón se cuece: recipiente lleno como máximo hasta la mitad, quédese al lado, con una cuchara y una superficie fría a mano. Puede subir como la leche al hervir.',
      'Alcohol, solo lejos de llamas, placas calientes y chispas.',
    ],
  },
  {
    id: 'work',
    title: 'Mientras trabaja',
    items: [
      'Pese las líneas de un solo tamaño de lote de arriba abajo, cada una en un vaso propio, y marque cada una. Cierre el álcali en cuanto lo haya pesado; toma agua y dióxido de carbono del aire y pierde fuerza.',
      'Si no sabe con certeza si una línea se pesó, empiece de nuevo ese recipiente, y aparte con etiqueta lo que contiene.',
      'Batidora: encendida solo bajo la superficie, apagada antes de sacarla.',
      'Guantes y gafas protectoras también con el jabón fresco: al desmoldar, al cortar y al lavar.',
      'Ninguna pastilla sale del taller antes de que se haya medido su álcali libre y comparado con el límite que fija su fórmula.',
    ],
  },
  {
    id: 'spill',
    title: 'Si se derrama',
    items: [
      'Mantenga lejos a los demás. Primero, el equipo de protección. Si alguien está salpicado, los primeros auxilios van antes que el suelo.',
      'Álcali sólido: bárralo en seco y páselo a un recipiente de plástico etiquetado. Sin trapos húmedos, sin manos desnudas, sin recogedor de aluminio ni de zinc.',
      'Solución alcalina: conténgala con arena seca u otro absorbente que indique la ficha de datos de seguridad, nunca con serrín (aserrín) ni trapos; recójala y después enjuague el lugar con mucha agua donde la ficha de datos de seguridad y las reglas locales permitan usar el desagüe.',
      'No le eche ácido ni vinagre. La reacción da más calor y salpicaduras.',
      'Más de lo que puede recoger con lo que tiene a mano: salga, cierre la puerta, llame.',
      'La masa de jabón que se ha desbordado al hervir es solución alcalina hasta que se haya demostrado que no lo es.',
    ],
  },
  {
    id: 'storage',
    title: 'Almacenamiento',
    items: [
      'El álcali, en su envase original, bien cerrado, seco, bajo llave, por debajo de la altura de los ojos, en una bandeja de plástico.',
      'Lejos de los ácidos, de las sales de amonio (en algunos fertilizantes; desprenden amoníaco), del aluminio, el zinc y el estaño, de los alimentos y de todo lo que arde.',
      'Nada de lo que se pueda beber contiene jamás solución alcalina. La solución alcalina que sobra no se guarda para otro día; se elimina como se indica más abajo.',
      'Álcali apelmazado o húmedo: no lo pese. Su fuerza se desconoce hasta que se haya medido otra vez (titulado).',
      'La solución de reserva, que llega ya disuelta, a la temperatura que indica su proveedor; puede cristalizar con el frío.',
    ],
  },
  {
    id: 'disposal',
    title: 'Eliminación',
    items: [
      'Según la ficha de datos de seguridad y las reglas del lugar; pregunte a la empresa de aguas antes de echar por un desagüe algo fuerte.',
      'Álcali barrido, absorbente con solución alcalina y masa de jabón fallida: en un recipiente de plástico con tapa, con su nombre y la fecha, hasta que se lo lleve alguien capacitado.',
      'Los sacos y envases de álcali vacíos no están vacíos. Enjuáguelos con guantes y gafas protectoras puestos, donde las reglas locales lo permitan, e inutilice la etiqueta.',
      'Un lote dudoso se etiqueta, se aparta y se guarda bajo llave. Decide quien formula.',
    ],
  },
];
