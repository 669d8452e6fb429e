import type { shopping as english } from '../en/shopping.ts';
import { totalMass } from '../measures.ts';
import { fixed } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

export const shopping: SameShape<typeof english> = {
  title: 'Lista de compras',
  about: 'Lo que consumen juntos los lotes elegidos',
  lead: 'Elija cuántos lotes de cada uno; la lista suma lo que consumen. Imprímala con el navegador.',
  needsScripts:
    'Para sumar hacen falta scripts, y aquí están desactivados. Las tablas de abajo dan lo que consume cada lote.',
  broken:
    'No se puede hacer la lista: shopping/data.js falta o está dañado. Las tablas de abajo siguen siendo válidas.',
  choose: 'Lotes',
  chooseLead: 'Cuántos de cada tamaño. Vacío significa ninguno.',
  count: (code, name, label) => `${code} ${name}, ${label}: cuántos`,
  clear: 'Empezar de nuevo',
  list: 'Lo que debe estar a mano',
  nothing: 'Todavía no ha elegido nada.',
  chosen: (count, code, name, label) => `${count} × ${code} ${name}, ${label}`,
  listNote:
    'Pesos como en las páginas de las fórmulas. No se añade nada por derrames, por lo que queda en un bidón ni por un lote fallido.',
  stock: 'En existencia',
  order: 'Por pedir',
  material: 'Material',
  weight: 'Peso',
  water: 'Agua',
  kilograms: (grams) => totalMass(grams),
  perBatch: 'Lo que consume cada lote',
  refused: 'No hay pesadas de ningún tamaño.',
  formula: 'Fórmula',
  cost: 'Costo',
  perBar: 'Por pastilla',
  money: (amount, currency) => `${fixed(amount, 2)} ${currency}`,
  withCosts: 'Con costos. Esta edición no es para trabajar.',
  costNote:
    'Solo materiales, a los precios del taller; sin trabajo, energía, embalaje ni pérdidas.',
  unpriced: (names) => `Sin contar: ${names.join(', ')} (sin precio).`,
};
