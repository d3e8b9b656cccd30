/**
 * How many points of eccentric anomaly average a force over a revolution to rounding.
 *
 * The trapezoidal rule on a period errs by less than about M(τ) exp(−N τ), where M(τ) is the integrand's greatest size
 * within τ of the real axis (Trefethen and Weideman, SIAM Review 56, 385 (2014), theorem 3.2). A force of degree n is a
 * trigonometric polynomial of degree n + 2 in E over a power 2n + 3 of r; r = a (1 − e cos E) shrinks towards its zero
 * at cosh τ = 1/e. The best τ is searched on a short grid.
 */

/** Aliasing left, relative to the largest value along the orbit. */
const tolerance = 1e-14;
const strips = 10;

/** Points for a force that behaves like a zonal of `degree`, 0 ≤ e < 1; a multiple of 4. */
export function averagingPoints(degree: number, eccentricity: number): number {
  if (!(eccentricity >= 0 && eccentricity < 1)) throw new Error(`an average needs 0 ≤ e < 1, got ${eccentricity}`);
  // A circle leaves only the polynomial; below 1e-8 the count is the same.
  const e = Math.max(eccentricity, 1e-8);
  const widest = Math.acosh(1 / e);
  let least = Infinity;
  for (let strip = 1; strip < strips; strip += 1) {
    const width = (widest * strip) / strips;
    const growth = (2 * degree + 3) * Math.log((1 - e) / (1 - e * Math.cosh(width)));
    least = Math.min(least, degree + 2 + (growth - Math.log(tolerance)) / width);
  }
  return 4 * Math.ceil(least / 4);
}
