/** Whole numbers: common divisors and inverses. */

/** Greatest common divisor of two whole numbers ≥ 0 (Euclid). */
export function commonDivisor(one: number, other: number): number {
  let [a, b] = [one, other];
  while (b > 0) [a, b] = [b, a % b];
  return a;
}

export function coprime(one: number, other: number): boolean {
  return commonDivisor(one, other) === 1;
}

/** Fractions k/n in lowest terms with 0 < k ≤ n ≤ limit: φ(1) + … + φ(limit). */
export function coprimePairs(limit: number): number {
  let pairs = 0;
  for (let n = 1; n <= limit; n += 1) {
    for (let k = 1; k <= n; k += 1) if (coprime(n, k)) pairs += 1;
  }
  return pairs;
}

/** The x in [0, modulus) with value · x ≡ 1; value and modulus coprime (extended Euclid). 0 for a modulus of 1. */
export function inverseModulo(value: number, modulus: number): number {
  let [r, next] = [modulus, remainder(value, modulus)];
  let [t, nextT] = [0, 1];
  while (next > 0) {
    const quotient = Math.floor(r / next);
    [r, next] = [next, r - quotient * next];
    [t, nextT] = [nextT, t - quotient * nextT];
  }
  return remainder(t, modulus);
}

/** In [0, modulus), also for negative values. */
export function remainder(value: number, modulus: number): number {
  const rest = value % modulus;
  // Adding 0 turns −0 into 0.
  return rest < 0 ? rest + modulus : rest + 0;
}
