/**
 * Sum of doubles with the rounding errors of the additions carried along (Neumaier 1974, Z. angew. Math. Mech. 54: 39–51):
 * as if added in twice the precision and rounded once.
 */
export class CompensatedSum {
  private sum = 0;
  private lost = 0;

  add(x: number): void {
    const next = this.sum + x;
    this.lost += Math.abs(this.sum) >= Math.abs(x) ? this.sum - next + x : x - next + this.sum;
    this.sum = next;
  }

  get value(): number {
    return this.sum + this.lost;
  }
}

/** Compensated sum of all values. */
export function compensatedSum(values: Iterable<number>): number {
  const sum = new CompensatedSum();
  for (const value of values) sum.add(value);
  return sum.value;
}
