import { setVoice, voiceOf } from '../words/voice.ts';

/** Numbers and dates as the page writes them. */
const { locale } = document.documentElement.dataset;
if (locale) setVoice(voiceOf(locale));
