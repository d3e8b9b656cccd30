/** Why there is no orbit, in words with the numbers, and the nearest thing that exists. */
import type { Condition } from '../conditions/condition';
import { type NoOrbit, noOrbit } from './answer';
import { beyondPole } from './beyondPole';
import { inSentence, namesOf } from './conflicts';
import { missedText, nearestPoint } from './nearest';
import {
  ceilingKm,
  floorKm,
  isInDomain,
  largestResidual,
  meanOf,
  type Point,
  type Problem,
  parameterKm,
  pointOf,
  residualsAt,
} from './problem';
import { type ReachedPoint, reachOf } from './reach';
import type { Division } from './search';
import { type Settlement, suspicious } from './settle';
import { eccentricityText, kmText } from './words';

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
  const beyond = beyondPole(failure);
  const nearest = nearestPoint(problem, [
    ...settlement.rejected,
    ...reached,
    ...(beyond?.points ?? []),
    ...circles(failure),
  ]);
  const withNearest = (answer: NoOrbit): NoOrbit =>
    nearest ? { ...answer, nearest: meanOf(problem, nearest) } : answer;
  if (settlement.inDoubt || (nearest && largestResidual(problem, nearest) < suspicious)) {
    const text = `${labels}: the search did not converge. There may be an orbit that meets them; try another start.`;
    return withNearest(noOrbit('didNotConverge', text));
  }
  const sentence = shapeless(failure) ?? beyond?.text ?? outside(failure) ?? outOfReach(failure, reached);
  const missed = nearest && !beyond ? missedText(problem, nearest) : '';
  return withNearest(noOrbit('noSolution', `${sentence ?? `${labels}: no orbit meets them.`}${missed}`));
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
    const wanted = eccentricityText(altitude.eccentricityAt(a));
    return `${altitude.label} with a semi-major axis of ${kmText(a)} would need an eccentricity of ${wanted}; it has to be from 0 to below 1.`;
  }
  if (altitude) return `${altitude.label} leaves no orbit outside ${problem.body.name}.`;
  if (problem.free.includes('semiMajorAxisKm')) {
    return `At an eccentricity of ${eccentricityText(e)} every orbit outside ${problem.body.name} is larger than is looked for.`;
  }
  return `A semi-major axis of ${kmText(a)} lies inside ${problem.body.name}, whose radius is ${kmText(floorKm(problem.body))}.`;
}

/** Where an altitude asks for an e below 0, the circle is nearest. */
function circles({ problem, division }: Failure): readonly Point[] {
  if (division.shapes.kind === 'line' || problem.free.includes('semiMajorAxisKm')) return [];
  const tie = problem.conditions.find(({ family }) => family === 'altitude')?.eccentricityAt;
  return tie && tie(problem.start.semiMajorAxisKm) < 0 ? [{ ...pointOf(problem), eccentricity: 0 }] : [];
}

/** All conditions hold, but inside the body, or farther out than is looked for. */
function outside({ problem, settlement }: Failure): string | null {
  const { body, free } = problem;
  const point = settlement.rejected.find((one) => {
    const residuals = residualsAt(problem, one);
    return residuals?.every((value) => Math.abs(value) < 1e-9) && !isInDomain(body, one);
  });
  if (!point || Math.abs(point.theta) > 1) return null;
  const { semiMajorAxisKm: a, eccentricity: e } = point;
  const least = `the radius of ${body.name}, ${kmText(floorKm(body))}`;
  const isShapeHeld = !free.includes('semiMajorAxisKm') && !free.includes('eccentricity');
  const size = `a mean a of ${kmText(a)} and e ${eccentricityText(e)}`;
  const opening = isShapeHeld ? `The orbit has ${size}` : `It would take ${size}`;
  if (a > ceilingKm(body))
    return `${opening}: more than ${kmText(ceilingKm(body))}, a thousand radii, is not looked at.`;
  return `${opening}, whose p = a(1 − e²) of ${kmText(parameterKm(point))} is less than ${least}.`;
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
