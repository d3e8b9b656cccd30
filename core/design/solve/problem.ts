/** The problem as the search sees it: what may move, what is asked, and where orbits are looked for. */
import type { Body } from '../../bodies/body';
import type { MeanElements, Theory } from '../../orbit/elements';
import { type Condition, residualOf } from '../conditions/condition';
import { type Shape, type ShapeRates, shapeRates, shapeRatesAt } from '../shapeRates';

export const freeElements = ['semiMajorAxisKm', 'eccentricity', 'inclinationRad'] as const;
export type FreeElement = (typeof freeElements)[number];

export interface Problem {
  readonly body: Body;
  readonly theory: Theory;
  readonly start: MeanElements;
  readonly free: readonly FreeElement[];
  readonly conditions: readonly Condition[];
}

export interface Point {
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
  /** cos i. */
  readonly theta: number;
}

/**
 * The closed form is a series in (R/p)²: orbits are looked for with p = a(1 − e²) ≥ R, which holds for all that clear the
 * surface, and with a up to a thousand radii, beyond every body's own sphere.
 */
export function floorKm(body: Body): number {
  return Math.min(body.radiusKm, body.equatorialRadiusKm);
}

export function ceilingKm(body: Body): number {
  return 1000 * floorKm(body);
}

/** Searches go a little below the floor, so that a root at its edge is enclosed. */
export const searchShare = 0.9;

export function parameterKm({ semiMajorAxisKm, eccentricity }: Shape): number {
  return semiMajorAxisKm * (1 - eccentricity) * (1 + eccentricity);
}

const rounding = 1e-9;

export function isInDomain(body: Body, point: Point): boolean {
  const { semiMajorAxisKm, eccentricity, theta } = point;
  return (
    eccentricity >= 0 &&
    eccentricity < 1 &&
    Math.abs(theta) <= 1 &&
    parameterKm(point) >= floorKm(body) * (1 - rounding) &&
    semiMajorAxisKm <= ceilingKm(body) * (1 + rounding)
  );
}

/** The rates of a shape, or null where there are none. */
export function ratesOf({ body, theory, free, start }: Problem, shape: Shape): ShapeRates | null {
  const { semiMajorAxisKm: a, eccentricity: e } = shape;
  if (!(a > 0 && a < Infinity && e >= 0 && e < 1)) return null;
  if (!free.includes('inclinationRad')) return shapeRatesAt(body, theory, shape, start.inclinationRad);
  return shapeRates(body, theory, shape);
}

/** Residuals of all conditions, or null outside what the closed form can be evaluated for. */
export function residualsAt(problem: Problem, point: Point): readonly number[] | null {
  const rates = ratesOf(problem, point);
  return rates && problem.conditions.map((condition) => residualOf(condition, rates, point.theta));
}

export function largestResidual(problem: Problem, point: Point): number {
  const residuals = residualsAt(problem, point);
  if (!residuals) return Infinity;
  return residuals.reduce((most, value) => (Number.isNaN(value) ? Infinity : Math.max(most, Math.abs(value))), 0);
}

export function pointOf({ start }: Problem): Point {
  const { semiMajorAxisKm, eccentricity, inclinationRad } = start;
  return { semiMajorAxisKm, eccentricity, theta: Math.cos(inclinationRad) };
}

export function meanOf({ start, free }: Problem, { semiMajorAxisKm, eccentricity, theta }: Point): MeanElements {
  return {
    ...start,
    semiMajorAxisKm: free.includes('semiMajorAxisKm') ? semiMajorAxisKm : start.semiMajorAxisKm,
    eccentricity: free.includes('eccentricity') ? eccentricity : start.eccentricity,
    inclinationRad: free.includes('inclinationRad') ? Math.acos(theta) : start.inclinationRad,
  };
}
