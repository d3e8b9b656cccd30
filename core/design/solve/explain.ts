/** Why there is no orbit, in words with the numbers, and the nearest thing that exists. */
import { formatNumber } from '../../numerics/numberWords';
import type { Condition } from '../conditions/condition';
import { nodeRateAt, type ShapeRates } from '../shapeRates';
import { type NoOrbit, noOrbit } from './answer';
import { shapeAtAxis } from './axis';
import { inSentence, namesOf } from './conflicts';
import { floorKm, isInDomain, meanOf, type Point, type Problem, parameterKm, ratesOf, residualsAt } from './problem';
import { type ReachedPoint, reachOf } from './reach';
import type { Division } from './search';
import type { Settlement } from './settle';

export interface Failure {
  readonly problem: Problem;
  readonly division: Division;
  readonly settlement: Settlement;
  readonly holdsEverywhere: Condition | null;
}

export function explained(failure: Failure): NoOrbit {
  const { problem, settlement, holdsEverywhere } = failure;
  const labels = problem.conditions.map(({ label }, place) => (place === 0 ? label : inSentence(label))).join(', ');
  if (holdsEverywhere) return everywhere(problem, holdsEverywhere);
  const reached = reachOf(failure.problem, failure.division);
  const nearest = nearestPoint(problem, [...settlement.rejected, ...reached]);
  const withNearest = (answer: NoOrbit): NoOrbit =>
    nearest ? { ...answer, nearest: meanOf(problem, nearest) } : answer;
  if (settlement.inDoubt) {
    const text = `${labels}: the search did not converge. There may be an orbit that meets them; try another start.`;
    return withNearest(noOrbit('didNotConverge', text));
  }
  const sentence = shapeless(failure) ?? beyondPole(failure) ?? belowSurface(failure) ?? outOfReach(failure, reached);
  return withNearest(noOrbit('noSolution', sentence ?? `${labels}: no orbit meets them.`));
}

function everywhere(problem: Problem, condition: Condition): NoOrbit {
  const { conditions, free } = problem;
  const place = conditions.indexOf(condition);
  if (conditions.length === 1) {
    const text = `${condition.label} holds whatever the ${namesOf(free)}: it settles nothing. Free another element.`;
    return noOrbit('undetermined', text, [place]);
  }
  const others = conditions.filter((other) => other !== condition).map(({ label }) => inSentence(label));
  const text = `${condition.label} follows from ${others.join(' and ')} here, and is redundant: ${namesOf(free)} stay open.`;
  return noOrbit('redundant', text, [place]);
}

/** Held elements, or altitudes, that make no shape at all. */
function shapeless({ problem, division }: Failure): string | null {
  const { shapes } = division;
  if (shapes.kind === 'single' ? shapes.shapes.length > 0 : shapes.line.grid.length > 0) return null;
  const altitude = problem.conditions.find(({ family }) => family === 'altitude');
  const { semiMajorAxisKm: a, eccentricity: e } = problem.start;
  if (altitude?.eccentricityAt && !problem.free.includes('semiMajorAxisKm')) {
    const wanted = formatNumber(altitude.eccentricityAt(a), { digits: 4 });
    return `${altitude.label} with a semi-major axis of ${km(a)} would need an eccentricity of ${wanted}; it has to be from 0 to below 1.`;
  }
  if (altitude) return `${altitude.label} leaves no orbit outside ${problem.body.name}.`;
  if (problem.free.includes('semiMajorAxisKm')) {
    return `At an eccentricity of ${formatNumber(e, { digits: 4 })} every orbit outside ${problem.body.name} is larger than is looked for.`;
  }
  return `A semi-major axis of ${km(a)} lies inside ${problem.body.name}, whose radius is ${km(floorKm(problem.body))}.`;
}

/** The shape is there, but no inclination turns the node that fast. */
function beyondPole(failure: Failure): string | null {
  const { problem, division, settlement } = failure;
  const node = division.thetaFrom?.family === 'node' ? division.thetaFrom : null;
  if (!node) return null;
  for (const point of settlement.rejected) {
    const shape = ratesOf(problem, point);
    if (!shape || Math.abs(point.theta) < 1 || parameterKm(point) < floorKm(problem.body) * 0.999) continue;
    const cosine = node.target / nodeRateAt(shape, 1);
    if (!(Math.abs(cosine) > 1)) continue;
    const at = `at a mean altitude of ${km(altitudeKm(problem, shape))} and e ${eccentricityText(shape.eccentricity)}`;
    return `cos i would have to be ${formatNumber(cosine, { digits: 2 + Math.max(0, Math.ceil(-Math.log10(Math.abs(cosine) - 1)) - 1) })} ${at}; ${limit(problem, { node, shape, side: Math.sign(cosine) })}`;
  }
  return null;
}

interface LimitQuestion {
  readonly node: Condition;
  readonly shape: ShapeRates;
  readonly side: number;
}

/** How far out, at this eccentricity, the node still turns so fast at i = 0 or 180°. */
function limit(problem: Problem, { node, shape, side }: LimitQuestion): string {
  const { eccentricity, semiMajorAxisKm } = shape;
  const question = { condition: node, eccentricity, theta: () => side, guessKm: semiMajorAxisKm };
  const last = shapeAtAxis(problem, question);
  const orbits = `${eccentricity < 1e-3 ? 'circular' : `e ${eccentricityText(eccentricity)}`} orbits`;
  const kindOf = node.kind === 'sunSynchronous' ? 'Sun-synchronous' : `of ${node.write(node.target)}`;
  const named = node.kind === 'sunSynchronous' ? `${kindOf} ${orbits}` : `${orbits} ${kindOf}`;
  if (!last || parameterKm(last) < floorKm(problem.body)) return `there are no ${named} above the surface.`;
  const named2 = node.kind === 'sunSynchronous' && eccentricity < 1e-3 ? 'circular Sun-synchronous orbits' : named;
  return `${named2} end at a mean altitude of ${km(altitudeKm(problem, last))}.`;
}

/** All conditions hold, but inside the body. */
function belowSurface({ problem, settlement }: Failure): string | null {
  const inside = settlement.rejected.find((point) => {
    const residuals = residualsAt(problem, point);
    return residuals?.every((value) => Math.abs(value) < 1e-9) && !isInDomain(problem.body, point);
  });
  if (!inside || parameterKm(inside) >= floorKm(problem.body)) return null;
  const size = `a mean a of ${km(inside.semiMajorAxisKm)} and e ${eccentricityText(inside.eccentricity)}`;
  return `It would take ${size}, whose p = a(1 − e²) of ${km(parameterKm(inside))} is less than the radius of ${problem.body.name}, ${km(floorKm(problem.body))}.`;
}

/** The range of the quantity sought, over all that meets the other conditions. */
function outOfReach({ problem, division }: Failure, reached: readonly ReachedPoint[]): string | null {
  const condition = division.sought ?? division.thetaFrom;
  const values = reached.map(({ value }) => value).filter(Number.isFinite);
  if (!condition || values.length === 0) return null;
  const low = condition.write(Math.min(...values));
  const high = condition.write(Math.max(...values));
  const others = problem.conditions.filter((other) => other !== condition).map(({ label }) => inSentence(label));
  const given = others.length > 0 ? ` with ${others.join(' and ')}` : '';
  const range = low === high ? `is ${low}` : `runs from ${low} to ${high}`;
  return `The ${condition.quantity} ${range}${given}, whatever the ${namesOf(problem.free)}; ${condition.write(condition.target)} is asked for.`;
}

function nearestPoint(problem: Problem, points: readonly Point[]): Point | null {
  let best: Point | null = null;
  let least = Infinity;
  for (const point of points) {
    if (!isInDomain(problem.body, point)) continue;
    const residuals = residualsAt(problem, point);
    const size = residuals ? Math.hypot(...residuals) : Infinity;
    if (size < least) [best, least] = [point, size];
  }
  return best;
}

function altitudeKm({ body }: Problem, { semiMajorAxisKm }: { readonly semiMajorAxisKm: number }): number {
  return semiMajorAxisKm - body.equatorialRadiusKm;
}

function km(value: number): string {
  return `${formatNumber(value, { digits: 0 })} km`;
}

function eccentricityText(eccentricity: number): string {
  return formatNumber(eccentricity, { digits: 4 });
}
