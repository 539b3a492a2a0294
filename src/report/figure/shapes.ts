import { symbol, symbolCircle, symbolDiamond, symbolSquare, symbolTriangle } from 'd3-shape';

const kinds = [symbolCircle, symbolDiamond, symbolTriangle, symbolSquare];

/** Path of a group's mark about 0,0, so that groups differ by shape as well as by colour. `area` in square units. */
export function markPath(group: number, area: number): string {
  return symbol(kinds[group % kinds.length], area)() ?? '';
}

/** A group's colour class; colours repeat after six groups, shapes after four, so that neighbours always differ. */
export const groupClass = (group: number): string => `wb-group-${(group % 6) + 1}`;

/** A coordinate with the digits a drawing needs. */
export const at = (value: number): number => Number(value.toFixed(2));
