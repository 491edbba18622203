/** Exact by definition (international yard and pound agreement, 1959). */
export const MM_PER_INCH = '25.4';
export const MM_PER_FOOT = '304.8';
/** Kilograms of one avoirdupois pound, exact by definition. */
export const KG_PER_POUND = '0.45359237';
