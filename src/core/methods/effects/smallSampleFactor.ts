/** From here on the asymptotic series below is exact to the last bit. */
const SERIES_FROM = 12;

/**
 * Hedges' exact factor J(m) = Γ(m/2) / (√(m/2)·Γ((m − 1)/2)) that takes the bias off a standardised difference on m
 * degrees of freedom; NaN at m = 1, where Γ(0) is infinite. Instead of a difference of two log-gammas, which loses digits
 * as m grows: the recurrence Γ(z + ½)/Γ(z) = z/(z + ½)·Γ(z + 3/2)/Γ(z + 1) up to a large z, then the series
 * Γ(z + ½)/(√z·Γ(z)) = exp(−1/(8z) + 1/(192z³) − 1/(640z⁵) + 17/(14336z⁷) − 31/(18432z⁹) + …).
 * Sources: Hedges 1981, Journal of Educational Statistics 6:107–128; Tricomi & Erdélyi 1951, Pacific Journal of
 * Mathematics 1:133–142 (ratio of gamma functions).
 */
export function smallSampleFactor(m: number): number {
  if (m <= 1) return Number.NaN;
  let z = (m - 1) / 2;
  let product = 1;
  for (; z < SERIES_FROM; z += 1) product *= z / (z + 0.5);
  const w = 1 / z;
  const square = w * w;
  const bracket =
    1 / 192 - square * (1 / 640 - square * (17 / 14336 - square * (31 / 18432 - square * (691 / 180224))));
  const logRatio = w * (-1 / 8 + square * bracket);
  return product * Math.sqrt(z / (m / 2)) * Math.exp(logRatio);
}
