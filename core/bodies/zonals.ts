/**
 * Unnormalised zonals J_n from fully normalised coefficients: J_n = −√(2n+1) C̄(n,0).
 * Source: the definition of full normalisation, Kaula, Theory of Satellite Geodesy (1966), §1.
 *
 * `normalisedFromDegree2[0]` is C̄(2,0). The result is indexed by degree; entries 0 and 1 are 0.
 */
export function zonalsFromNormalised(normalisedFromDegree2: readonly number[]): readonly number[] {
  return [0, 0, ...normalisedFromDegree2.map((coefficient, index) => -Math.sqrt(2 * (index + 2) + 1) * coefficient)];
}

export interface FieldScale {
  readonly muKm3PerS2: number;
  readonly radiusKm: number;
}

/**
 * The same field written for another μ and reference radius: μ R^n J_n is what nature fixes,
 * so J_n' = J_n (μ/μ') (R/R')^n. Exact, not an approximation.
 */
export function rescaleZonals(zonals: readonly number[], from: FieldScale, to: FieldScale): readonly number[] {
  const muRatio = from.muKm3PerS2 / to.muKm3PerS2;
  return zonals.map((value, degree) => value * muRatio * (from.radiusKm / to.radiusKm) ** degree);
}
