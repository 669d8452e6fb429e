import { z } from 'zod';
import { demanding, within } from './schema-values.ts';
import { isSane, parseTarget, suits, TARGETS, type TargetName } from './target.ts';

const target = (name: TargetName) =>
  demanding(z.string(), (text) => {
    const { of, range } = TARGETS[name];
    const parsed = parseTarget(text);
    if (!parsed || !suits(name, parsed)) {
      return {
        rule: 'formula/target-form',
        found: `${name} "${text}"`,
        expected:
          of === 'temperature'
            ? 'a temperature as 38 C, 35-40 C or 100 F'
            : 'a time as 90 min, 24 h, 24-36 h or 42 d',
      };
    }
    return isSane(name, parsed)
      ? null
      : {
          rule: 'formula/target-range',
          found: `${name} ${text}`,
          expected: `${range}, the lower end first`,
        };
  }).optional();

/** What the batch is brought to and left for. */
export const targetsSchema = z
  .strictObject({
    fats: target('fats'),
    lye: target('lye'),
    combine: target('combine'),
    cook: target('cook'),
    unmould: target('unmould'),
    cure: target('cure'),
  })
  .optional();

/** What a batch must meet before it is released. */
export const releaseSchema = z
  .strictObject({
    'free-alkali': within('formula/release-range', 'free-alkali', {
      low: 0,
      high: 1,
    }).optional(),
    ph: demanding(z.array(z.number()), (ends) =>
      ends.length === 2 &&
      7 <= (ends[0] ?? 0) &&
      (ends[0] ?? 0) < (ends[1] ?? 0) &&
      (ends[1] ?? 0) <= 12
        ? null
        : {
            rule: 'formula/release-range',
            found: `ph [${ends.join(', ')}]`,
            expected: 'a lower and an upper end from 7 to 12, as [9, 10.5]',
          },
    ).optional(),
    moisture: within('formula/release-range', 'moisture', { low: 0, high: 60 }).optional(),
  })
  .optional();
