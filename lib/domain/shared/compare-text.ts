/** By code unit: the same on every machine, for orders that must repeat rather than read well. For `sort`. */
export const compareText = (a: string, b: string): number => (a < b ? -1 : Number(a > b));
