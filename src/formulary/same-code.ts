/**
 * What two codes have in common when they are the same to a reader: `qy-14` and `QY-014` look like one code
 * on a shelf, and are one file name on some disks.
 */
export const sameCode = (code: string): string => code.toUpperCase().replace(/-0+(?=\d)/, '-');
