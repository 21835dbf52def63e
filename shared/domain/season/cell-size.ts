/** Edge of a climate cell, degrees: its corners are nodes of the climate table. */
export const CELL_DEG = 0.5
