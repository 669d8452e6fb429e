/**
 * How much larger a batch may become, and how much water or alkali a made lye may lack, before the batch is stopped. A slip of
 * more is no slip of the hand. Common practice, no source. [1]
 */
export const LARGEST_CORRECTION = 0.1;
