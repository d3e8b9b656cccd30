/**
 * Acceleration in a field of zonals of any degree, by differentiating explicit powers: the tests' own force code.
 *
 * It shares constants with `core` and neither formula nor recursion. U = −Σ μ J_n R^n Σ_m c(n,m) z^(n−2m) r^(2m−2n−1), with
 * c(n,m) = (−1)^m (2n−2m)! / (2^n m! (n−m)! (n−2m)!): Abramowitz and Stegun, 22.3.8.
 */
import type { Triple } from './zonalField';

export interface ZonalSeries {
  readonly muKm3PerS2: number;
  readonly radiusKm: number;
  /** `zonals[n]` is J_n. */
  readonly zonals: readonly number[];
}

interface Term {
  readonly coefficient: number;
  /** Powers of z/r and of R/r. */
  readonly s: number;
  readonly degree: number;
}

/** What the zonals add to the two-body acceleration (km/s²) at a position (km). */
export function seriesAcceleration(field: ZonalSeries): (x: number, y: number, z: number) => Triple {
  const terms = termsOf(field);
  const { muKm3PerS2, radiusKm } = field;
  return (x, y, z) => {
    const r = Math.hypot(x, y, z);
    const s = z / r;
    const powers = Array.from({ length: 32 }, (_, power) => s ** power);
    let radial = 0;
    let axial = 0;
    for (const { coefficient, s: power, degree } of terms) {
      // ∂/∂r at fixed z, and ∂/∂z at fixed r, of z^k r^(−n−1−k).
      const size = coefficient * (radiusKm / r) ** degree;
      radial += size * (degree + 1 + power) * (powers[power] ?? Number.NaN);
      if (power > 0) axial -= size * power * (powers[power - 1] ?? Number.NaN);
    }
    const scale = muKm3PerS2 / (r * r);
    return [(scale * radial * x) / r, (scale * radial * y) / r, (scale * radial * z) / r + scale * axial];
  };
}

function termsOf({ zonals }: ZonalSeries): readonly Term[] {
  const terms: Term[] = [];
  zonals.forEach((zonal, n) => {
    for (let m = 0; n >= 2 && 2 * m <= n; m += 1) {
      const over = 2 ** n * factorial(m) * factorial(n - m) * factorial(n - 2 * m);
      terms.push({ coefficient: ((-1) ** m * zonal * factorial(2 * n - 2 * m)) / over, s: n - 2 * m, degree: n });
    }
  });
  return terms;
}

function factorial(n: number): number {
  return n <= 1 ? 1 : n * factorial(n - 1);
}
