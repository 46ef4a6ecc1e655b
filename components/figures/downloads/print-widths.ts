/** Printed widths, in millimetres, that a canvas can hold at 300 dots per inch. */
export const PRINT_WIDTHS = { min: 20, max: 600 };
