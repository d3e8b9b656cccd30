/** How the eccentricity vector (e cos ω, e sin ω) moves under the body's zonals, averaged over a revolution. */
import type { Body } from '../bodies/body';
import { zonalForce } from '../forces/zonal';
import { averagedRates } from '../mission/averagedRates';
import { equinoctialFromElements, senseOf } from '../mission/equinoctial';
import type { FrozenInput } from './frozenChecks';

/** Inclination below which node and perigee are told apart at this small tilt instead; a frozen e is then below 1e-8. */
const leastTiltRad = 1e-6;

export interface VectorRates {
  readonly eCosine: number;
  readonly eSine: number;
}

/** Rates of e cos ω and e sin ω over the mean motion; J2 and J2² in closed form, J3 to `degree` averaged. */
export function perigeeMotion(
  body: Body,
  input: FrozenInput,
  degree: number,
): (at: { readonly eCosine: number; readonly eSine: number }) => VectorRates {
  const { semiMajorAxisKm } = input;
  const inclinationRad = Math.min(Math.max(input.inclinationRad, leastTiltRad), Math.PI - leastTiltRad);
  const sense = senseOf(inclinationRad);
  const forces = [zonalForce(body, { from: 3, to: Math.max(degree, 3) })];
  const fillRates = averagedRates({ body, sense, oblateness: 'second', forces });
  const circle = { semiMajorAxisKm, eccentricity: 0, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
  const values = equinoctialFromElements(circle, sense);
  const tilt = values[4] as number;
  const perMeanMotion = Math.sqrt(semiMajorAxisKm ** 3 / body.muKm3PerS2);
  const rates = new Float64Array(6);
  return ({ eCosine, eSine }) => {
    values[1] = eSine;
    values[2] = eCosine;
    fillRates(rates, values, 0);
    // With the node at 0 its rate is that of p over q; it turns the line that longitudes are counted from.
    const turn = (sense * (rates[3] as number)) / tilt;
    return {
      eCosine: perMeanMotion * ((rates[2] as number) + turn * eSine),
      eSine: perMeanMotion * ((rates[1] as number) - turn * eCosine),
    };
  };
}
