import { UNIT_SYSTEMS } from '../words/units.ts';
import { setVoice, voiceOf } from '../words/voice.ts';

/** Numbers, dates and units as the page writes them. */
const { locale, units } = document.documentElement.dataset;
if (locale)
  setVoice(
    voiceOf(
      locale,
      UNIT_SYSTEMS.find((known) => known === units),
    ),
  );
