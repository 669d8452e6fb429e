/** The official wordings, quoted. `…` is left open by the regulation for the supplier to complete. */
export const officialStatements = {
  source:
    'Statements of Regulation (EC) No 1272/2008 (CLP) in English, consolidated text in the mhchem/hpstatements collection, version 2025-09-01. Which of them apply to a product is stated on its label and in its safety data sheet.',
  classification:
    'Harmonised classification, CLP Annex VI: sodium hydroxide 011-002-00-6, Skin Corr. 1A, H314; potassium hydroxide 019-002-00-8, Acute Tox. 4 (oral), H302, and Skin Corr. 1A, H314 (the entry for potassium hydroxide in part from memory). Suppliers usually add H290.',
  hazards: [
    ['H314', 'Causes severe skin burns and eye damage.'],
    ['H290', 'May be corrosive to metals.'],
    ['H302', 'Harmful if swallowed.'],
  ],
  precautions: [
    ['P260', 'Do not breathe dust/fume/gas/mist/vapours/spray.'],
    ['P280', 'Wear protective gloves/protective clothing/eye protection/face protection.'],
    ['P264', 'Wash … thoroughly after handling.'],
    ['P234', 'Keep only in original packaging.'],
    ['P405', 'Store locked up.'],
    ['P501', 'Dispose of contents/container to …'],
  ],
} as const;

export const safetyPage = {
  title: 'Safety',
  first:
    'The supplier’s safety data sheet comes first. Then the law of your place and your employer’s rules. Then this page. Where they differ from it, they hold. In an injury, do what the emergency services and a doctor say.',
  emergencyTitle: 'In an emergency',
  noEmergency:
    'No emergency number is set for this shop. Write them into data/shop.yaml before anyone works with lye.',
  fillIn: 'missing',
  sections: [
    {
      id: 'before',
      title: 'Before you start',
      items: [
        'Read the supplier’s safety data sheets of the alkali and of every other material you will use. Know where they hang.',
        'Do not work with lye alone, tired or in a hurry. No children, no animals, no visitors in the room.',
        'Running water within a few steps: for the eyes, for the skin, for the floor. Try the tap before you open the alkali.',
        'Clear the bench. Vessels of stainless steel, polypropylene or heavy borosilicate glass. Never aluminium, tin or zinc: lye eats them and gives off hydrogen, which burns.',
        'Air the room. Alkali dust and the mist over hot lye hurt the lungs.',
        'Read the whole formula page, its cautions first. Compare the code, the batch size and the lots.',
      ],
    },
    {
      id: 'equipment',
      title: 'What to wear',
      items: [
        'Goggles that close all round, or a face shield over goggles. Spectacles are not enough.',
        'Gloves that the safety data sheet names for alkali, long enough to cover the wrist. Look for holes.',
        'Long sleeves over the gloves, long trousers over closed shoes, an apron that does not soak.',
        'Keep all of it on until the tools are clean. Fresh soap is caustic too.',
      ],
    },
    {
      id: 'mixing',
      title: 'Alkali into water',
      lead: 'Always add the alkali to the water, in portions, while stirring. Never pour water onto alkali.',
      items: [
        'Dissolving sets free much heat. When a little alkali meets much water, the water takes it up. When a little water meets much alkali, it boils at once and throws caustic drops.',
        'Start with cold water in a deep vessel that is at most half full and stands in a sink or a tub.',
        'Wait for each portion to dissolve. Undissolved alkali at the bottom dissolves all at once when it is stirred up.',
        'Keep your face away from the vapour. Never lean over the vessel.',
        'Label the vessel “LYE, corrosive” and cover it. Never leave it where it can be taken for water.',
        'Pour lye into fats along the side, slowly. Not from a height.',
      ],
    },
    {
      id: 'work',
      title: 'While you work',
      items: [
        'Weigh the lines of one batch size from top to bottom and tick each one. Close the alkali straight after weighing; it draws water and carbon dioxide.',
        'If you are not sure whether a line was weighed, start that vessel again.',
        'Hot process: vessel at most half full, stay beside it, have a spoon and a cool surface ready. It can rise like milk.',
        'No bar leaves the shop before its free alkali has been measured against the release limit of its formula.',
      ],
    },
    {
      id: 'spill',
      title: 'If it is spilt',
      items: [
        'Keep others away. Put the protective equipment on first if it is not on.',
        'Solid alkali: sweep it up dry into a labelled plastic tub. No wet cloth, no bare hands.',
        'Lye: dam it with dry inert absorbent, take it up, and rinse the place with much water when the safety data sheet and the local rules allow the drain.',
        'Do not pour acid or vinegar on it. The reaction gives more heat.',
        'Soap batter that has boiled over is lye until it has been shown not to be.',
      ],
    },
  ],
  firstAidTitle: 'First aid',
  firstAidLead:
    'Lye goes on burning after it has stopped hurting. Start rinsing at once, shout for help, let somebody else telephone.',
  firstAid: [
    {
      route: 'In the eyes',
      code: 'P305+P351+P338',
      official:
        'IF IN EYES: Rinse cautiously with water for several minutes. Remove contact lenses, if present and easy to do. Continue rinsing.',
      practice:
        'Lids held open, from the nose outwards, so that nothing runs into the other eye. Call the emergency number while rinsing and go on until help takes over, also on the way.',
    },
    {
      route: 'On the skin or in the hair',
      code: 'P303+P361+P353',
      official:
        'IF ON SKIN (or hair): Take off immediately all contaminated clothing. Rinse skin with water [or shower].',
      practice:
        'Brush off dry alkali first. Clothes off under running water, cut rather than pulled over the head. No vinegar, no cream. P363: Wash contaminated clothing before reuse.',
    },
    {
      route: 'Swallowed',
      code: 'P301+P330+P331',
      official: 'IF SWALLOWED: Rinse mouth. Do NOT induce vomiting.',
      practice:
        'Call the emergency number at once. Nothing to neutralise it, nothing to eat; drink only what the poison centre or a doctor says.',
    },
    {
      route: 'Breathed in',
      code: 'P304+P340',
      official: 'IF INHALED: Remove person to fresh air and keep comfortable for breathing.',
      practice: 'Call for medical advice, also when the cough goes away.',
    },
  ],
  always: ['P310', 'Immediately call a POISON CENTER/doctor/…'],
  practice:
    'The sentences without a code are common practice, no source; the safety data sheet comes first.',
  officialTitle: 'Official statements',
  limitsTitle: 'Workplace limits, sodium hydroxide',
  limits:
    'NIOSH recommended ceiling 2 mg/m³; OSHA permissible limit 2 mg/m³ as an 8-hour mean; value immediately dangerous to life or health 10 mg/m³ (NIOSH pages on sodium hydroxide, 1310-73-2). Other countries have their own.',
  rulesTitle: 'Rules of this shop',
  careTitle: 'Formulas here that need most care',
  careLead: 'Those with a caution marked danger.',
  careNone: 'No formula carries a caution marked danger.',
} as const;
