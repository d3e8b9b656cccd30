/**
 * Short-period J2 variations: what separates osculating from mean elements along one revolution.
 *
 * First order in J2, closed in e, 0 ≤ e < 1, every inclination. The variations of perigee, node and
 * anomaly each divide by e or sin i; here they are joined, before anything is divided, into three
 * numbers that stay finite: a rotation of the orbit frame, and the change of e split along it.
 *
 * Sources: Brouwer, Astron. J. 64, 378 (1959), first-order short-period terms; Lyddane, Astron. J. 68,
 * 555 (1963), who joined them for small e and i. The rotation vector is Lyddane's idea in frame form.
 */
import type { Body } from '../bodies/body';
import { add, combine, rotateBy, scale, type Vec3 } from '../numerics/vectors';
import { trueFromMean } from './kepler';
import { elementsFromFrame, type OrbitFrame } from './orbitFrame';

/** Osculating minus mean, first order in J2. */
export interface ShortPeriodVariation {
  readonly semiMajorAxisKm: number;
  readonly eCosM: number;
  readonly eSinM: number;
  /** Turn of the orbit frame, rad, inertial axes; holds node, inclination and argument of latitude. */
  readonly rotation: Vec3;
}

/** Variation at a mean orbit (km, rad, inertial equatorial frame). */
export function shortPeriodVariation(body: Body, mean: OrbitFrame): ShortPeriodVariation {
  const elements = elementsFromFrame(mean);
  const { semiMajorAxisKm: a, eccentricity: e, perigeeRad: g, meanAnomalyRad: l } = elements;
  const theta = mean.normal[2];
  const sine = Math.hypot(mean.normal[0], mean.normal[1]);
  const f = l + wrappedDifference(trueFromMean(l, e) - l);
  const eta2 = 1 - e * e;
  const eta = Math.sqrt(eta2);
  const aOverR = (1 + e * Math.cos(f)) / eta2;
  const gamma2 = 0.5 * (body.zonals[2] ?? 0) * (body.radiusKm / a) ** 2;
  const terms = { e, eta, f, g, l, theta, sine2: sine * sine, aOverR, scaled: gamma2 / eta2 ** 2 };

  const deltaE = eccentricityVariation(terms);
  const bracket = anomalyBracket(terms);
  const centre = f - l + e * Math.sin(f);
  const latitudeSine = sineSum(terms);
  // e δl, and δ(l + g) with the division by e done by hand: (1 − η)/e = e/(1 + η).
  const eDeltaL = -0.25 * eta ** 3 * terms.scaled * bracket;
  const deltaLatitude =
    0.25 *
    terms.scaled *
    (((eta2 * e) / (1 + eta)) * bracket +
      6 * (5 * theta * theta - 1) * centre +
      (3 - 5 * theta * theta) * latitudeSine);
  const deltaNode = -0.5 * terms.scaled * theta * (6 * centre - latitudeSine);
  const deltaInclination = 0.5 * terms.scaled * theta * sine * cosineSum(terms);

  const latitude = g + l;
  const toNode = combine(Math.cos(latitude), mean.along, -Math.sin(latitude), mean.ahead);
  const across = combine(Math.sin(latitude), mean.along, Math.cos(latitude), mean.ahead);
  // δl + δg alone would count the turn of the node twice along the normal: cos i δh joins it.
  const inPlane = combine(deltaInclination, toNode, sine * deltaNode, across);
  return {
    semiMajorAxisKm: a * axisVariation(terms, gamma2),
    eCosM: deltaE * Math.cos(l) - eDeltaL * Math.sin(l),
    eSinM: deltaE * Math.sin(l) + eDeltaL * Math.cos(l),
    rotation: add(inPlane, scale(mean.normal, deltaLatitude + theta * deltaNode)),
  };
}

interface Terms {
  readonly e: number;
  readonly eta: number;
  readonly f: number;
  readonly g: number;
  readonly l: number;
  readonly theta: number;
  readonly sine2: number;
  readonly aOverR: number;
  /** γ2' = γ2/η⁴ */
  readonly scaled: number;
}

/** f − l on the same revolution. */
function wrappedDifference(difference: number): number {
  return difference - 2 * Math.PI * Math.round(difference / (2 * Math.PI));
}

/** δa/a = γ2 {(3θ² − 1)(a³/r³ − η⁻³) + 3(1 − θ²)(a³/r³) cos(2g + 2f)} */
function axisVariation({ eta, f, g, theta, sine2, aOverR }: Terms, gamma2: number): number {
  const cube = aOverR ** 3;
  return gamma2 * ((3 * theta * theta - 1) * (cube - eta ** -3) + 3 * sine2 * cube * Math.cos(2 * g + 2 * f));
}

/** δe, with the division by e carried out. */
function eccentricityVariation({ e, eta, f, g, theta, sine2, scaled }: Terms): number {
  const c = Math.cos(f);
  const series = c * (3 + e * c * (3 + e * c));
  const axial = (3 * theta * theta - 1) * (e * (eta + 1 / (1 + eta)) + series);
  const sectorial = 3 * sine2 * (e + series) * Math.cos(2 * g + 2 * f);
  const lower = sine2 * (3 * Math.cos(2 * g + f) + Math.cos(2 * g + 3 * f));
  return 0.5 * scaled * (axial + sectorial - eta * eta * lower);
}

/** The bracket that δl and δg share. */
function anomalyBracket({ eta, f, g, theta, sine2, aOverR }: Terms): number {
  const square = (aOverR * eta) ** 2;
  return (
    2 * (3 * theta * theta - 1) * (square + aOverR + 1) * Math.sin(f) +
    3 * sine2 * ((1 - square - aOverR) * Math.sin(2 * g + f) + (square + aOverR + 1 / 3) * Math.sin(2 * g + 3 * f))
  );
}

function sineSum({ e, f, g }: Terms): number {
  return 3 * Math.sin(2 * g + 2 * f) + 3 * e * Math.sin(2 * g + f) + e * Math.sin(2 * g + 3 * f);
}

function cosineSum({ e, f, g }: Terms): number {
  return 3 * Math.cos(2 * g + 2 * f) + 3 * e * Math.cos(2 * g + f) + e * Math.cos(2 * g + 3 * f);
}

/** The osculating orbit of a mean one. */
export function osculatingFrame(body: Body, mean: OrbitFrame): OrbitFrame {
  const variation = shortPeriodVariation(body, mean);
  return {
    semiMajorAxisKm: mean.semiMajorAxisKm + variation.semiMajorAxisKm,
    eCosM: mean.eCosM + variation.eCosM,
    eSinM: mean.eSinM + variation.eSinM,
    along: rotateBy(mean.along, variation.rotation),
    ahead: rotateBy(mean.ahead, variation.rotation),
    normal: rotateBy(mean.normal, variation.rotation),
  };
}
