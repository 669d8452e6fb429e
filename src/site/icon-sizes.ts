/** Sizes of the application's icon that devices ask for. [dots] */
export const ICON_SIZES = [192, 512] as const;
