/** What the tests of the averaged rates share: orbits, and rates in Keplerian elements. */
import fc from 'fast-check';
import type { MeanElements } from '../../../core/index';
import { type AveragedModel, averagedRates } from '../../../core/mission/averagedRates';
import { equinoctialFromElements, senseOf } from '../../../core/mission/equinoctial';

export interface Rates {
  readonly axis: number;
  readonly eccentricity: number;
  readonly inclination: number;
  readonly node: number;
  readonly perigee: number;
  readonly anomaly: number;
}

/** Keplerian rates from equinoctial ones, by the chain rule. */
export function keplerian(
  mean: MeanElements,
  model: Omit<AveragedModel, 'sense'>,
  sense = senseOf(mean.inclinationRad),
): Rates {
  const values = equinoctialFromElements(mean, sense);
  const rates = new Float64Array(6);
  averagedRates({ ...model, sense })(rates, values, 0);
  const [axis = 0, hRate = 0, kRate = 0, pRate = 0, qRate = 0, longitudeRate = 0] = rates;
  const [, h = 0, k = 0, p = 0, q = 0] = values;
  const tilt2 = p * p + q * q;
  const node = (q * pRate - p * qRate) / tilt2;
  const perigee = (k * hRate - h * kRate) / (h * h + k * k) - sense * node;
  return {
    axis,
    eccentricity: (h * hRate + k * kRate) / Math.hypot(h, k),
    inclination: (sense * 2 * (p * pRate + q * qRate)) / (Math.sqrt(tilt2) * (1 + tilt2)),
    node,
    perigee,
    anomaly: longitudeRate - perigee - sense * node,
  };
}

const angle = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });

export function orbits(minEccentricity: number) {
  return fc
    .record({
      perigeeKm: fc.double({ min: 6600, max: 12_000, noNaN: true }),
      eccentricity: fc.double({ min: minEccentricity, max: 0.75, noNaN: true }),
      inclinationRad: fc.double({ min: 0.02, max: Math.PI - 0.02, noNaN: true }),
      nodeRad: angle,
      perigeeRad: angle,
      meanAnomalyRad: angle,
    })
    .map(({ perigeeKm, ...rest }): MeanElements => ({ ...rest, semiMajorAxisKm: perigeeKm / (1 - rest.eccentricity) }));
}

export function at(orbit: Partial<MeanElements>): MeanElements {
  return {
    semiMajorAxisKm: 7000,
    eccentricity: 0.01,
    inclinationRad: 1,
    nodeRad: 0.3,
    perigeeRad: 0.4,
    meanAnomalyRad: 0,
    ...orbit,
  };
}
