/** A hole by its printed number, from the left. Chromatics have twelve. */
export type Hole = 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9 | 10 | 11 | 12;

export type Breath = 'blow' | 'draw';
