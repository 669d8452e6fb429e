import { largeMass, statedVolume, temperature, volume } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

/** Cautions about the bench: sizes, vessels, and how the batter behaves. */
export const workCautions = {
  'batch-too-small': (n: { batch: string }) => ({
    text: `There are no weights for the size ${n.batch}: it is too small for its scale.`,
    action:
      'Make a larger size or use a finer scale. Never divide the weights of another size by hand.',
  }),
  'batch-above-vessel': (n: {
    batch: string;
    litres: number;
    vessel: number;
    fill: number;
    limit: number;
  }) => ({
    text: `The size ${n.batch} is about ${volume(n.litres * 1000)} of batter: ${fixed(n.fill, 0)} % of its ${statedVolume(n.vessel * 1000)} vessel, where ${plain(n.limit)} % is the most.`,
    action: 'Take a larger vessel or a smaller size. Hot caustic soap that runs over burns.',
  }),
  'batch-above-heat-limit': (n: { batch: string; fats: number; limit: number }) => ({
    text: `The size ${n.batch} pours ${largeMass(n.fats * 1000)} of fats at once; the shop’s limit for its heat is ${largeMass(n.limit * 1000)}.`,
    action:
      'Take a smaller size or several moulds apart from each other. A block that cannot lose its heat cracks, boils up and runs over.',
  }),
  'rework-above-cap': (n: { percent: number; cap: number }) => ({
    text: `Rework of ${plain(n.percent)} % of the batter. The shop’s cap is ${plain(n.cap)} %.`,
    action:
      'Do not make it with that much. The formulator must lower it. Rework counts in no weight and no superfat of this handbook: only soap that has passed its release test goes in.',
  }),
  'hot-process-boil-over': (n: { fill: number }) => ({
    text: 'Soap can rise within seconds during the cook and run over, hot and caustic.',
    action: `Fill a steel cooker, never aluminium, to ${plain(n.fill)} % at most. Stay with it, lid off when it climbs, off the heat, stir down.`,
  }),
  'alcohol-near-heat': (n: { materials: string }) => ({
    text: `${n.materials}: the vapour catches fire, and this soap is hot.`,
    action:
      'No flame and no glowing plate in the room. Take the pot off the heat, let it cool below what the safety data sheet names, air the room, then add.',
  }),
  'heats-batter': (n: { materials: string; sugar: number }) => ({
    text: `${n.materials} (sugars: ${fixed(n.sugar, 1)} % of the fats) heats the batter. It can crack, climb out of the mould or, inside the lye, scorch.`,
    action: 'Work cool, leave moulds uncovered and apart, and keep watch for the first hours.',
  }),
  'salt-sets-fast': (n: { materials: string; percent: number; limit: number }) => ({
    text: `${n.materials} (${plain(n.percent, 1)} % of the fats): the bar sets within hours and then crumbles under a knife.`,
    action: 'Use single moulds, or cut while it is still warm. It is caustic then: gloves on.',
  }),
  'free-acid-seizes': (n: { materials: string; share: number; limit: number }) => ({
    text: `${n.materials} (${plain(n.share, 1)} % of the fats): free acid reacts on contact, and the batter can turn to paste at once.`,
    action: 'Melt it fully into the other fats, keep the pot hot, and pour the lye slowly.',
  }),
  'fast-trace': (n: { materials: string; share: number; limit: number }) => ({
    text: `${n.materials} (${plain(n.share, 1)} % of the fats): the batter thickens early.`,
    action: 'Set out moulds and additives before the lye meets the fats. Blend in short bursts.',
  }),
  'fragrance-speeds-trace': (n: { materials: string; percent: number }) => ({
    text: `${n.materials} (${plain(n.percent, 1)} % of the fats) is known to speed the batter: it can turn thick within seconds.`,
    action:
      'Work cool, have the moulds ready, take the blender out, stir the fragrance in by hand last, and pour at once.',
  }),
  'slow-trace': (n: { unsaturated: number; limit: number }) => ({
    text: `${fixed(n.unsaturated, 0)} % of the fatty acids are unsaturated: trace comes late and the bar stays soft for long.`,
    action: 'Be patient with the blender, and unmould only when the edge is firm.',
  }),
  'fragrance-maximum-unknown': (n: { materials: string; percent: number }) => ({
    text: `${n.materials} (${plain(n.percent, 1)} % of the fats): the data hold no supplier’s maximum for it, so nothing here checks the dose.`,
    action:
      'Get the supplier’s maximum for soap, the allergen sheet and the flash point, and compare before making it.',
  }),
  'fragrance-above-maximum': (n: { materials: string; percent: number; maximum: number }) => ({
    text: `${n.materials}: ${fixed(n.percent, 2)} % of the released soap. The supplier’s maximum is ${plain(n.maximum, 2)} %.`,
    action: 'Do not make it. The formulator must lower the dose.',
  }),
  'fragrance-near-flash-point': (n: {
    materials: string;
    hottest: number;
    flashPoint: number;
    margin: number;
  }) => ({
    text: `${n.materials} has its flash point at ${temperature(n.flashPoint)}, and this soap is worked at up to ${temperature(n.hottest)}.`,
    action:
      'No flame and no glowing plate in the room. Let the soap cool before the fragrance goes in.',
  }),
} as const;
