/**
 * The closed form once more, inlined over typed arrays without objects, checks or calls: the yardstick of the bench.
 *
 * Both fill the rate columns (rad/s) and return the first node rate.
 *
 * Sources as in core's secular rates: Kozai (1959); Brouwer (1959).
 */
export interface Columns {
  readonly axisKm: Float64Array;
  readonly eccentricity: Float64Array;
  readonly inclinationRad: Float64Array;
  readonly nodeRadPerS: Float64Array;
  readonly perigeeRadPerS: Float64Array;
  readonly meanAnomalyRadPerS: Float64Array;
}

export interface Field {
  readonly muKm3PerS2: number;
  readonly radiusKm: number;
  readonly j2: number;
  readonly j4: number;
}

export function inlinedFirst({ muKm3PerS2, radiusKm, j2 }: Field, columns: Columns): number {
  const { axisKm, eccentricity, inclinationRad, nodeRadPerS, perigeeRadPerS, meanAnomalyRadPerS } = columns;
  for (let index = 0; index < axisKm.length; index += 1) {
    const a = axisKm[index] as number;
    const e = eccentricity[index] as number;
    const theta = Math.cos(inclinationRad[index] as number);
    const theta2 = theta * theta;
    const eta2 = 1 - e * e;
    const n = Math.sqrt(muKm3PerS2 / a) / a;
    const ratio = radiusKm / (a * eta2);
    const k = 1.5 * n * j2 * ratio * ratio;
    nodeRadPerS[index] = -k * theta;
    perigeeRadPerS[index] = 0.5 * k * (5 * theta2 - 1);
    meanAnomalyRadPerS[index] = n + 0.5 * k * Math.sqrt(eta2) * (3 * theta2 - 1);
  }
  return nodeRadPerS[0] ?? Number.NaN;
}

export function inlinedSecond({ muKm3PerS2, radiusKm, j2, j4 }: Field, columns: Columns): number {
  const { axisKm, eccentricity, inclinationRad, nodeRadPerS, perigeeRadPerS, meanAnomalyRadPerS } = columns;
  for (let index = 0; index < axisKm.length; index += 1) {
    const a = axisKm[index] as number;
    const e = eccentricity[index] as number;
    const theta = Math.cos(inclinationRad[index] as number);
    const t2 = theta * theta;
    const t4 = t2 * t2;
    const e2 = e * e;
    const eta2 = 1 - e2;
    const eta = Math.sqrt(eta2);
    const n = Math.sqrt(muKm3PerS2 / a) / a;
    const ratio = radiusKm / (a * eta2);
    const ratio2 = ratio * ratio;
    const g2 = 0.5 * j2 * ratio2;
    const g4 = -0.375 * j4 * ratio2 * ratio2;
    const square = g2 * g2;
    nodeRadPerS[index] =
      n *
      theta *
      (-3 * g2 +
        0.375 * square * (-5 + 12 * eta + 9 * eta2 + (-35 - 36 * eta - 5 * eta2) * t2) +
        1.25 * g4 * (5 - 3 * eta2) * (3 - 7 * t2));
    perigeeRadPerS[index] =
      n *
      (1.5 * g2 * (5 * t2 - 1) +
        0.09375 *
          square *
          (-35 + 24 * eta + 25 * eta2 + (90 - 192 * eta - 126 * eta2) * t2 + (385 + 360 * eta + 45 * eta2) * t4) +
        0.3125 * g4 * (21 - 9 * eta2 + (-270 + 126 * eta2) * t2 + (385 - 189 * eta2) * t4));
    meanAnomalyRadPerS[index] =
      n *
      (1 +
        eta *
          (1.5 * g2 * (3 * t2 - 1) +
            0.09375 *
              square *
              (-15 + 16 * eta + 25 * eta2 + (30 - 96 * eta - 90 * eta2) * t2 + (105 + 144 * eta + 25 * eta2) * t4) +
            0.9375 * g4 * e2 * (3 - 30 * t2 + 35 * t4)));
  }
  return nodeRadPerS[0] ?? Number.NaN;
}
