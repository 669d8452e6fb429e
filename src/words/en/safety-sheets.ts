/** What hangs on the wall. */
export const safetyPoster = {
  title: 'Lye: poster for the wall',
  rule: 'Alkali into water. Never water onto alkali.',
  wear: 'Goggles, gloves, long sleeves, apron, closed shoes: from the first weighing to the last rinsed vessel.',
  metals: 'No aluminium, zinc or tin.',
  alone: 'Never alone in the building.',
  spill: 'Spilt: keep others away, sweep up dry, no acid, then much water.',
  places: ['Eyewash and tap', 'First-aid box', 'Safety data sheets'],
  fill: 'write in by hand',
} as const;

/** What every maker signs. */
export const safetyRecord = {
  title: 'Record of safety instruction',
  lead: 'One sheet for each maker. Not before all lines are initialled does the maker work with lye.',
  person: ['Name', 'Started on', 'Instructed by'],
  initials: 'Initials of both',
  done: [
    'Has read the safety page and the safety data sheets of both alkalis',
    'Has found the tap, the eyewash, the first-aid box, the telephone and the way out, and tried the water',
    'Knows the numbers in the emergency box and has said what to report',
    'Has put on goggles and gloves that fit, and knows when to change them',
    'Has explained why alkali goes into water, and shown it with an experienced maker beside',
    'Knows which vessels must not meet lye',
    'Knows what to do with lye in an eye, on skin, swallowed, breathed in; and that nothing is neutralised there',
    'Has taken up a spill of water as if it were lye',
    'Knows where waste goes, and what happens to a batch in doubt',
    'Has read the formulas under “What here needs most care” and their cautions',
  ],
  signatures: 'Signatures',
  columns: ['Occasion', 'Date', 'Maker', 'Instructor', 'Edition read'],
  firstTime: 'First instruction',
  yearly: 'Yearly refresh',
  keep: 'Keep it for as long as the law of your place asks.',
} as const;
