import { placeInOrder } from '../choice.ts';
import type { LintCheck } from './check.ts';

/** Of two neighbours the later must not come before the earlier in the order of choice. */
export const orderOfChoice: LintCheck = {
  name: 'order-of-choice',
  description: 'The records of each value stand in the declared order of choice.',
  check: (fat, { sources }) => {
    const lists = [
      ['saponification-value', fat.saponificationValues],
      ['acid-value', fat.acidValues],
      ['iodine-value', fat.iodineValues],
      ['relative-density', fat.relativeDensities],
      ['unsaponifiable-matter', fat.unsaponifiableMatter],
      ['compositions', fat.compositions],
    ] as const;
    return lists.flatMap(([key, records]) =>
      records.flatMap((record, index) => {
        const before = records[index - 1];
        if (!before || placeInOrder(before, sources) <= placeInOrder(record, sources)) return [];
        return [
          {
            path: [key, index],
            found: `the record of ${record.source} after that of ${before.source}`,
            expected:
              'the order of choice by kind of source, what was read before what is remembered',
            advice: 'put it further up',
          },
        ];
      }),
    );
  },
};
