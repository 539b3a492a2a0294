/** Where an interval lies as seen from the size that matters: wholly beyond it, wholly inside, or across. */
export type MattersPlace = 'beyond' | 'inside' | 'across';

/** The place of an interval, each end in the units of the estimate, infinite where it is open; `matters` is above 0. */
export function mattersPlace(lower: number, upper: number, matters: number): MattersPlace {
  if (lower >= matters || upper <= -matters) return 'beyond';
  return lower > -matters && upper < matters ? 'inside' : 'across';
}
