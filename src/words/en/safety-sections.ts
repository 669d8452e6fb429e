/** The safety page between first aid and the rules of the shop, in order of reading. Common practice throughout. */
export const safetySections = [
  {
    id: 'what',
    title: 'What lye is',
    items: [
      'Sodium hydroxide (caustic soda) and potassium hydroxide (caustic potash) turn fat into soap. Skin and eyes are made of things that they dissolve just as well.',
      'Dissolved in water they are lye: clear, without smell, and hot. It looks like water. That is why it is labelled and never left out of sight.',
      'Lye and fats mixed are the batter; it is caustic too. Fresh soap may still hold free alkali, which is alkali that has found no fat. Treat it as caustic until that has been measured.',
    ],
  },
  {
    id: 'before',
    title: 'Before you start',
    items: [
      'Read the supplier’s safety data sheets of the alkali and of every other material you will use. Know where they hang.',
      'Running water within a few steps, for eyes, for skin, for the floor, and an eyewash where the safety data sheet asks for one. Try them before you open the alkali.',
      'Know where the telephone, the first-aid box and the way out are.',
      'Clear the bench and the floor. No food, no drink, no loose sleeves or scarf, hair tied back.',
      'Read the whole formula page, its cautions first. Compare with your sheet: code, revision, batch size, and the lots (the numbers on the sacks and tubs). If one differs, do not start; ask the formulator, who wrote the formula and answers for it.',
    ],
  },
  {
    id: 'alone',
    title: 'Who must not do this alone',
    items: [
      'Nobody works with lye alone in the building. Somebody within call knows what you are doing and where the water is.',
      'A new maker works beside an experienced one until both have signed the record.',
      'Under eighteen: only where the law allows it, and never without an experienced person beside them.',
      'Tired, ill, in a hurry, dizzy from a medicine, or with an arm or a hand that does not work as usual: not today.',
      'Pregnant, asthma, one good eye: ask a doctor first, then agree on what you do and what others do.',
      'Children, animals and visitors stay out of the room.',
    ],
  },
  {
    id: 'equipment',
    title: 'What to wear',
    items: [
      'Goggles that close all round, or a face shield over goggles. Spectacles are not enough. No contact lenses.',
      'Gloves that the safety data sheet names for alkali, long enough to cover the wrist. Look for holes; change them when they are splashed inside.',
      'Long sleeves over the gloves, long trousers over closed shoes, an apron that does not soak.',
      'Keep all of it on until the tools are clean. Then wash the gloves before you take them off.',
    ],
  },
  {
    id: 'vessels',
    title: 'Vessels and room',
    items: [
      'Stainless steel, polypropylene or polyethylene marked for heat. Glass made for heat only where the shop’s rules allow it: lye eats it, and one day it cracks.',
      'Never aluminium, zinc or tin, nor vessels coated or soldered with them. Lye eats them and gives off hydrogen, which burns.',
      'For the lye a deep vessel, at most half full, in a sink or a tub that would hold it all.',
      'Open the window or run the extractor. Alkali dust and the mist over hot lye hurt the lungs. If it makes you cough, step away and let it clear.',
    ],
  },
  {
    id: 'mixing',
    title: 'Alkali into water',
    lead: 'Always add the alkali to the water, in portions, while stirring. Never pour water onto alkali.',
    items: [
      'Why: dissolving sets free much heat. When a little alkali meets much water, the water takes it up. When a little water meets much alkali, it boils at once and throws caustic drops.',
      'Cold water first, weighed, in the vessel. Then the alkali, a portion at a time.',
      'Wait for each portion to dissolve. What lies undissolved at the bottom dissolves all at once when it is stirred up.',
      'Keep your face to the side. Never lean over the vessel.',
      'Label the vessel “LYE, corrosive” and cover it loosely. Never a drinking vessel, never a closed bottle.',
      'Pour lye into fats, slowly, along the side. Not from a height, not the fats onto lye.',
    ],
  },
  {
    id: 'heat',
    title: 'Heat',
    items: [
      'Lye heats itself. The formula page says how hot at most; where it says that there is no number, reckon with boiling.',
      'Where a formula holds water back, to be added later, the lye in the pot is stronger and hotter than the percent in its formula says.',
      'Let lye cool where it stands. Carry it only covered, with both hands, the way clear.',
      'Milk, honey, sugar and alcohol heat the batter by themselves. Leave it room, and look at it every few minutes.',
      'Hot process, where the soap is cooked: vessel at most half full, stay beside it, a spoon and a cool surface ready. It can rise like milk.',
      'Alcohol only away from flames, hot plates and sparks.',
    ],
  },
  {
    id: 'work',
    title: 'While you work',
    items: [
      'Weigh the lines of one batch size from top to bottom, each into a cup of its own, and tick each one. Close the alkali straight after weighing; it takes up water and carbon dioxide from the air and gets weaker.',
      'If you are not sure whether a line was weighed, start that vessel again, and set aside what is in it, labelled.',
      'Blender: switched on only under the surface, off before it comes out.',
      'Gloves and goggles for fresh soap too: unmoulding, cutting, washing up.',
      'No bar leaves the shop before its free alkali has been measured against the limit that its formula states for it.',
    ],
  },
  {
    id: 'spill',
    title: 'If it is spilt',
    items: [
      'Keep others away. Protective equipment on first. If anybody is splashed, first aid comes before the floor.',
      'Solid alkali: sweep it up dry into a labelled plastic tub. No wet cloth, no bare hands, no metal dustpan of aluminium or zinc.',
      'Lye: dam it with dry sand or another absorbent that the safety data sheet names, never sawdust or rags; take it up, then rinse the place with much water where the safety data sheet and the local rules allow the drain.',
      'Do not pour acid or vinegar on it. The reaction gives more heat and splashes.',
      'More than you can take up with what is at hand: leave, close the door, call.',
      'Batter that has boiled over is lye until it has been shown not to be.',
    ],
  },
  {
    id: 'storage',
    title: 'Storage',
    items: [
      'Alkali in its original container, tightly closed, dry, locked, below eye height, in a plastic tray.',
      'Away from acids, from ammonium salts (in some fertilisers; they give off ammonia), from aluminium, zinc and tin, from food and from anything that burns.',
      'Nothing that can be drunk from ever holds lye. Left-over lye is not kept for another day; it goes the way of disposal below.',
      'Caked or damp alkali: do not weigh it. Its strength is unknown until it has been measured again (titrated).',
      'Stock lye, which comes dissolved, at the temperature that its supplier states; it can crystallise when it is cold.',
    ],
  },
  {
    id: 'disposal',
    title: 'Disposal',
    items: [
      'By the safety data sheet and the rules of your place; ask the water company before anything strong goes down a drain.',
      'Swept-up alkali, absorbent with lye and failed batter: in a lidded plastic tub with its name and the date, until somebody qualified takes it.',
      'Empty alkali bags and tubs are not empty. Rinse them with gloves and goggles on, where local rules allow it, and spoil the label.',
      'A batch in doubt is labelled, set apart and locked. The formulator decides.',
    ],
  },
] as const;
