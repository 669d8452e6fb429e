import type { cautionTexts as english } from '../en/cautions.ts';
import { lyeCautions } from './cautions-lye.ts';
import { soapCautions } from './cautions-soap.ts';
import { superfatCautions } from './cautions-superfat.ts';
import { workCautions } from './cautions-work.ts';

/** The words of every caution. */
export const cautionTexts: typeof english = {
  ...lyeCautions,
  ...superfatCautions,
  ...workCautions,
  ...soapCautions,
};
