import type { approvalLines as english } from '../en/approval-lines.ts';
import { fixed } from '../numbers.ts';

type Pending = Parameters<typeof english>[0];

const STATES: Readonly<Record<string, string>> = {
  approved: 'Está aprobada tal como está.',
  'changed-since-approval': 'No es lo que se aprobó.',
  'review-date-passed': 'Es lo que se aprobó; la fecha de revisión ya pasó.',
  'not-approved': 'No está aprobada.',
};

const UNIT = 'g para 1000 g de grasas, con valores publicados';

/** The lines that `approve` shows before it writes: old and new weights, and whether anything else changed. */
export const approvalLines: typeof english = (pending) => {
  const { formula, fingerprint, stateBefore, last, moves } = pending;
  return [
    `${formula.code} ${formula.name}, revisión ${formula.revision}, huella ${fingerprint}`,
    STATES[stateBefore] ?? stateBefore,
    ...(last ? sinceLast(last, fingerprint, moves) : firstTime(moves)),
  ];
};

function firstTime(moves: Pending['moves']): readonly string[] {
  return [
    `El registro no contiene ninguna aprobación de ella. Pesadas (${UNIT}):`,
    ...moves.map((move) => `  ${nameOf(move).padEnd(26)} ${amount(move.after)}`),
  ];
}

function sinceLast(
  last: NonNullable<Pending['last']>,
  fingerprint: string,
  moves: Pending['moves'],
): readonly string[] {
  const before = `la aprobación de la revisión ${last.revision} por ${last.by} el ${last.on}`;
  if (last.fingerprint === fingerprint) return [`Nada ha cambiado desde ${before}.`];
  const moved = moves.filter((move) => move.before !== move.after);
  if (moved.length === 0) {
    return [
      `Desde ${before} no ha cambiado ninguna pesada: la diferencia está en el texto, los límites o los datos.`,
    ];
  }
  return [
    `Desde ${before} (${UNIT}):`,
    `  ${''.padEnd(26)} ${'antes'.padStart(10)} ${'ahora'.padStart(10)} ${'cambio'.padStart(10)}`,
    ...moves.map((move) => {
      const { before, after } = move;
      const by = before === after ? '' : signed((after ?? 0) - (before ?? 0));
      return `  ${nameOf(move).padEnd(26)} ${amount(before)} ${amount(after)} ${by.padStart(10)}`.trimEnd();
    }),
  ];
}

const WATER: Readonly<Record<string, string>> = { water: 'agua', heldBack: 'agua reservada' };

const nameOf = ({ part, id, at }: Pending['moves'][number]) =>
  (WATER[part] ?? id) + (at === null ? '' : ` (${at})`);

const amount = (mass: number | null) => (mass === null ? '-' : fixed(mass, 2)).padStart(10);
const signed = (mass: number) => `${mass > 0 ? '+' : ''}${fixed(mass, 2)}`;
