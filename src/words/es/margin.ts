import type { marginWords as english } from '../en/margin.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

export const marginWords: SameShape<typeof english> = {
  written: 'según la fórmula',
  expanded: 'intervalo expandido',
  worst: 'peor caso',
  withoutLots: 'intervalo expandido sin las partidas medidas, con intervalos comerciales',
  freeAlkali: 'desde aquí, álcali libre',
  summary: (written, expanded, worst) =>
    `Sobreengrasado según la fórmula: ${plain(written, 1)} %. Intervalo expandido: de ${fixed(expanded[0], 1)} a ${fixed(expanded[1], 1)} %. Peor caso: de ${fixed(worst[0], 1)} a ${fixed(worst[1], 1)} %.`,
  crossesWorst:
    'El peor caso baja de cero: con cada grasa en el extremo bajo de su intervalo y el álcali en su punto más fuerte, quedaría álcali libre.',
  crossesExpanded:
    'El intervalo expandido baja de cero. El álcali libre es posible en el trabajo ordinario; mida antes de liberar.',
  clear:
    'Los dos intervalos quedan por encima de cero: no se espera álcali libre por la variación de los materiales.',
  method: 'Cómo se calcula el margen',
  scaleLeftOut: 'Aquí no se cuenta la balanza; cada tamaño de lote de arriba cuenta la suya.',
  budgetTitle: 'Lo que más lo mueve',
  budgetUnit: 'puntos porcentuales, k = 2',
  assay: (name) => `${name}, riqueza`,
  scale: 'Balanza',
};
