/**
 * Secular rates by the products of J2 with J3 and above: second order, as J2² is.
 *
 * Along the true orbit the higher zonals are met where J2 has moved the satellite to. The average of their potential over
 * that displaced orbit, less that over the mean one, is the product's part of the Hamiltonian:
 *   K = ½⟨{H₂, W_n} + {H_n, W₂}⟩ = ⟨{H_n, W₂}⟩,
 * because both brackets have the same average (integrate by parts over the anomaly); Hori, Publ. Astron. Soc. Japan 18,
 * 287 (1966), for the brackets. Averaged over the perigee too, so that only secular rates of node and perigee are left;
 * these are 0.14° of node a year at 5° inclination, 0.002° near 98°.
 */
import type { Body } from '../bodies/body';
import { averagingPoints } from '../forces/averagingPoints';
import { zonalPotential } from '../forces/zonalPotential';
import { twoPi } from '../numerics/angles';
import { stateFromMean } from '../orbit/meanState';
import { stateFromElements } from '../orbit/state';
import { elementsFromEquinoctial, type Sense } from './equinoctial';
import type { AddOblateness } from './oblateness';

export interface CouplingRates {
  readonly nodeRadPerS: number;
  readonly perigeeRadPerS: number;
}

interface Shape {
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
  readonly inclinationRad: number;
}

/** Perigees that the average goes over: the potential's strongest long-period terms are those in ω and 2ω. */
const perigees = 6;

/** Steps of the differences in cos i and e². */
const cosineStep = 2e-3;
const squareStep = 2e-4;

/** Rates (rad/s) of mean elements (km, rad) by J2 times the zonals from J3 to a degree. */
export function couplingRates(body: Body, shape: Shape, toDegree: number): CouplingRates {
  const { semiMajorAxisKm: a, eccentricity: e } = shape;
  const hamiltonian = productPotential(body, toDegree);
  const theta = Math.cos(shape.inclinationRad);
  const atTheta = (cosine: number) => hamiltonian({ ...shape, inclinationRad: Math.acos(cosine) });
  const [low, high] = [Math.max(-1, theta - cosineStep), Math.min(1, theta + cosineStep)];
  const byTheta = (atTheta(high) - atTheta(low)) / (high - low);
  const atSquare = (square: number) => hamiltonian({ ...shape, eccentricity: Math.sqrt(square) });
  const [less, more] = [Math.max(0, e * e - squareStep), e * e + squareStep];
  const bySquare = (atSquare(more) - atSquare(less)) / (more - less);
  // Lagrange's equations with R = K: ∂/∂i = −sin i ∂/∂θ and ∂/∂e = 2e ∂/∂e².
  const eta = Math.sqrt(1 - e * e);
  const momentum = Math.sqrt(body.muKm3PerS2 * a);
  const nodeRadPerS = -byTheta / (momentum * eta);
  return { nodeRadPerS, perigeeRadPerS: (2 * eta * bySquare) / momentum - theta * nodeRadPerS };
}

function productPotential(body: Body, toDegree: number): (shape: Shape) => number {
  const potential = zonalPotential(body, { from: 3, to: toDegree });
  return (shape) => {
    const e = shape.eccentricity;
    const points = averagingPoints(toDegree, e);
    let sum = 0;
    for (let turn = 0; turn < perigees; turn += 1) {
      for (let point = 0; point < points; point += 1) {
        const eccentric = (twoPi * point) / points;
        const meanAnomalyRad = eccentric - e * Math.sin(eccentric);
        const elements = { ...shape, nodeRad: 0, perigeeRad: (twoPi * turn) / perigees, meanAnomalyRad };
        const displaced = potential(stateFromMean(body, elements).positionKm);
        const plain = potential(stateFromElements(body.muKm3PerS2, elements).positionKm);
        sum += (1 - e * Math.cos(eccentric)) * (displaced - plain);
      }
    }
    return sum / (points * perigees);
  };
}

/** Changes of the shape within which the rates are taken as constant: they follow a^(−8) or so. */
const sameShape = { share: 4e-3, eccentricity: 0.01, inclinationRad: 0.005 } as const;

/** On ellipses beyond this the rates come to less than 0.001° of node a year, and are left out. */
const mostEccentricity = 0.1;

/** Adds the rates to those of equinoctial elements; computed anew only when the shape has changed. */
export function zonalCoupling(body: Body, toDegree: number, sense: Sense): AddOblateness {
  let known: { readonly shape: Shape; readonly rates: CouplingRates } | null = null;
  return (rates, values) => {
    const shape = elementsFromEquinoctial(values, sense);
    if (shape.eccentricity > mostEccentricity) return;
    if (!known || !isNear(known.shape, shape)) known = { shape, rates: couplingRates(body, shape, toDegree) };
    const { nodeRadPerS, perigeeRadPerS } = known.rates;
    const longitudeRate = perigeeRadPerS + sense * nodeRadPerS;
    rates[1] = (rates[1] as number) + longitudeRate * (values[2] as number);
    rates[2] = (rates[2] as number) - longitudeRate * (values[1] as number);
    rates[3] = (rates[3] as number) + nodeRadPerS * (values[4] as number);
    rates[4] = (rates[4] as number) - nodeRadPerS * (values[3] as number);
  };
}

function isNear(one: Shape, other: Shape): boolean {
  return (
    Math.abs(one.semiMajorAxisKm / other.semiMajorAxisKm - 1) < sameShape.share &&
    Math.abs(one.eccentricity - other.eccentricity) < sameShape.eccentricity &&
    Math.abs(one.inclinationRad - other.inclinationRad) < sameShape.inclinationRad
  );
}
