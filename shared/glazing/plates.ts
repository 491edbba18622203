/**
 * Rectangular plates simply supported on four edges under even pressure, small deflections
 * (Timoshenko and Woinowsky-Krieger, Theory of Plates and Shells). `ratio` is long edge ÷ short
 * edge, at least 1. All three are quick: no more terms than change the twelfth digit.
 */

/** α in w = α·q·a⁴/D: deflection at the centre, a the short edge. Lévy's series, which does not depend on Poisson's ratio. */
export function centreDeflection(ratio: number): number {
  let sum = 0;
  for (let m = 1, sign = 1; m <= 15; m += 2, sign = -sign) {
    const half = (m * Math.PI * ratio) / 2;
    if (half > 40) break;
    sum += (sign / m ** 5) * ((half * Math.tanh(half) + 2) / (2 * Math.cosh(half)));
  }
  return 5 / 384 - (4 / Math.PI ** 5) * sum;
}

/** β in M = β·q·a²: the greater bending moment at the centre, per width. Lévy's series. */
export function centreMoment(ratio: number, poisson: number): number {
  let sum = 0;
  for (let m = 1, sign = 1; m <= 15; m += 2, sign = -sign) {
    const half = (m * Math.PI * ratio) / 2;
    if (half > 40) break;
    const part = (half * Math.tanh(half) + 2) / (2 * Math.cosh(half));
    sum += (sign / m ** 3) * (part + poisson * (1 / Math.cosh(half) - part));
  }
  return 1 / 8 - (4 / Math.PI ** 3) * sum;
}

/**
 * Bv in V = Bv·q·a⁵·b/(E·d³): the volume that the bent plate displaces, which couples the lites
 * of a sealed unit (EN 16612). Navier's series.
 */
export function displacedVolume(ratio: number, poisson: number): number {
  const inverse = 1 / ratio;
  let sum = 0;
  for (let m = 1; m <= 15; m += 2) {
    for (let n = 1; n <= 41; n += 2) {
      sum += 1 / (m ** 2 * n ** 2 * (m ** 2 + (n * inverse) ** 2) ** 2);
    }
  }
  return ((64 * 12 * (1 - poisson ** 2)) / Math.PI ** 8) * sum;
}
