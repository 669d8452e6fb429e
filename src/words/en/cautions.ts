import { lyeCautions } from './cautions-lye.ts';
import { soapCautions } from './cautions-soap.ts';
import { superfatCautions } from './cautions-superfat.ts';
import { workCautions } from './cautions-work.ts';

/** What a caution says: what is the matter, with its numbers, and what to do, most urgent first. */
export interface CautionWords {
  readonly text: string;
  readonly action: string;
}

const texts = { ...lyeCautions, ...superfatCautions, ...workCautions, ...soapCautions } as const;

export type CautionId = keyof typeof texts;

/** The numbers that the text of each caution asks for; a rule must give just these. */
export type CautionNumbers = {
  readonly [Id in CautionId]: Readonly<Parameters<(typeof texts)[Id]>[0]>;
};

/** The words of every caution. An id stands here or nowhere. */
export const cautionTexts: {
  readonly [Id in CautionId]: (numbers: CautionNumbers[Id]) => CautionWords;
} = texts;
