/**
 * Acceleration by zonals of any degree from written-out Legendre polynomials: the tests' own force code, made for speed.
 *
 * U_n = −(μ/r) J_n (R/r)^n P_n(s), s = z/r, so that the acceleration is
 * Σ (μ/r²) J_n (R/r)^n [((n + 1) P_n + s P_n') r̂ − P_n' ẑ]. Coefficients of P_n: Abramowitz and Stegun, 22.3.8; summed
 * by Horner's rule in s², no recursion over degrees. It shares constants with `core` and nothing else.
 */
export interface ZonalConstants {
  readonly muKm3PerS2: number;
  readonly radiusKm: number;
  /** `zonals[n]` is J_n. */
  readonly zonals: readonly number[];
}

/** Adds the zonals' acceleration (km/s²) at a position (km) to `sum`. */
export type AddZonals = (sum: number[], x: number, y: number, z: number) => void;

interface Degree {
  readonly n: number;
  readonly odd: boolean;
  /** Of (n + 1) P_n + s P_n' and of P_n', rising powers of s²; the first times s where n is odd, the second where even. */
  readonly radial: Float64Array;
  readonly axial: Float64Array;
}

export function zonalPolynomials({ muKm3PerS2, radiusKm, zonals }: ZonalConstants, toDegree: number): AddZonals {
  const degrees: Degree[] = [];
  for (let n = 2; n <= Math.min(toDegree, zonals.length - 1); n += 1) degrees.push(degreeOf(n, zonals[n] ?? 0));
  return (sum, x, y, z) => {
    const r2 = x * x + y * y + z * z;
    const r = Math.sqrt(r2);
    const s = z / r;
    const s2 = s * s;
    const ratio = radiusKm / r;
    let power = ratio;
    let radial = 0;
    let axial = 0;
    for (const degree of degrees) {
      power *= ratio;
      const along = horner(degree.radial, s2);
      const across = horner(degree.axial, s2);
      radial += power * (degree.odd ? s * along : along);
      axial += power * (degree.odd ? across : s * across);
    }
    const scale = muKm3PerS2 / r2;
    sum[0] = (sum[0] ?? 0) + (scale * radial * x) / r;
    sum[1] = (sum[1] ?? 0) + (scale * radial * y) / r;
    sum[2] = (sum[2] ?? 0) + scale * (radial * s - axial);
  };
}

function horner(coefficients: Float64Array, x: number): number {
  let sum = 0;
  for (let k = coefficients.length - 1; k >= 0; k -= 1) sum = sum * x + (coefficients[k] as number);
  return sum;
}

function degreeOf(n: number, zonal: number): Degree {
  const odd = n % 2 === 1;
  const count = Math.floor(n / 2) + 1;
  const radial = new Float64Array(count);
  const axial = new Float64Array(odd ? count : count - 1);
  for (let m = 0; m < count; m += 1) {
    const power = n - 2 * m;
    const value =
      (((-1) ** m * factorial(2 * n - 2 * m)) / (2 ** n * factorial(m) * factorial(n - m) * factorial(power))) * zonal;
    radial[(power - (odd ? 1 : 0)) / 2] = value * (n + 1 + power);
    if (power > 0) axial[odd ? (power - 1) / 2 : power / 2 - 1] = value * power;
  }
  return { n, odd, radial, axial };
}

function factorial(n: number): number {
  return n <= 1 ? 1 : n * factorial(n - 1);
}
